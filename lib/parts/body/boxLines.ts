import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { offsetLine, type Polyline } from '../shape/polyline';

// The rule of a box body's corners: the sides run the full height and stand outside; top and bottom lie between them; formers
// and doublers stand inside. The document's widths and heights are outside measures. Body axes: x aft, heights from its mount.

export interface BoxLines {
  /** Half the width, outside and inside the sides. */
  readonly half: Polyline;
  readonly halfIn: Polyline;
  readonly top: Polyline;
  readonly topIn: Polyline;
  readonly bottom: Polyline;
  readonly bottomIn: Polyline;
}

/** A body's lines, or the problems that keep it from being built. `path` is the body's. */
export function boxLines(body: Body, thicknessMm: number, path: string): { lines: BoxLines } | { problems: Problem[] } {
  const { stations } = body;
  const backward = stations.flatMap(({ xMm }, index): Problem[] => {
    const before = stations[index - 1];
    return before && !(xMm > before.xMm)
      ? [
          {
            code: 'stations-not-rising',
            path: `${path}.stations.${index}.xMm`,
            message: texts.problems.stationsNotRising,
          },
        ]
      : [];
  });
  if (backward.length > 0) return { problems: backward };
  const line = (height: (station: Body['stations'][number]) => number): Polyline =>
    stations.map((station) => [station.xMm, height(station)]);
  const half = line(({ widthMm }) => widthMm / 2);
  const top = line(({ topMm }) => topMm);
  const bottom = line(({ bottomMm }) => bottomMm);
  const lines: BoxLines = {
    half,
    halfIn: offsetLine(half, -thicknessMm),
    top,
    topIn: offsetLine(top, -thicknessMm),
    bottom,
    bottomIn: offsetLine(bottom, thicknessMm),
  };
  const thin = stations.flatMap((station, index): Problem[] => {
    const place = `${path}.stations.${index}`;
    const tight = (key: string, which: string, size: number, room: number): Problem[] => {
      if (room >= 0) return [];
      const sheet = trimmedDigits(thicknessMm, 2);
      const message = fill(texts.problems.bodyTooNarrow, { size: trimmedDigits(size, 2), which, sheet });
      const fix = fill(texts.problems.bodyTooNarrowFix, { need: trimmedDigits(size - 2 * room, 1), which });
      return [{ code: 'body-too-narrow', path: `${place}.${key}`, message, fix }];
    };
    const inside = lines.halfIn[index]?.[1] ?? 0;
    const tall = ((lines.topIn[index]?.[1] ?? 0) - (lines.bottomIn[index]?.[1] ?? 0)) / 2;
    return [
      ...tight('widthMm', texts.words.wide, station.widthMm, inside),
      ...tight('topMm', texts.words.high, station.topMm - station.bottomMm, tall),
    ];
  });
  return thin.length > 0 ? { problems: thin } : { lines };
}
