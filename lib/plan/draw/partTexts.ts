import { placePath, placePoint, turnOf } from '@/lib/layout/turns';
import type { Placement } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { DrawnText, KeyEntry } from '../drawing';
import { type LabelLine, ON_ONE_PAGE, type Placer, placer, type Spot, upright } from './labels';
import { besideLongest, leadingEdge, noteOf } from './notes';
import { type DeepPoint, deepPoints, isIn, type LabelRoom } from './room';
import { segmentsOf } from './segments';

const NAME_CAP_MM = 4;
const NOTE_CAP_MM = 2.2;
/** A page that shows more of a part than this, mm2, without its label carries its name again. */
const LARGE_MM2 = 2500;

/** Gives out the marks of a sheet's key: K1, K2, ... */
export interface Key {
  readonly entries: KeyEntry[];
  /** The mark that stands for a text; the same text gets the same mark. */
  readonly markFor: (text: string) => string;
}

/** An empty key for one sheet. */
export function newKey(): Key {
  const entries: KeyEntry[] = [];
  return {
    entries,
    markFor: (text) => {
      const known = entries.find((entry) => entry.text === text)?.mark;
      if (known) return known;
      const mark = fill(plan.sheet.keyMark, { number: entries.filter((entry) => entry.mark !== null).length + 1 });
      entries.push({ mark, text });
      return mark;
    },
  };
}

const longestEdgeDeg = (outline: readonly Vec2[]): number => {
  let best = { length: 0, deg: 0 };
  for (const [[ax, ay], [bx, by]] of segmentsOf(outline, true)) {
    const length = Math.hypot(bx - ax, by - ay);
    if (length > best.length) best = { length, deg: (Math.atan2(by - ay, bx - ax) * 180) / Math.PI };
  }
  return best.deg;
};

const note = (text: string): LabelLine => ({ text, heightMm: NOTE_CAP_MM, font: 'mono' });

/** Where the part's own label is wished, then every deep place at three angles. */
function nameSpots(part: Part, placement: Placement, deep: readonly DeepPoint[], outline: readonly Vec2[]): Spot[] {
  const [first] = part.labels;
  const n = part.labels.length;
  const middle = (axis: 0 | 1): number => part.labels.reduce((sum, { at }) => sum + at[axis], 0) / n;
  const wished: Spot[] = first
    ? [{ at: placePoint([middle(0), middle(1)], placement), angleDeg: first.angleDeg + placement.turnDeg }]
    : [];
  const angles = [...new Set([0, longestEdgeDeg(outline), 90].map(upright))];
  return [...wished, ...deep.flatMap(({ at }) => angles.map((angleDeg): Spot => ({ at, angleDeg })))];
}

/** The part's name with its count and face, together as long as there is room; what has none goes to the key. */
function placeName(part: Part, spots: readonly Spot[], on: Placer, key: Key): void {
  const name: LabelLine = { text: part.name, heightMm: part.labels[0]?.heightMm ?? NAME_CAP_MM, font: 'text' };
  const face = fill(plan.sheet.face, { face: plan.faces[part.face] });
  const more = part.labels.map(({ text }) => text).filter((text) => text !== part.name);
  const rest = [...more.flatMap((text) => text.split(' · ')), face];
  if (on.place({ lines: [name, ...rest.map(note)], spots })) return;
  if (on.place({ lines: [name], spots })) {
    for (const text of rest) {
      if (!on.place({ lines: [note(text)], spots })) {
        key.entries.push({ mark: null, text: fill(plan.sheet.keyNote, { part: part.name, note: text }) });
      }
    }
    return;
  }
  const text = fill(plan.sheet.keyNote, { part: part.name, note: rest.join(' · ') });
  const mark = key.markFor(text);
  if (on.place({ lines: [note(mark)], spots })) return;
  // Not even a number has room: the part is found by its size alone, and the key says that it is there.
  key.entries.splice(
    key.entries.findIndex((entry) => entry.mark === mark),
    1,
    { mark: null, text },
  );
}

function placeNotes(part: Part, placement: Placement, on: Placer, key: Key): void {
  for (const operation of part.operations) {
    const text = noteOf(operation, part);
    if (text === null) continue;
    const spots = besideLongest(placePath(operation.path, placement), operation.closed);
    if (on.place({ lines: [note(text)], spots })) continue;
    const entry = fill(plan.sheet.keyNote, { part: part.name, note: text });
    const before = key.entries.length;
    const mark = key.markFor(entry);
    if (on.place({ lines: [note(mark)], spots }) || key.entries.length === before) continue;
    key.entries.splice(before, 1, { mark: null, text: entry });
  }
}

/** The name again on every page that shows much of the part without its label, so that a loose page can be told. */
function repeatName(part: Part, deep: readonly DeepPoint[], room: LabelRoom, on: Placer): void {
  const angles = [...new Set([0, longestEdgeDeg(room.outline), 90].map(upright))];
  for (const window of room.windows) {
    const inside = deep.filter(({ at }) => isIn(at, window));
    if (inside.reduce((sum, { areaMm2 }) => sum + areaMm2, 0) < LARGE_MM2) continue;
    if (on.texts().some(({ text, at }) => text === part.name && isIn(at, window))) continue;
    const spots = inside.flatMap(({ at }) => angles.map((angleDeg): Spot => ({ at, angleDeg })));
    on.place({ lines: [{ text: part.name, heightMm: NOTE_CAP_MM, font: 'text' }], spots }, ON_ONE_PAGE);
  }
}

/**
 * Everything written in a placed part: notes beside their lines, the name with count and face, and which edge is the front or
 * top one. What finds no place at a readable size gets an entry in the sheet's key, with a mark in its stead where that fits.
 */
export function partTexts(part: Part, placement: Placement, room: LabelRoom, key: Key): DrawnText[] {
  const deep = deepPoints(room);
  const on = placer(room);
  placeName(part, nameSpots(part, placement, deep, room.outline), on, key);
  placeNotes(part, placement, on, key);
  const { cos, sin } = turnOf(placement.turnDeg);
  const edge = leadingEdge(part, room.outline, ([x, y]) => [cos * x - sin * y, sin * x + cos * y]);
  if (edge) on.place({ lines: [note(edge.text)], spots: edge.spots });
  repeatName(part, deep, room, on);
  return on.texts();
}
