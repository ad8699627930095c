import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { MassLine } from '@/lib/figures/types';
import { LINE_TYPE_KINDS, type LineTypeKind } from '@/lib/look/lineTypes';
import type { Part } from '@/lib/parts/types';
import { materialWords } from '@/lib/plan/materialWords';
import { faces as faceNames, parts as words } from '@/lib/text/en/partsPage';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { type Shown, shown } from '@/lib/units/quantity';
import { type Fellows, type Owner, partsByOwner, withFellows } from './elements';
import { type FaceDrawing, faceDrawing, OPPOSITE, pictureDeg } from './faces';
import { grainText, workOn } from './operationWords';
import { NOWHERE, type PlanSprite, type Where, whereOf } from './where';

/** One face as it is read: its picture and what is done on it. */
export interface FaceView {
  readonly drawing: FaceDrawing;
  readonly label: string;
  readonly caption: string;
  readonly work: readonly string[];
}

/** A part with its mirror images as it is read: texts and pictures, nothing left to work out. */
export interface PartDrawing {
  readonly key: string;
  readonly name: string;
  readonly count: string;
  /** Which one is drawn and which is mirrored; null for a part alone. */
  readonly pair: string | null;
  readonly size: readonly [Shown, Shown];
  readonly sheet: string;
  /** Place of its material in the list of materials. */
  readonly material: number;
  /** Foam of one; null when the figures hold no such part. */
  readonly mass: Shown | null;
  readonly grain: string;
  /** The face that it is drawn on, then the other one. */
  readonly faces: readonly [FaceView, FaceView];
  readonly where: Where;
}

export interface PartGroup extends Owner {
  readonly drawings: readonly PartDrawing[];
  /** Places in the list of materials, each once. */
  readonly materials: readonly number[];
}

export interface PartPictures {
  readonly groups: readonly PartGroup[];
  /** What the parts are cut from, by name, in the order of the document. */
  readonly materials: readonly string[];
  /** Line types that the pictures hold, for the key. */
  readonly kinds: readonly LineTypeKind[];
  readonly count: number;
}

interface Shop {
  readonly materialIds: readonly string[];
  readonly sheetOf: (materialId: string, thicknessMm: number) => string;
  readonly masses: readonly MassLine[];
  readonly sprite: PlanSprite | null;
}

function faceView(part: Part, side: 'own' | 'other'): FaceView {
  const face = side === 'own' ? part.face : OPPOSITE[part.face];
  const name = faceNames[face];
  return {
    drawing: faceDrawing(part, face),
    label: fill(words.picture, { part: part.name, face: name }),
    caption: side === 'own' ? name : fill(words.back, { face: name }),
    work: workOn(part, face),
  };
}

function drawingOf(fellows: Fellows, owner: string, { materialIds, sheetOf, masses, sprite }: Shop): PartDrawing {
  const { part, mirrored } = fellows;
  const foam = masses.find(({ key, group }) => key === part.key && group === 'foam');
  const faces = [faceView(part, 'own'), faceView(part, 'other')] as const;
  const { widthMm, heightMm } = faces[0].drawing;
  return {
    key: part.key,
    name: part.name,
    count: mirrored.length === 0 ? words.one : fill(words.pair, { count: mirrored.length + 1 }),
    pair:
      mirrored.length === 0
        ? null
        : fill(words.pairOf, { name: part.name, other: mirrored.map(({ name }) => name).join(', ') }),
    size: [shown(widthMm, 'mm', 0), shown(heightMm, 'mm', 0)],
    sheet: sheetOf(part.materialId, part.thicknessMm),
    material: materialIds.indexOf(part.materialId),
    mass: foam === undefined ? null : shown(foam.massG, 'g', 1),
    grain: grainText(pictureDeg(part, part.grainDeg)),
    faces,
    where: sprite === null ? NOWHERE : whereOf(fellows, owner, sprite),
  };
}

/** Every part drawn and described, under what it belongs to in building order. */
export function partPictures(
  parts: readonly Part[],
  airframe: Airframe,
  masses: readonly MassLine[],
  sprite: PlanSprite | null,
): PartPictures {
  const named = materialWords(airframe.materials);
  const sheetOf: Shop['sheetOf'] = (id, thicknessMm) =>
    fill(words.sheet, { material: named(id), thickness: trimmedDigits(thicknessMm, 2) });
  const used = airframe.materials.filter(({ id }) => parts.some(({ materialId }) => materialId === id));
  const shop: Shop = { materialIds: used.map(({ id }) => id), sheetOf, masses, sprite };
  const groups = partsByOwner(parts, airframe).map(({ id, name, parts: own }): PartGroup => {
    const drawings = withFellows(own).map((fellows) => drawingOf(fellows, id, shop));
    return { id, name, drawings, materials: [...new Set(drawings.map(({ material }) => material))] };
  });
  const drawn = new Set(
    groups.flatMap(({ drawings }) =>
      drawings.flatMap(({ faces }) => faces.flatMap(({ drawing }) => drawing.lines.map(({ kind }) => kind))),
    ),
  );
  return {
    groups,
    materials: used.map(({ id, thicknessMm }) => sheetOf(id, thicknessMm)),
    kinds: LINE_TYPE_KINDS.filter((kind) => kind === 'cut' || drawn.has(kind)),
    count: parts.length,
  };
}
