'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { api } from '@/client/api';
import type { InvitationRow } from '@/lib/contract/answers';
import { CreateInvitation } from '@/lib/contract/bodies';
import type { Role } from '@/lib/contract/roles';
import { auth, members as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Button } from '../ui/Button';
import { Choices } from '../ui/Choices';
import { Confirm } from '../ui/Confirm';
import { TextField } from '../ui/Field';
import { Notice } from '../ui/Notice';
import { apiPaths } from '../ui/paths';
import { ROLE_CHOICES, rolesText } from '../ui/roleWords';
import { Cell, Row, RowHead, Table } from '../ui/Table';
import { Time } from '../ui/Time';
import { useAct } from '../ui/useAct';

/** What a refused body says at its fields, in this page's words. */
const refusals = (email: string, roles: readonly Role[]): Record<string, string> | null => {
  const parsed = CreateInvitation.safeParse({ email, roles });
  if (parsed.success) return null;
  const wrong = new Set(parsed.error.issues.map(({ path }) => path[0]));
  return {
    ...(wrong.has('email') ? { email: auth.notAnAddress } : {}),
    ...(wrong.has('roles') ? { roles: words.pickRole } : {}),
  };
};

/** Ask somebody into the workshop with a set of roles. */
export function InviteForm({ workshopId }: { readonly workshopId: string }) {
  const router = useRouter();
  const [email, setEmail] = useState('');
  const [roles, setRoles] = useState<readonly Role[]>(['builder']);
  const [sentTo, setSentTo] = useState<string | null>(null);
  const { busy, problem, setProblem, act } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setSentTo(null);
    const address = email.trim();
    const refused = refusals(address, roles);
    if (refused !== null) return setProblem({ message: '', fields: refused });
    const sent = await act(() => api.post(apiPaths.invitations(workshopId), { email: address, roles }));
    if (!sent) return;
    setSentTo(address);
    setEmail('');
    router.refresh();
  };
  return (
    <form onSubmit={submit} className="grid max-w-[460px] gap-4" noValidate>
      <TextField
        type="email"
        label={words.inviteEmail}
        hint={words.inviteHint}
        value={email}
        maxLength={254}
        onChange={(event) => setEmail(event.target.value)}
        error={problem?.fields.email}
        autoComplete="off"
        required
      />
      <Choices
        kind="checkbox"
        name="roles"
        legend={words.roles}
        choices={ROLE_CHOICES}
        chosen={roles}
        onChange={setRoles}
        error={problem?.fields.roles}
      />
      {problem === null || problem.message === '' ? null : <Notice tone="bad" title={problem.message} live />}
      {sentTo === null ? null : <Notice tone="good" title={fill(words.invited, { email: sentTo })} live />}
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {words.inviteSend}
        </Button>
      </div>
    </form>
  );
}

/** Invitations nobody has taken up yet. */
export function InvitationTable({
  workshopId,
  invitations,
}: {
  readonly workshopId: string;
  readonly invitations: readonly InvitationRow[];
}) {
  const router = useRouter();
  if (invitations.length === 0) return <p className="text-ink-soft">{words.noInvitations}</p>;
  const head = [
    { text: words.email },
    { text: words.roles },
    { text: words.by },
    { text: words.until },
    { text: words.acts, hidden: true },
  ];
  return (
    <Table caption={words.invitations} head={head}>
      {invitations.map(({ id, email, roles, invitedBy, expiresAt }) => (
        <Row key={id}>
          <RowHead className="break-all">{email}</RowHead>
          <Cell>{rolesText(roles)}</Cell>
          <Cell>{invitedBy}</Cell>
          <Cell>
            <Time iso={expiresAt} day />
          </Cell>
          <Cell className="text-right">
            <Confirm
              label={words.revoke}
              title={fill(words.revokeTitle, { email })}
              body={words.revokeBody}
              confirm={words.revoke}
              onConfirm={async () => {
                await api.delete(`${apiPaths.invitations(workshopId)}/${id}`);
                router.refresh();
              }}
            />
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
