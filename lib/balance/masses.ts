import { namedElements } from '@/lib/airframe/names';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { motorCentre, thrustDirection } from '@/lib/airframe/thrust';
import type { Kept } from '@/lib/numerics/kept';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Development, Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import { glueLines } from './glue';
import type { MassLine } from './line';
import { coveringLines, undevelopedLines } from './panelMasses';
import { type PartMasses, partMasses } from './partMasses';
import { type Piece, rodPiece } from './piece';
import { onSides } from './sides';
import { barSpread, boxSpread } from './spread';

/** Bought lengths: spars, booms, rods. A pair off the centre is given once and stands on both sides. */
function tubeLines(airframe: Airframe, development: Development): MassLine[] {
  return development.stockPieces.flatMap((piece) => {
    const tube = airframe.tubes.find(({ id }) => id === piece.tubeId);
    if (!tube) throw new RangeError(`stock piece ${piece.key} names an unknown tube ${piece.tubeId}`);
    const massG = (tube.massPerMetreG * piece.lengthMm) / 1000;
    const line: MassLine = {
      key: piece.key,
      name: piece.name,
      group: 'tube',
      basis: `tube/${tube.id}`,
      ...rodPiece(massG, piece.from, piece.to),
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
      basis: `${drive.id}/motor`,
      massG: motor.massG,
      at: motorCentre(drive, disc),
      spread: barSpread(motor.massG, axis, motor.lengthMm, motor.diameterMm / 2),
    },
    {
      key: `${drive.id}/${drive.kind === 'propeller' ? 'propeller' : 'fan'}`,
      name: drive.kind === 'propeller' ? fill(texts.propeller, { drive: name }) : name,
      group: 'drive',
      basis: `${drive.id}/turning`,
      massG: turning.massG,
      at: disc,
      spread: barSpread(turning.massG, axis, 0, turning.diameterMm / 2),
    },
  ];
  return lines.flatMap((line) => onSides(line, drive.mirrored));
}

const foamLine = ({ key, name, materialId }: Part, piece: Piece): MassLine => ({
  key,
  name,
  group: 'foam',
  basis: `sheet/${materialId}`,
  ...piece,
});

const tapeLine = ({ key, name }: Part, piece: Piece): MassLine => ({
  key: `${key}/tape`,
  name: fill(texts.tape, { part: name }),
  group: 'glue',
  basis: 'tape',
  ...piece,
});

/**
 * Every mass of the aircraft: the foam itself part by part (area times the sheet's mass, less what bevels and channels take away),
 * panels that cannot be cut yet by their area and section, coverings, glue, tape, tubes, items, drives and gear. Not counted: paint, the glue of horns, servos, gear and motor; the kerf is not taken off.
 * Throws RangeError when parts and airframe do not belong together.
 * @param memory parts that are the same as in the last call are not weighed again
 */
export function massList(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  development: Development,
  memory?: Kept<PartMasses>,
): MassLine[] {
  const at = (id: string): Vec3 => {
    const place = resolved.places.get(id);
    if (!place) throw new RangeError(`element ${id} has no place`);
    return place.at;
  };
  const names = new Map(namedElements(airframe).map((element) => [element.id, element.name]));
  const name = (id: string): string => names.get(id) ?? id;
  const { parts } = development;
  const masses = partMasses(airframe, parts, memory);
  const held = (pick: 'foam' | 'tape', lineOf: (part: Part, piece: Piece) => MassLine) =>
    parts.flatMap((part, index): MassLine[] => {
      const piece = masses[index]?.[pick];
      return piece ? [lineOf(part, piece)] : [];
    });
  const foam = held('foam', foamLine);
  const items = airframe.items.map(
    (item): MassLine => ({
      key: item.id,
      name: name(item.id),
      group: 'item',
      basis: item.id,
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
      basis: leg.id,
      massG: leg.massG,
      at: at(leg.id),
      spread: barSpread(leg.massG, [0, 1, 0], 0, (leg.wheelMm ?? 0) / 2),
    };
    return onSides(line, leg.mirrored);
  });
  return [
    ...foam,
    ...undevelopedLines(airframe, resolved.surfaces, parts, name),
    ...coveringLines(airframe, resolved.surfaces, name),
    ...glueLines(airframe, resolved, development, masses, foam, name),
    ...held('tape', tapeLine),
    ...tubeLines(airframe, development),
    ...items,
    ...airframe.drives.flatMap((drive) => driveLines(drive, name(drive.id), at(drive.id))),
    ...gear,
  ];
}
