'use client';

import { type FormEvent, useState } from 'react';
import type { VerdictRow } from '@/lib/contract/answers';
import { GiveVerdict, VERDICTS, type VerdictKind } from '@/lib/contract/bodies';
import { verdicts as words } from '@/lib/text/en/review';
import { Badge } from '../ui/Badge';
import { Button } from '../ui/Button';
import { VERDICT_BADGES } from '../ui/badges';
import { Choices } from '../ui/Choices';
import { TextArea } from '../ui/Field';
import { Notice } from '../ui/Notice';
import { Time } from '../ui/Time';
import { useAct } from '../ui/useAct';
import { useGiveVerdict } from './hooks';

interface VerdictPanelProps {
  readonly base: string;
  readonly rows: readonly VerdictRow[];
  readonly mayGive: boolean;
  /** Who asks released this revision. */
  readonly own: boolean;
}

/** Who said what about cutting, and the form for one's own verdict. */
export function VerdictPanel({ base, rows, mayGive, own }: VerdictPanelProps) {
  return (
    <div className="grid gap-4">
      {rows.length === 0 ? <p className="text-ink-soft">{words.none}</p> : null}
      <ul className="grid gap-3">
        {rows.map(({ id, verdict, note, by, counts, createdAt }) => (
          <li key={id} className="grid gap-0.5 border-b border-rule pb-3">
            <Badge look={VERDICT_BADGES[verdict]} />
            <span className="text-sm text-ink-soft">
              {by.name} · <Time iso={createdAt} />
              {counts ? null : ` · ${words.own}`}
            </span>
            {note === '' ? null : <span className="whitespace-pre-line">{note}</span>}
          </li>
        ))}
      </ul>
      {mayGive ? <VerdictForm base={base} own={own} /> : <p className="text-sm text-ink-soft">{words.reviewersOnly}</p>}
    </div>
  );
}

const CHOICES = VERDICTS.map((value) => ({ value, ...words[value] }));

function VerdictForm({ base, own }: Pick<VerdictPanelProps, 'base' | 'own'>) {
  const [verdict, setVerdict] = useState<VerdictKind>('seen');
  const [note, setNote] = useState('');
  const { busy, problem, setProblem, act } = useAct();
  const give = useGiveVerdict(base);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const body = GiveVerdict.safeParse({ verdict, note });
    if (!body.success) return setProblem({ message: '', fields: { note: body.error.issues[0]?.message ?? '' } });
    if (await act(() => give.mutateAsync(body.data))) setNote('');
  };
  return (
    <form onSubmit={submit} className="grid gap-3" noValidate>
      <h3>{words.give}</h3>
      {own ? <Notice tone="watch">{words.ownWarning}</Notice> : null}
      <Choices
        kind="radio"
        name="verdict"
        legend={words.legend}
        choices={CHOICES}
        chosen={[verdict]}
        onChange={([chosen]) => setVerdict(chosen ?? verdict)}
      />
      <TextArea
        label={verdict === 'hold' ? words.noteHold : words.note}
        value={note}
        onChange={(event) => setNote(event.target.value)}
        error={problem?.fields.note}
        required={verdict === 'hold'}
        maxLength={2000}
      />
      {problem === null || problem.fields.note !== undefined ? null : (
        <Notice tone="bad" title={problem.message} live />
      )}
      {give.isSuccess && problem === null ? <Notice tone="good" title={words.given} live /> : null}
      <div>
        <Button type="submit" weight="primary" disabled={busy}>
          {words.submit}
        </Button>
      </div>
    </form>
  );
}
