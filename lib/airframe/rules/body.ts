import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Body } from '../schema/fuselage';

const words = texts.problems;
const mm = (value: number) => trimmedDigits(value, 2);

function checkStations({ stations }: Body, path: string): Problem[] {
  return stations.flatMap((station, s): Problem[] => {
    const { id, xMm, topMm, bottomMm } = station;
    const before = stations[s - 1];
    const at = `${path}.stations.${s}`;
    const order: Problem[] =
      before && xMm <= before.xMm
        ? [
            {
              code: 'stations-not-rising',
              path: `${at}.xMm`,
              message: fill(words.stationsNotRising, { id, x: mm(xMm), before: mm(before.xMm) }),
            },
          ]
        : [];
    const height: Problem[] =
      topMm <= bottomMm
        ? [
            {
              code: 'station-upside-down',
              path: `${at}.topMm`,
              message: fill(words.stationUpsideDown, { id, top: mm(topMm), bottom: mm(bottomMm) }),
            },
          ]
        : [];
    return [...order, ...height];
  });
}

/** What stands in a body lies between its first and last station and begins before it ends. */
function checkInside(body: Body, path: string): Problem[] {
  const xs = body.stations.map(({ xMm }) => xMm);
  const from = Math.min(...xs);
  const to = Math.max(...xs);
  const outside = (id: string, x: number, at: string): Problem[] =>
    x >= from && x <= to
      ? []
      : [
          {
            code: 'outside-body',
            path: at,
            message: fill(words.outsideBody, { id, x: mm(x), from: mm(from), to: mm(to) }),
          },
        ];
  const ranges = (['doublers', 'openings'] as const).flatMap((key) =>
    body[key].flatMap(({ id, fromX, toX }, index): Problem[] => {
      const at = `${path}.${key}.${index}`;
      if (toX <= fromX) {
        const message = fill(words.rangeReversed, { id, from: `${mm(fromX)} mm`, to: `${mm(toX)} mm` });
        return [{ code: 'range-reversed', path: `${at}.toX`, message }];
      }
      return [...outside(id, fromX, `${at}.fromX`), ...outside(id, toX, `${at}.toX`)];
    }),
  );
  return [...body.formers.flatMap(({ id, xMm }, index) => outside(id, xMm, `${path}.formers.${index}.xMm`)), ...ranges];
}

/** What makes a body impossible to build: problems at the field. */
export function checkBody(body: Body, index: number): Problem[] {
  const path = `bodies.${index}`;
  return [...checkStations(body, path), ...checkInside(body, path)];
}
