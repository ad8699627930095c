import type { Verdict } from '@/lib/figures/types';
import { groups as names, list as texts } from '@/lib/text/en/figurePages';
import { fill } from '@/lib/text/fill';
import { FigureBadge } from '../ui/Badge';
import { ScoreLine } from '../ui/ScoreLine';
import type { RowGroup } from './groups';

export type HeadLevel = 'h2' | 'h3';
type Counts = Readonly<Record<Verdict, number>>;

/** A score line, the group's name, and how many of its figures are bad or to watch. */
export function GroupHead({ group, level: Level }: { readonly group: RowGroup; readonly level: HeadLevel }) {
  return (
    <div className="grid gap-2">
      <ScoreLine />
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <Level id={`figures-${group.id}-title`} className="scroll-mt-4 text-base">
          {names[group.id]}
        </Level>
        <Verdicts count={group.count} />
      </div>
    </div>
  );
}

/** What there is to look at, in words; that all is good when nothing is. Nothing where nothing was judged. */
function Verdicts({ count }: { readonly count: Counts }) {
  if (count.bad + count.watch === 0)
    return count.good === 0 ? null : <FigureBadge level="good" words={texts.allGood} />;
  return (
    <span className="flex flex-wrap gap-x-4">
      {count.bad === 0 ? null : <FigureBadge level="bad" words={fill(texts.bad, { count: count.bad })} />}
      {count.watch === 0 ? null : <FigureBadge level="watch" words={fill(texts.watch, { count: count.watch })} />}
    </span>
  );
}

const LINK = 'inline-flex min-h-8 items-center text-petrol bench:min-h-11 pointer-coarse:min-h-11';

/** Ways to the groups. A single group needs none. */
export function JumpLinks({ groups }: { readonly groups: readonly RowGroup[] }) {
  if (groups.length < 2) return null;
  return (
    <nav aria-label={texts.jump} className="print:hidden">
      <ul className="flex flex-wrap gap-x-5 text-sm">
        {groups.map(({ id, count }) => (
          <li key={id} className={count.bad + count.watch > 0 ? '' : 'group-has-[[name=looks]:checked]/figures:hidden'}>
            <a href={`#figures-${id}-title`} className={LINK}>
              {names[id]}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

/** A box that leaves only what is bad or to watch; without anything of that kind it says so instead. */
export function LookFilter({ count }: { readonly count: Counts }) {
  if (count.bad + count.watch === 0) return count.good === 0 ? null : <p className="text-sm">{texts.nothing}</p>;
  return (
    <div className="flex flex-wrap items-center gap-x-5 print:hidden">
      <label className="inline-flex min-h-9 items-center gap-3 text-sm bench:min-h-11 pointer-coarse:min-h-11">
        <input type="checkbox" name="looks" className="size-4 shrink-0" />
        {texts.only}
      </label>
      <Verdicts count={count} />
    </div>
  );
}
