import type { ViewOutline } from '@/lib/airframe/outlines';
import type { Anchor } from '@/lib/contract/bodies';
import type { Vec2 } from '@/lib/numerics/vec';
import { threads as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { elementAt } from '../editor/sheet/hit';
import { inDrawingOrder } from '../thumbnail/outline';
import { elementName, type NamedElement } from './elements';

// What a comment is pinned to: from a click or a choice to an anchor, and from an anchor back to a place and to words.

export interface PartName {
  readonly key: string;
  readonly name: string;
  readonly elementId: string;
}
export interface FigureName {
  readonly id: string;
  readonly name: string;
}
/** What can be commented on in one revision. */
export interface Subjects {
  readonly outlines: readonly ViewOutline[];
  readonly elements: readonly NamedElement[];
  readonly parts: readonly PartName[];
  readonly figures: readonly FigureName[];
}

/** How far beside a line a click still means that line, aircraft mm. */
const REACH_MM = 4;

/** The anchor of a click on the plan: the place, and the element under it when there is one. */
export function anchorAtPlace(subjects: Subjects, mm: Vec2): Anchor {
  // A control is named by its own key, not by the surface that carries it.
  const drawn = inDrawingOrder(subjects.outlines).map((outline) => ({ ...outline, elementId: outline.key }));
  const key = elementAt(drawn, mm, REACH_MM);
  return { kind: 'point', view: 'plan', mm: [mm[0], mm[1]], ...(key === null ? {} : { key }) };
}

/** Middle of what surrounds an element's first outline (starboard before port), or null when it is not drawn. */
function middleOf(outlines: readonly ViewOutline[], key: string): Vec2 | null {
  const own = outlines.filter((outline) => outline.key === key);
  const points = (own.find(({ side }) => side !== 'port') ?? own[0])?.points;
  if (points === undefined || points.length === 0) return null;
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
}

/** Where the pin of an anchor stands on the plan; null for what has no place there (a figure, a sheet). */
export function placeOf(subjects: Subjects, anchor: Anchor): Vec2 | null {
  const { kind, key, view, mm } = anchor;
  switch (kind) {
    case 'point':
      if (mm !== undefined && (view === undefined || view === 'plan')) return mm;
      return key === undefined ? null : middleOf(subjects.outlines, key);
    case 'element':
      return key === undefined ? null : middleOf(subjects.outlines, key);
    case 'part': {
      const part = subjects.parts.find((each) => each.key === key);
      return part === undefined ? null : middleOf(subjects.outlines, part.elementId);
    }
    case 'figure':
    case 'sheet':
    case 'rule':
      return null;
  }
}

/** What an anchor is about, in words. */
export function wordsOf(subjects: Subjects, anchor: Anchor): string {
  const { kind, key, mm } = anchor;
  const element = key === undefined ? undefined : elementName(subjects.elements, key);
  switch (kind) {
    case 'point': {
      if (mm === undefined) return element ?? words.whole;
      const numbers = {
        x: fixedDigits(Math.abs(mm[0]), 0),
        along: mm[0] < 0 ? words.ahead : words.aft,
        y: fixedDigits(Math.abs(mm[1]), 0),
        side: mm[1] < 0 ? words.port : words.starboard,
      };
      return element === undefined ? fill(words.atBare, numbers) : fill(words.atPlace, { element, ...numbers });
    }
    case 'element':
      return element ?? words.whole;
    case 'part':
      return fill(words.onPart, { part: subjects.parts.find((each) => each.key === key)?.name ?? key ?? '' });
    case 'figure':
      return fill(words.onFigure, { figure: subjects.figures.find((each) => each.id === key)?.name ?? key ?? '' });
    case 'sheet':
      return fill(words.onSheet, { key: key ?? '' });
    case 'rule':
      return fill(words.onRule, { key: key ?? '' });
  }
}

/** The value of an entry in the list of subjects, and back: "part:wing/p1/sheet/stbd". */
export function anchorOfChoice(choice: string): Anchor | null {
  const cut = choice.indexOf(':');
  const kind = (['element', 'part', 'figure'] as const).find((each) => each === choice.slice(0, cut));
  const key = choice.slice(cut + 1);
  return kind === undefined || key === '' ? null : { kind, key };
}

/** Steps to the right for pins that would lie on each other: the first 0, the next 1, and so on. */
export function spread(places: readonly (Vec2 | null)[], apartMm: number): readonly number[] {
  return places.map((place, index) => {
    if (place === null) return 0;
    const before = places.slice(0, index);
    return before.filter((other) => other !== null && Math.hypot(other[0] - place[0], other[1] - place[1]) < apartMm)
      .length;
  });
}
