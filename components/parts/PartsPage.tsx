import { checks as checkWords, parts as words } from '@/lib/text/en/partsPage';
import { partsText } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { type StockRow, StockTable } from '../review/PartsTable';
import { Notice } from '../ui/Notice';
import { Section } from '../ui/Page';
import { CautionLines } from './CautionLines';
import { CheckList } from './CheckList';
import type { Cautions } from './cautions';
import type { CheckRows } from './checkRows';
import type { PartPictures } from './drawings';
import { PartsView } from './PartsView';
import { PlanPieces } from './WherePlan';
import type { PlanSprite } from './where';

interface BeforeYouCutProps {
  /** Null where the engine of then did not check. */
  readonly checks: CheckRows | null;
  readonly engine: string;
  readonly sprite: PlanSprite | null;
}

/** The check before cutting, above the parts. */
export function BeforeYouCut({ checks, engine, sprite }: BeforeYouCutProps) {
  return (
    <Section id="before-you-cut" title={checkWords.title}>
      {sprite === null ? null : <PlanPieces sprite={sprite} />}
      {checks === null ? (
        <Notice tone="watch" title={fill(checkWords.earlier, { engine })} />
      ) : (
        <CheckList rows={checks} sprite={sprite} />
      )}
    </Section>
  );
}

interface CutPartsProps {
  readonly pictures: PartPictures;
  readonly stock: readonly StockRow[];
  readonly cautions: Cautions;
  readonly sprite: PlanSprite | null;
}

/** What is cut from sheet, drawn, and what is cut from tube, rod and strip. */
export function CutParts({ pictures, stock, cautions, sprite }: CutPartsProps) {
  const { count, groups } = pictures;
  const drawn = groups.reduce((sum, { drawings }) => sum + drawings.length, 0);
  const counted = <span className="text-sm text-ink-soft">{fill(words.count, { count, drawn })}</span>;
  return (
    <>
      <Section id="parts" title={words.title} aside={count === 0 ? undefined : counted}>
        {count === 0 ? <p className="text-ink-soft">{partsText.none}</p> : <CautionLines cautions={cautions.sheets} />}
        {count === 0 ? null : <PartsView pictures={pictures} sprite={sprite} />}
      </Section>
      {stock.length === 0 ? null : (
        <div className="grid grid-cols-1 gap-4">
          <CautionLines cautions={cautions.tubes} />
          <StockTable rows={stock} />
        </div>
      )}
    </>
  );
}
