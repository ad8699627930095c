import { elementName, namedElements } from '@/lib/airframe/names';
import type { ResolvedAirframe, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { motorCentre, thrustDirection } from '@/lib/airframe/thrust';
import { mirror3, type Vec3 } from '@/lib/numerics/vec';
import type { Development } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import type { MassLine } from './line';
import { foamLines, glueLines, tapeLines } from './partMasses';
import { barSpread, boxSpread, mirrorSpread, plate, rodSpread, scaleSpread } from './spread';

export type { MassLine } from './line';

/** A line on the centre, or the same mass on each side. */
function onSides(line: MassLine, mirrored: boolean): MassLine[] {
  if (!mirrored) return [line];
  const side = (which: 'stbd' | 'port') => ({
    key: `${line.key}/${which}`,
    name: fill(texts.side, { name: line.name, side: texts[which] }),
  });
  return [
    { ...line, ...side('stbd') },
    { ...line, ...side('port'), at: mirror3(line.at), spread: mirrorSpread(line.spread) },
  ];
}

/** Coverings lie on both faces of the panel they are named on. */
function coveringLines(airframe: Airframe, surfaces: readonly ResolvedSurface[]): MassLine[] {
  return surfaces.flatMap(({ surface, panels }) =>
    panels.flatMap(({ panel, root, tip }): MassLine[] => {
      const covering = airframe.coverings.find(({ id }) => id === panel.coveringId);
      if (!covering) return [];
      const { chordMm: a } = root;
      const { chordMm: b } = tip;
      // A panel with sides a and b, length 1, leading edges at x0 and x1, in axes along the chord and the panel.
      const flat = plate(
        [
          [0, 0],
          [a, 0],
          [panelShift(root.le, tip.le) + b, panel.lengthMm],
          [panelShift(root.le, tip.le), panel.lengthMm],
        ],
        [],
        0,
        panelFrame(root.le, root.te, tip.le, panel.lengthMm),
      );
      const massG = (2 * flat.areaMm2 * covering.arealMassGm2) / 1e6;
      const line: MassLine = {
        key: `${surface.id}/${panel.id}/covering`,
        name: fill(texts.covering, { covering: covering.name, element: elementName(airframe, surface.id) }),
        group: 'covering',
        massG,
        at: flat.at,
        spread: scaleSpread(flat.spread, massG),
      };
      return onSides(line, surface.mirrored);
    }),
  );
}

const panelShift = (rootLe: Vec3, tipLe: Vec3): number => tipLe[0] - rootLe[0];

/** Axes of a panel for its mass: x aft, and the direction in which its leading edge leaves the x axis. Twist is left out: it moves no mass to speak of. */
function panelFrame(rootLe: Vec3, rootTe: Vec3, tipLe: Vec3, lengthMm: number) {
  const ey: Vec3 = [0, (tipLe[1] - rootLe[1]) / lengthMm, (tipLe[2] - rootLe[2]) / lengthMm];
  const size = Math.hypot(ey[1], ey[2]);
  const origin: Vec3 = [rootLe[0], (rootLe[1] + rootTe[1]) / 2, (rootLe[2] + rootTe[2]) / 2];
  return { origin, ex: [1, 0, 0] satisfies Vec3, ey: [0, ey[1] / size, ey[2] / size] satisfies Vec3 };
}

/** Bought lengths: spars, booms, rods. A pair off the centre is given once and stands on both sides. */
function tubeLines(airframe: Airframe, development: Development): MassLine[] {
  return development.stockPieces.flatMap((piece) => {
    const tube = airframe.tubes.find(({ id }) => id === piece.tubeId);
    if (!tube) throw new RangeError(`stock piece ${piece.key} names an unknown tube ${piece.tubeId}`);
    const massG = (tube.massPerMetreG * piece.lengthMm) / 1000;
    const { from, to } = piece;
    const line: MassLine = {
      key: piece.key,
      name: piece.name,
      group: 'tube',
      massG,
      at: [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2, (from[2] + to[2]) / 2],
      spread: rodSpread(massG, from, to),
    };
    return onSides(line, piece.count === 2);
  });
}

function driveLines(drive: Drive, name: string, disc: Vec3): MassLine[] {
  const axis = thrustDirection(drive);
  const { motor } = drive;
  const turning = drive.kind === 'propeller' ? drive.propeller : drive.fan;
  const lines: MassLine[] = [
    {
      key: `${drive.id}/motor`,
      name: drive.kind === 'propeller' ? name : fill(texts.motor, { drive: name }),
      group: 'drive',
      massG: motor.massG,
      at: motorCentre(drive, disc),
      spread: barSpread(motor.massG, axis, motor.lengthMm, motor.diameterMm / 2),
    },
    {
      key: `${drive.id}/${drive.kind === 'propeller' ? 'propeller' : 'fan'}`,
      name: drive.kind === 'propeller' ? fill(texts.propeller, { drive: name }) : name,
      group: 'drive',
      massG: turning.massG,
      at: disc,
      spread: barSpread(turning.massG, axis, 0, turning.diameterMm / 2),
    },
  ];
  return lines.flatMap((line) => onSides(line, drive.mirrored));
}

/**
 * Every mass of the aircraft: the foam itself part by part (area times the sheet's mass), coverings, glue, tape, tubes, items,
 * drives and gear. Foam that bevels and slots take away is not subtracted, and paint is not counted.
 * Throws RangeError when parts and airframe do not belong together.
 */
export function massList(airframe: Airframe, resolved: ResolvedAirframe, development: Development): MassLine[] {
  const at = (id: string): Vec3 => {
    const place = resolved.places.get(id);
    if (!place) throw new RangeError(`element ${id} has no place`);
    return place.at;
  };
  const names = new Map(namedElements(airframe).map((element) => [element.id, element.name]));
  const name = (id: string): string => names.get(id) ?? id;
  const foam = foamLines(airframe, development.parts);
  const items = airframe.items.map(
    (item): MassLine => ({
      key: item.id,
      name: name(item.id),
      group: 'item',
      massG: item.massG,
      at: at(item.id),
      spread: boxSpread(item.massG, item.sizeMm),
    }),
  );
  const gear = airframe.gear.flatMap((leg) => {
    const line: MassLine = {
      key: leg.id,
      name: name(leg.id),
      group: 'gear',
      massG: leg.massG,
      at: at(leg.id),
      spread: barSpread(leg.massG, [0, 1, 0], 0, (leg.wheelMm ?? 0) / 2),
    };
    return onSides(line, leg.mirrored);
  });
  return [
    ...foam,
    ...coveringLines(airframe, resolved.surfaces),
    ...glueLines(airframe, development, foam),
    ...tapeLines(airframe, development.parts),
    ...tubeLines(airframe, development),
    ...items,
    ...airframe.drives.flatMap((drive) => driveLines(drive, name(drive.id), at(drive.id))),
    ...gear,
  ];
}
