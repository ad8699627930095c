import type { ReactNode } from 'react';
import { partsText as words } from '@/lib/text/en/review';
import { Cell, Row, RowHead, Table } from '../ui/Table';
import { Value } from '../ui/Value';

/** A part as it stands in the list: texts and what a comment needs. */
export interface PartRow {
  readonly key: string;
  readonly name: string;
  readonly elementId: string;
  readonly side: 'stbd' | 'port' | 'centre';
  readonly material: string;
  readonly thickness: string;
  /** Width and height as cut, mm. */
  readonly size: string;
}

export interface StockRow {
  readonly key: string;
  readonly name: string;
  readonly tube: string;
  readonly length: string;
  readonly count: string;
}

interface PartsTableProps {
  readonly rows: readonly PartRow[];
  readonly act: (row: PartRow) => ReactNode;
}

/** The flat parts of a revision. */
export function PartsTable({ rows, act }: PartsTableProps) {
  if (rows.length === 0) return <p className="text-ink-soft">{words.none}</p>;
  const head = [
    { text: words.part },
    { text: words.side },
    { text: words.sheet },
    { text: words.thickness, numeric: true },
    { text: words.size, numeric: true },
    { text: words.about, hidden: true },
  ];
  return (
    <Table caption={words.title} head={head}>
      {rows.map((row) => (
        <Row key={row.key}>
          <RowHead>{row.name}</RowHead>
          <Cell>{words[row.side]}</Cell>
          <Cell>{row.material}</Cell>
          <Cell numeric>
            <Value text={row.thickness} unit="mm" />
          </Cell>
          <Cell numeric>
            <Value text={row.size} unit="mm" />
          </Cell>
          <Cell>{act(row)}</Cell>
        </Row>
      ))}
    </Table>
  );
}

/** What is bought by the length. */
export function StockTable({ rows }: { readonly rows: readonly StockRow[] }) {
  if (rows.length === 0) return null;
  const head = [
    { text: words.part },
    { text: words.tube },
    { text: words.length, numeric: true },
    { text: words.count, numeric: true },
  ];
  return (
    <Table caption={words.stock} showCaption head={head}>
      {rows.map((row) => (
        <Row key={row.key}>
          <RowHead>{row.name}</RowHead>
          <Cell>{row.tube}</Cell>
          <Cell numeric>
            <Value text={row.length} unit="mm" />
          </Cell>
          <Cell numeric>
            <Value text={row.count} unit="" />
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
