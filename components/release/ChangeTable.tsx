import { release as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Cell, Row, RowHead, Table } from '../ui/Table';
import { Value } from '../ui/Value';
import type { Change } from './changes';

/** More than this is a new aircraft, not a list to read. */
const SHOWN = 40;

/** What the draft changes against the revision before it. */
export function ChangeTable({ changes, since }: { readonly changes: readonly Change[]; readonly since: number }) {
  const number = since;
  if (changes.length === 0) return <p className="text-ink-soft">{fill(words.noChanges, { number })}</p>;
  const head = [
    { text: words.what },
    { text: fill(words.was, { number }), numeric: true },
    { text: words.now, numeric: true },
  ];
  return (
    <>
      <Table caption={fill(words.changes, { number })} head={head}>
        {changes.slice(0, SHOWN).map((change) => (
          <Row key={change.what}>
            <RowHead className="font-normal">{change.what}</RowHead>
            <Cell numeric>{change.before === null ? '–' : <Value text={change.before} unit={change.unit} />}</Cell>
            <Cell numeric>{change.after === null ? '–' : <Value text={change.after} unit={change.unit} />}</Cell>
          </Row>
        ))}
      </Table>
      {changes.length > SHOWN ? (
        <p className="text-sm text-ink-soft">{fill(words.more, { count: changes.length - SHOWN })}</p>
      ) : null}
    </>
  );
}
