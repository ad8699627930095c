'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { api } from '@/client/api';
import type { MemberRow } from '@/lib/contract/answers';
import type { Role } from '@/lib/contract/roles';
import { members as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Button } from '../ui/Button';
import { Choices } from '../ui/Choices';
import { Confirm } from '../ui/Confirm';
import { Dialog } from '../ui/Dialog';
import { Notice } from '../ui/Notice';
import { apiPaths } from '../ui/paths';
import { ROLE_CHOICES, rolesText } from '../ui/roleWords';
import { Cell, Row, RowHead, Table } from '../ui/Table';
import { useAct } from '../ui/useAct';

interface MemberTableProps {
  readonly workshopId: string;
  readonly members: readonly MemberRow[];
  readonly myUserId: string;
  readonly mayChange: boolean;
}

/** Who belongs to the workshop, and for an owner what can be changed about it. */
export function MemberTable({ workshopId, members, myUserId, mayChange }: MemberTableProps) {
  const head = [{ text: words.name }, { text: words.email }, { text: words.roles }];
  return (
    <Table caption={words.title} head={mayChange ? [...head, { text: words.acts, hidden: true }] : head}>
      {members.map((member) => (
        <Row key={member.id}>
          <RowHead>
            {member.name}{' '}
            {member.userId === myUserId ? <span className="font-normal text-ink-soft">({words.you})</span> : null}
          </RowHead>
          <Cell className="break-all">{member.email}</Cell>
          <Cell>{rolesText(member.roles)}</Cell>
          {mayChange ? (
            <Cell>
              <MemberActs workshopId={workshopId} member={member} />
            </Cell>
          ) : null}
        </Row>
      ))}
    </Table>
  );
}

function MemberActs({ workshopId, member }: { readonly workshopId: string; readonly member: MemberRow }) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const address = `${apiPaths.members(workshopId)}/${member.id}`;
  const { name } = member;
  return (
    <div className="flex flex-wrap justify-end gap-2">
      <Button onClick={() => setOpen(true)} aria-label={fill(words.setRolesOf, { name })}>
        {words.setRoles}
      </Button>
      <Dialog open={open} title={fill(words.setRolesOf, { name })} onClose={() => setOpen(false)}>
        <RoleForm
          start={member.roles}
          onSave={async (roles) => {
            await api.patch(address, { roles });
            setOpen(false);
            router.refresh();
          }}
        />
      </Dialog>
      <Confirm
        label={words.remove}
        title={fill(words.removeTitle, { name })}
        body={fill(words.removeBody, { name })}
        confirm={fill(words.removeYes, { name })}
        onConfirm={async () => {
          await api.delete(address);
          router.refresh();
        }}
      />
    </div>
  );
}

function RoleForm({
  start,
  onSave,
}: {
  readonly start: readonly Role[];
  readonly onSave: (roles: readonly Role[]) => Promise<void>;
}) {
  const [roles, setRoles] = useState(start);
  const { busy, problem, setProblem, act } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (roles.length === 0) return setProblem({ message: '', fields: { roles: words.pickRole } });
    await act(() => onSave(roles));
  };
  return (
    <form onSubmit={submit} className="grid gap-4">
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
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {words.save}
        </Button>
      </div>
    </form>
  );
}
