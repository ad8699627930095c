import type { SetUpSheet } from '@/lib/figures/setUp';
import { setUp as texts } from '@/lib/text/en/figurePages';
import { setUp as words } from '@/lib/text/en/setUp';
import { fill } from '@/lib/text/fill';
import { ProblemList } from '../release/DraftLine';
import { Notice } from '../ui/Notice';
import { ScoreLine } from '../ui/ScoreLine';
import { Cell, Row, RowHead, Table } from '../ui/Table';
import { Value } from '../ui/Value';
import { type SheetPart, sheetParts, type ThrowCell, type ThrowRow } from './setUpTable';

/** One solved sheet for the bench: the caution first, then what to set and what to see, each with a box to tick. */
export function SetUpView({ sheet }: { readonly sheet: SetUpSheet }) {
  return (
    <>
      <Notice tone="watch" title={words.caution}>
        <p>{texts.estimates}</p>
      </Notice>
      <ProblemList problems={sheet.problems} />
      <div className="grid gap-1 text-ink-soft">
        <p className="max-w-[80ch]">{words.how}</p>
        <p data-screen="">{texts.ticks}</p>
      </div>
      <div className="gap-x-10 lg:columns-2 print:columns-2 print:gap-x-[6mm]">
        {sheetParts(sheet).map((part) => (
          <Part key={part.title} part={part} />
        ))}
      </div>
    </>
  );
}

function Part({ part: { title, throws, mirrored, lines } }: { readonly part: SheetPart }) {
  return (
    <section className="mb-8 grid break-inside-avoid grid-cols-1 gap-2 print:mb-[3mm] print:gap-0" aria-label={title}>
      <ScoreLine />
      <h2 className="text-lg print:text-sm">{title}</h2>
      {throws.length === 0 ? null : <Throws title={title} rows={throws} />}
      {throws.length > 0 && mirrored ? <p className="text-sm text-ink-soft">{texts.starboard}</p> : null}
      <ul>
        {lines.map(({ id, text }) => (
          <li key={id} className="border-b border-rule">
            <label className="flex min-h-11 items-start gap-3 py-2">
              <input type="checkbox" className="mt-0.5 size-5 shrink-0 print:mt-0 print:size-3.5" />
              {text}
            </label>
          </li>
        ))}
      </ul>
    </section>
  );
}

function Throws({ title, rows }: { readonly title: string; readonly rows: readonly ThrowRow[] }) {
  return (
    <Table
      caption={fill(texts.throwsOf, { title })}
      head={[
        { text: texts.stick },
        { text: texts.low, numeric: true },
        { text: texts.high, numeric: true },
        { text: texts.set, hidden: true },
      ]}
    >
      {rows.map(({ id, name, low, high }) => (
        <Row key={id}>
          <RowHead className="text-base font-normal">{name}</RowHead>
          <Cell numeric>
            {low === null ? <span className="text-ink-soft">{texts.oneRate}</span> : <Move move={low} />}
          </Cell>
          <Cell numeric>
            <Move move={high} />
          </Cell>
          <Cell className="w-11 pr-0">
            <label className="grid min-h-11 min-w-11 place-items-center">
              <span className="sr-only">{fill(texts.setOf, { row: name })}</span>
              <input type="checkbox" className="size-5 print:size-3.5" />
            </label>
          </Cell>
        </Row>
      ))}
    </Table>
  );
}

/** Millimetres large, for the rule; the angle under them. */
const Move = ({ move: { mm, deg } }: { readonly move: ThrowCell }) => (
  <span className="inline-grid justify-items-end print:inline-flex print:gap-2">
    <Value text={mm} unit="mm" large />
    <span className="figure text-ink-soft">{`${deg}°`}</span>
  </span>
);
