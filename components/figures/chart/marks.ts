import type { ChartMark } from '@/lib/figures/charts';
import { type Anchor, extentAt, widthOf } from './boxes';
import { type ChartFrame, shareOf } from './frame';
import { NARROWEST } from './labels';

/** A mark's name above the plot; lane 0 lies on the plot, the next ones above it. */
export interface MarkFlag {
  readonly label: string;
  /** Share of the plot's width. */
  readonly x: number;
  readonly anchor: Anchor;
  readonly lane: number;
}

interface Placed extends MarkFlag {
  readonly px: number;
  readonly left: number;
  readonly right: number;
}

const GAP_PX = 6;
const ANCHORS: readonly Anchor[] = ['start', 'end', 'middle'];
/** More marks than this are not searched through: each gets a lane of its own. */
const MOST_SEARCHED = 6;

/** A leader may graze the end of a name: two marks at one place are told apart all the same. */
const GRAZE_PX = 3;
const covers = (flag: Placed, px: number): boolean => flag.left + GRAZE_PX < px && px < flag.right - GRAZE_PX;

/** Names side by side in one lane, and no leader (it runs from the name down to the plot) through another name. */
function clash(a: Placed, b: Placed): boolean {
  if (a.lane === b.lane) return a.left < b.right + GAP_PX && b.left < a.right + GAP_PX;
  const [upper, lower] = a.lane > b.lane ? [a, b] : [b, a];
  return covers(lower, upper.px);
}

function optionsOf({ label, x }: ChartMark, frame: ChartFrame, lanes: readonly number[]): readonly Placed[] {
  const share = shareOf(frame.x, x);
  const px = share * NARROWEST.widthPx;
  const all = ANCHORS.map((anchor) => ({ anchor, ...extentAt(px, widthOf(label), anchor) }));
  const fitting = all.filter(({ left, right }) => left >= 0 && right <= NARROWEST.widthPx);
  const usable = fitting.length > 0 ? fitting : all.slice(share > 0.5 ? 1 : 0, share > 0.5 ? 2 : 1);
  return lanes.flatMap((lane) => usable.map((each) => ({ label, x: share, px, lane, ...each })));
}

/** The first way to place all that are left beside those that are; null when there is none. */
function search(left: readonly (readonly Placed[])[], placed: readonly Placed[]): readonly Placed[] | null {
  const [options, ...rest] = left;
  if (options === undefined) return placed;
  for (const option of options) {
    if (placed.some((other) => clash(other, option))) continue;
    const found = search(rest, [...placed, option]);
    if (found !== null) return found;
  }
  return null;
}

const upTo = (count: number): number[] => Array.from({ length: count }, (_, index) => index);

/** Names of the marks above the plot, in as few lanes as keep names off each other and off each other's leaders. */
export function markFlags(marks: readonly ChartMark[], frame: ChartFrame): readonly MarkFlag[] {
  const known = marks.filter(({ x }) => Number.isFinite(x));
  const counts = known.length > MOST_SEARCHED ? [] : upTo(known.length).map((index) => index + 1);
  for (const count of counts) {
    const found = search(
      known.map((mark) => optionsOf(mark, frame, upTo(count))),
      [],
    );
    if (found !== null) return found.map(bare);
  }
  return known.flatMap((mark, index) => optionsOf(mark, frame, [index]).slice(0, 1)).map(bare);
}

const bare = ({ label, x, anchor, lane }: Placed): MarkFlag => ({ label, x, anchor, lane });
