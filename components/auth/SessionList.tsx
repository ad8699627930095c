import { account as words } from '@/lib/text/en/pages';
import { Time } from '../ui/Time';

export interface SessionRow {
  readonly id: string;
  readonly agent: string | null;
  /** ISO 8601, UTC. */
  readonly since: string;
  readonly here: boolean;
}

/** Where the account is signed in. */
export function SessionList({ sessions }: { readonly sessions: readonly SessionRow[] }) {
  return (
    <ul className="border-t border-ink-soft text-sm">
      {sessions.map(({ id, agent, since, here }) => (
        <li key={id} className="border-b border-rule py-2">
          <span className="break-words">{agent ?? words.unknownAgent}</span>
          <span className="block text-ink-soft">
            {words.since} <Time iso={since} />
            {here ? ` · ${words.thisOne}` : null}
          </span>
        </li>
      ))}
    </ul>
  );
}
