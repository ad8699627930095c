import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { ResolvedAirframe } from '../resolved';
import type { Airframe } from '../schema/airframe';

const words = texts.problems;
const short = (value: number) => trimmedDigits(value, 2);

function checkTubes(airframe: Airframe): Problem[] {
  return airframe.tubes.flatMap(({ id, outerMm, innerMm }, index) =>
    (innerMm ?? []).flatMap((inner, axis): Problem[] =>
      inner < (outerMm[axis] ?? 0)
        ? []
        : [
            {
              code: 'bore-over-outside',
              path: `tubes.${index}.innerMm.${axis}`,
              message: fill(words.innerOverOuter, { id, inner: short(inner), outer: short(outerMm[axis] ?? 0) }),
            },
          ],
    ),
  );
}

function checkMaterials(airframe: Airframe): Problem[] {
  return airframe.materials.flatMap(({ facesGm2, arealMassGm2 }, index): Problem[] =>
    facesGm2 <= arealMassGm2
      ? []
      : [
          {
            code: 'faces-too-heavy',
            path: `materials.${index}.facesGm2`,
            message: fill(words.facesTooHeavy, { faces: short(facesGm2), whole: short(arealMassGm2) }),
          },
        ],
  );
}

function checkFans(airframe: Airframe): Problem[] {
  return airframe.drives.flatMap((drive, index): Problem[] =>
    drive.kind !== 'ductedFan' || drive.fan.hubMm < drive.fan.diameterMm
      ? []
      : [
          {
            code: 'hub-too-large',
            path: `drives.${index}.fan.hubMm`,
            message: fill(words.hubTooLarge, { hub: short(drive.fan.hubMm), fan: short(drive.fan.diameterMm) }),
          },
        ],
  );
}

function checkSlides(airframe: Airframe): Problem[] {
  return airframe.items.flatMap(({ slide }, index): Problem[] => {
    if (!slide) return [];
    const { fromMm, toMm } = slide;
    const values = { from: short(fromMm), to: short(toMm) };
    if (toMm < fromMm) {
      return [
        { code: 'range-reversed', path: `items.${index}.slide.toMm`, message: fill(words.slideReversed, values) },
      ];
    }
    if (fromMm <= 0 && toMm >= 0) return [];
    return [
      { code: 'slide-without-place', path: `items.${index}.slide`, message: fill(words.slideWithoutPlace, values) },
    ];
  });
}

function checkMargins({ flight }: Airframe): Problem[] {
  const [low, high] = flight.staticMarginPct;
  if (low <= high) return [];
  const message = fill(words.marginReversed, { low: short(low), high: short(high) });
  return [{ code: 'range-reversed', path: 'flight.staticMarginPct', message }];
}

/** Mirrored booms, drives and gear stand on the starboard side, clear of their twin; a single boom lies in the centre plane. */
function checkSides(airframe: Airframe, { places }: ResolvedAirframe): Problem[] {
  const tubeRadius = new Map(airframe.tubes.map(({ id, outerMm }) => [id, outerMm[0] / 2]));
  const things = [
    ...airframe.booms.map(({ id, mirrored, tubeId }, index) => ({
      id,
      mirrored,
      path: `booms.${index}`,
      half: tubeRadius.get(tubeId) ?? 0,
    })),
    ...airframe.drives.map((drive, index) => ({
      id: drive.id,
      mirrored: drive.mirrored,
      path: `drives.${index}`,
      half: drive.motor.diameterMm / 2,
    })),
    ...airframe.gear.map(({ id, mirrored }, index) => ({ id, mirrored, path: `gear.${index}`, half: 1 })),
  ];
  return things.flatMap(({ id, mirrored, path, half }): Problem[] => {
    const y = places.get(id)?.at[1] ?? 0;
    if (!mirrored || y >= half) return [];
    const message = fill(y < 0 ? words.foreignSide : words.onCentreLine, { id, y: short(y) });
    return [{ code: y < 0 ? 'foreign-side' : 'mirrored-on-centre-line', path: `${path}.mirrored`, message }];
  });
}

/** What contradicts itself in stock, drives, items and settings: problems at the field. */
export function checkStock(airframe: Airframe, resolved: ResolvedAirframe): Problem[] {
  return [
    ...checkMaterials(airframe),
    ...checkTubes(airframe),
    ...checkFans(airframe),
    ...checkSlides(airframe),
    ...checkMargins(airframe),
    ...checkSides(airframe, resolved),
  ];
}
