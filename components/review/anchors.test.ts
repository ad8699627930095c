import { describe, expect, it } from 'vitest';
import type { ViewOutline } from '@/lib/airframe/outlines';
import { Anchor } from '@/lib/contract/bodies';
import { anchorAtPlace, anchorOfChoice, placeOf, type Subjects, spread, wordsOf } from './anchors';

const box = (x0: number, x1: number, y0: number, y1: number): ViewOutline['points'] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

const subjects: Subjects = {
  // The control comes first here to show that the drawing order, not the list's, says what lies on top.
  outlines: [
    {
      elementId: 'wing',
      key: 'wing/aileron',
      kind: 'control',
      side: 'stbd',
      closed: true,
      points: box(150, 190, 120, 260),
    },
    { elementId: 'wing', key: 'wing', kind: 'surface', side: 'port', closed: true, points: box(0, 190, -300, 0) },
    { elementId: 'wing', key: 'wing', kind: 'surface', side: 'stbd', closed: true, points: box(0, 190, 0, 300) },
  ],
  elements: [
    { id: 'wing', name: 'wing' },
    { id: 'wing/aileron', name: 'aileron of the wing' },
  ],
  parts: [{ key: 'wing/p1/sheet/stbd', name: 'Wing panel, starboard', elementId: 'wing' }],
  figures: [{ id: 'stallSpeedMs', name: 'Stall speed' }],
};

describe('a click on the plan', () => {
  it('takes the control over the surface that it lies on', () => {
    expect(anchorAtPlace(subjects, [170, 200])).toEqual({
      kind: 'point',
      view: 'plan',
      mm: [170, 200],
      key: 'wing/aileron',
    });
  });
  it('takes the surface elsewhere, and no element on bare board', () => {
    expect(anchorAtPlace(subjects, [60, -210]).key).toBe('wing');
    expect(anchorAtPlace(subjects, [400, 10])).toEqual({ kind: 'point', view: 'plan', mm: [400, 10] });
  });
  it('makes what the server takes', () => {
    expect(Anchor.safeParse(anchorAtPlace(subjects, [170.4, -200.3])).success).toBe(true);
  });
});

describe('the place of a pin', () => {
  it('is the clicked point', () =>
    expect(placeOf(subjects, { kind: 'point', view: 'plan', mm: [12, -34] })).toEqual([12, -34]));
  it('is the middle of an element, starboard first', () => {
    expect(placeOf(subjects, { kind: 'element', key: 'wing' })).toEqual([95, 150]);
    expect(placeOf(subjects, { kind: 'element', key: 'wing/aileron' })).toEqual([170, 190]);
  });
  it('of a part is its element', () => {
    expect(placeOf(subjects, { kind: 'part', key: 'wing/p1/sheet/stbd' })).toEqual([95, 150]);
  });
  it.each([
    { kind: 'figure', key: 'stallSpeedMs' },
    { kind: 'sheet', key: 'sheet-1' },
    { kind: 'element', key: 'gone' },
    { kind: 'part', key: 'gone' },
    { kind: 'point', view: 'side', mm: [1, 2] },
  ] satisfies Anchor[])('is nowhere on the plan for $kind $key', (anchor) => {
    expect(placeOf(subjects, anchor)).toBeNull();
  });
});

describe('in words', () => {
  it.each([
    [{ kind: 'point', mm: [212.4, -140.6], key: 'wing' }, 'wing, 212 mm aft, 141 mm to port'],
    [{ kind: 'point', mm: [-30, 5] }, '30 mm ahead, 5 mm to starboard'],
    [{ kind: 'element', key: 'wing/aileron' }, 'aileron of the wing'],
    [{ kind: 'part', key: 'wing/p1/sheet/stbd' }, 'part: Wing panel, starboard'],
    [{ kind: 'figure', key: 'stallSpeedMs' }, 'figure: Stall speed'],
    [{ kind: 'figure', key: 'gone' }, 'figure: gone'],
  ] satisfies [Anchor, string][])('%j reads "%s"', (anchor, text) => expect(wordsOf(subjects, anchor)).toBe(text));
});

describe('anchorOfChoice', () => {
  it('keeps the whole key', () => {
    expect(anchorOfChoice('part:wing/p1/sheet:a')).toEqual({ kind: 'part', key: 'wing/p1/sheet:a' });
  });
  it.each(['', 'part:', 'nothing', 'point:wing'])('refuses "%s"', (choice) =>
    expect(anchorOfChoice(choice)).toBeNull(),
  );
});

describe('spread', () => {
  it('moves only pins that would lie on each other', () => {
    expect(spread([[0, 0], [50, 0], null, [1, 1], [0, 2], null], 5)).toEqual([0, 0, 0, 1, 2, 0]);
  });
});
