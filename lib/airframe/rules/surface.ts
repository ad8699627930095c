import type { Problem } from '@/lib/numerics/result';
import { radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { ResolvedSurface } from '../resolved';
import type { Airframe } from '../schema/airframe';
import { CENTRE_PLANE_MM, MAX_SLENDERNESS } from './limits';

const words = texts.problems;
const mm = (value: number) => trimmedDigits(value, 2);

/** Thickness of a sheet material, mm; 0 when it is unknown (a problem that the references name). */
export const thicknessOf = (airframe: Airframe, materialId: string | undefined): number =>
  airframe.materials.find(({ id }) => id === materialId)?.thicknessMm ?? 0;

function checkPanelChords({ surface, index }: ResolvedSurface, airframe: Airframe): Problem[] {
  return surface.panels.flatMap((panel, p) => {
    const thickness = thicknessOf(airframe, panel.materialId);
    return (['rootChordMm', 'tipChordMm'] as const).flatMap((field): Problem[] => {
      const chord = panel[field];
      const pointed = field === 'tipChordMm' && chord === 0;
      if (pointed || chord >= thickness) return [];
      const message = fill(words.chordUnderSheet, { field, chord: mm(chord), thickness: mm(thickness) });
      return [{ code: 'chord-under-sheet', path: `surfaces.${index}.panels.${p}.${field}`, message }];
    });
  });
}

/** Thinnest sheet of a surface, mm. A carved slab is as thick as its section says, so it does not count. */
export function thinnestSheet(airframe: Airframe, surface: ResolvedSurface['surface']): number {
  const sheets = surface.panels
    .filter(({ section }) => section.kind !== 'slab')
    .map(({ materialId }) => thicknessOf(airframe, materialId));
  return Math.min(...sheets.filter((thickness) => thickness > 0), Number.POSITIVE_INFINITY);
}

function checkSlenderness({ surface, index, lengthMm }: ResolvedSurface, airframe: Airframe): Problem[] {
  const thickness = thinnestSheet(airframe, surface);
  const ratio = lengthMm / thickness;
  if (ratio <= MAX_SLENDERNESS) return [];
  const message = fill(words.spanOverSheet, {
    length: mm(lengthMm),
    thickness: mm(thickness),
    ratio: trimmedDigits(ratio, 0),
    max: MAX_SLENDERNESS,
  });
  const fix = fill(words.spanOverSheetFix, {
    needed: trimmedDigits(Math.ceil((lengthMm / MAX_SLENDERNESS) * 10) / 10, 1),
  });
  const longest = surface.panels.reduce(
    (best, panel, p) => (panel.lengthMm > (surface.panels[best]?.lengthMm ?? 0) ? p : best),
    0,
  );
  return [{ code: 'span-over-sheet', path: `surfaces.${index}.panels.${longest}.lengthMm`, message, fix }];
}

/** Mirrored surfaces are stored starboard; one without a twin stands in the centre plane, for the geometry is symmetric. */
function checkSide({ surface, index, panels }: ResolvedSurface): Problem[] {
  const path = `surfaces.${index}.mirrored`;
  const { id } = surface;
  const ys = panels.flatMap(({ root, tip }) => [root.le[1], root.te[1], tip.le[1], tip.te[1]]);
  const lowest = Math.min(...ys);
  const widest = Math.max(...ys.map(Math.abs));
  if (!surface.mirrored) {
    const upright = panels.every(({ rollDeg }) => Math.abs(Math.cos(radFromDeg(rollDeg))) < 1e-6);
    if (upright && widest <= CENTRE_PLANE_MM) return [];
    return [{ code: 'one-sided', path, message: fill(words.oneSided, { id }), fix: words.oneSidedFix }];
  }
  if (lowest < -CENTRE_PLANE_MM) {
    return [{ code: 'foreign-side', path, message: fill(words.foreignSide, { id, y: mm(lowest) }) }];
  }
  if (widest <= CENTRE_PLANE_MM) {
    return [{ code: 'mirrored-on-centre-line', path, message: fill(words.onCentreLine, { id, y: mm(widest) }) }];
  }
  return [];
}

function checkSpars({ surface, index }: ResolvedSurface): Problem[] {
  return surface.spars.flatMap((spar, s): Problem[] => {
    const path = `surfaces.${index}.spars.${s}`;
    const { id, from, to } = spar;
    const material: Problem[] =
      (spar.tubeId === undefined) === (spar.materialId === undefined)
        ? [{ code: 'spar-material', path: `${path}.tubeId`, message: fill(words.sparMaterial, { id }) }]
        : [];
    const ends: Problem[] =
      to <= from
        ? [
            {
              code: 'range-reversed',
              path: `${path}.to`,
              message: fill(words.rangeReversed, { id, from: mm(from), to: mm(to) }),
            },
          ]
        : [];
    return [...material, ...ends];
  });
}

function checkLayers({ surface, index }: ResolvedSurface): Problem[] {
  return surface.panels.flatMap(({ section }, p) => {
    if (section.kind !== 'stepped') return [];
    return section.layers.flatMap(({ from, to }, l): Problem[] =>
      to > from
        ? []
        : [
            {
              code: 'range-reversed',
              path: `surfaces.${index}.panels.${p}.section.layers.${l}.to`,
              message: fill(words.layerReversed, { from: mm(from), to: mm(to) }),
            },
          ],
    );
  });
}

/** What makes a surface impossible to cut from its sheet or to place: problems at the field. */
export function checkSurface(surface: ResolvedSurface, airframe: Airframe): Problem[] {
  return [
    ...checkPanelChords(surface, airframe),
    ...checkSlenderness(surface, airframe),
    ...checkSide(surface),
    ...checkSpars(surface),
    ...checkLayers(surface),
  ];
}
