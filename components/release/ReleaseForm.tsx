'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { ApiProblem, api } from '@/client/api';
import type { RevisionSummary } from '@/lib/contract/answers';
import { ReleaseRevision } from '@/lib/contract/bodies';
import { ui, release as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Button } from '../ui/Button';
import { TextArea } from '../ui/Field';
import { Notice } from '../ui/Notice';
import { apiPaths, paths } from '../ui/paths';
import { useAct } from '../ui/useAct';

interface ReleaseFormProps {
  readonly workshopId: string;
  readonly designId: string;
  readonly draftVersion: number;
  readonly nextNumber: number;
}

const STALE = [409, 412];

type Issues = readonly { readonly path: readonly PropertyKey[]; readonly message: string }[];

/** An empty text is asked for; anything else that is wrong with one is said as the contract says it. */
const atFields = (issues: Issues, texts: Readonly<Record<string, string>>): Record<string, string> =>
  Object.fromEntries(
    issues.map(({ path, message }) => {
      const field = String(path[0]);
      return [field, texts[field]?.trim() === '' ? ui.required : message];
    }),
  );

/** Reason and expected effect, and the version that was looked at: a newer draft is never released unseen. */
export function ReleaseForm({ workshopId, designId, draftVersion, nextNumber }: ReleaseFormProps) {
  const router = useRouter();
  const [reason, setReason] = useState('');
  const [expectedEffect, setEffect] = useState('');
  const [stale, setStale] = useState(false);
  const { busy, problem, setProblem, act } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const body = ReleaseRevision.safeParse({ reason, expectedEffect, draftVersion });
    if (!body.success)
      return setProblem({ message: '', fields: atFields(body.error.issues, { reason, expectedEffect }) });
    await act(async () => {
      try {
        const { data } = await api.post<RevisionSummary>(apiPaths.revisions(workshopId, designId), body.data);
        router.push(paths.review(workshopId, designId, data.number));
        router.refresh();
      } catch (error) {
        setStale(error instanceof ApiProblem && STALE.includes(error.status));
        throw error;
      }
    });
  };
  return (
    <form onSubmit={submit} className="grid gap-5" noValidate>
      <TextArea
        label={words.reason}
        hint={words.reasonHint}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={problem?.fields.reason}
        maxLength={2000}
        required
      />
      <TextArea
        label={words.effect}
        hint={words.effectHint}
        value={expectedEffect}
        onChange={(event) => setEffect(event.target.value)}
        error={problem?.fields.expectedEffect}
        maxLength={2000}
        required
      />
      {problem === null || problem.message === '' ? null : (
        <Notice tone="bad" title={problem.message} live>
          {stale ? (
            <Button onClick={() => router.refresh()} className="mt-2">
              {words.reload}
            </Button>
          ) : null}
        </Notice>
      )}
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {busy ? ui.working : fill(words.submit, { number: nextNumber })}
        </Button>
      </div>
    </form>
  );
}
