import { type Anchor, type Box, crosses, extentAt, LABEL_HEIGHT_PX, overlap, widthOf } from './boxes';
import { type ChartFrame, shareOf } from './frame';
import type { ChartLine, Point } from './lines';

/**
 * The plot on the narrowest screen. Labels are placed for it: they hang at a share of the width and keep their size, so on a wider
 * plot each covers less of what is beside it, and what was free stays free.
 */
export const NARROWEST = { widthPx: 250, heightPx: 200 } as const;

/** A line's name written at the line. */
export interface LineLabel {
  readonly line: ChartLine;
  /** Share of the plot's width. */
  readonly x: number;
  /** Base line of the text, px from the top of the plot. */
  readonly baselinePx: number;
  readonly anchor: Anchor;
}

/** Where along a line its name is tried, its end first. */
const PLACES = [1, 0.85, 0.7, 0.55, 0.4, 0.25, 0.1, 0];
const ANCHORS: readonly Anchor[] = ['end', 'middle', 'start'];
const CLEAR_PX = 5;
/** How far the letters' feet stand above the bottom of their box. */
const DESCENT_PX = 3;

/** Height of a run at x; null outside it. */
function heightAt(run: readonly Point[], x: number): number | null {
  const after = run.findIndex(([along]) => along >= x);
  const [before, next] = [run[after - 1], run[after]];
  if (next === undefined) return null;
  if (before === undefined || next[0] === before[0]) return next[0] === x ? next[1] : null;
  return before[1] + ((next[1] - before[1]) * (x - before[0])) / (next[0] - before[0]);
}

function spotsAlong({ runs }: ChartLine): readonly Point[] {
  const along = runs.flat().map(([x]) => x);
  const from = Math.min(...along);
  const to = Math.max(...along);
  return PLACES.flatMap((place) => {
    const x = place === 1 ? to : from + (to - from) * place;
    const y = runs.map((run) => heightAt(run, x)).find((height) => height !== null);
    return y === undefined || y === null ? [] : [[x, y] as const];
  });
}

interface Candidate extends LineLabel {
  readonly box: Box;
}

function candidates(line: ChartLine, frame: ChartFrame): readonly Candidate[] {
  const width = widthOf(line.name);
  return spotsAlong(line).flatMap((spot) => {
    const x = shareOf(frame.x, spot[0]);
    const y = (1 - shareOf(frame.y, spot[1])) * NARROWEST.heightPx;
    return ANCHORS.flatMap((anchor) =>
      [y - CLEAR_PX, y + CLEAR_PX + LABEL_HEIGHT_PX].map((bottom) => {
        const extent = extentAt(x * NARROWEST.widthPx, width, anchor);
        const box = { ...extent, top: bottom - LABEL_HEIGHT_PX, bottom };
        return { line, x, anchor, baselinePx: bottom - DESCENT_PX, box };
      }),
    );
  });
}

const inside = ({ left, right, top, bottom }: Box): boolean =>
  left >= 0 && right <= NARROWEST.widthPx && top >= 0 && bottom <= NARROWEST.heightPx;

/** Every straight piece of every line, in px. */
function pieces(lines: readonly ChartLine[], frame: ChartFrame) {
  const px = ([x, y]: Point): Point => [
    shareOf(frame.x, x) * NARROWEST.widthPx,
    (1 - shareOf(frame.y, y)) * NARROWEST.heightPx,
  ];
  return lines.flatMap(({ runs }) =>
    runs.flatMap((run) => run.slice(1).map((point, index) => [px(run[index] ?? point), px(point)] as const)),
  );
}

/** Names of the lines where they fit beside their line without touching a line or each other; those left over go into a key. */
export function lineLabels(
  lines: readonly ChartLine[],
  frame: ChartFrame,
): { readonly labels: readonly LineLabel[]; readonly rest: readonly ChartLine[] } {
  const walls = pieces(lines, frame);
  const placed: Candidate[] = [];
  for (const line of lines) {
    const free = candidates(line, frame).find(
      ({ box }) =>
        inside(box) && !placed.some((other) => overlap(other.box, box)) && !walls.some(([a, b]) => crosses(a, b, box)),
    );
    if (free !== undefined) placed.push(free);
  }
  const labels = placed.map(({ box: _, ...label }) => label);
  return { labels, rest: lines.filter((line) => !placed.some((label) => label.line === line)) };
}
