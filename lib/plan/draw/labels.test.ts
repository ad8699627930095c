import { describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import type { SheetStock } from '@/lib/layout/types';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import { makePart, rectangle } from '@/tests/support/parts';
import { draw } from '../draw';
import type { Drawing, DrawnText } from '../drawing';
import type { Box } from './room';
import { pointToSegment } from './segments';

const stock: readonly SheetStock[] = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 900, hMm: 500, count: null, grain: 'none' },
];
const drawn = (parts: readonly Part[], windows: readonly Box[] = []): Drawing => {
  const [sheet] = draw(parts, layOut(parts, stock, LAYOUT_DEFAULTS), { windows: new Map([['sheet-1', windows]]) });
  if (!sheet) throw new Error('nothing was drawn');
  return sheet;
};
const named = ({ texts }: Drawing, text: string): DrawnText[] => texts.filter((found) => found.text === text);

/** Both ends of a text, with letters at half the height of a capital wide: no font is narrower. */
const endsOf = ({ at, text, heightMm, angleDeg }: DrawnText): Vec2[] => {
  const half = (text.length * heightMm * 0.5) / 2;
  const [dx, dy] = [Math.cos(radFromDeg(angleDeg)) * half, Math.sin(radFromDeg(angleDeg)) * half];
  return [
    [at[0] - dx, at[1] - dy],
    [at[0] + dx, at[1] + dy],
  ];
};
const within = (text: DrawnText, [x0, y0, x1, y1]: Box): boolean =>
  endsOf(text).every(([x, y]) => x > x0 && x < x1 && y > y0 && y < y1);

const crease = (more: Partial<Operation>): Operation => ({
  id: 'fold',
  kind: 'crease',
  path: [
    [100, 0],
    [100, 200],
  ],
  closed: false,
  face: 'upper',
  ...more,
});

describe('labels on printed pages', () => {
  // Three pages side by side; the seams run through the middle of the part and of its middle third.
  const windows: readonly Box[] = [
    [0, 0, 190, 300],
    [210, 0, 390, 300],
    [410, 0, 600, 300],
  ];
  const wide = makePart('wing', rectangle(590, 200), { name: 'Wing' });

  it('stand wholly on one page, even where the middle of the part is a seam', () => {
    const { texts } = drawn([makePart('wing', rectangle(400, 200), { name: 'Wing' })], windows.slice(0, 2));
    const words = texts.filter(({ text }) => text !== '100 mm');
    expect(words.length).toBeGreaterThan(1);
    for (const text of words)
      expect(
        windows.some((window) => within(text, window)),
        text.text,
      ).toBe(true);
  });

  it('name a large part once on every page that shows it', () => {
    const names = named(drawn([wide], windows), 'Wing');
    for (const window of windows) expect(names.filter((text) => within(text, window))).toHaveLength(1);
    expect(Math.max(...names.map(({ heightMm }) => heightMm))).toBe(4);
  });

  it('name it once when there are no pages to think of', () => {
    expect(named(drawn([wide]), 'Wing')).toHaveLength(1);
  });

  it('keep the lines of a label together and in order when the part is turned', () => {
    const part = makePart('fin', rectangle(200, 120), {
      name: 'Fin, port',
      labels: [
        { at: [100, 64], text: 'Fin, port', heightMm: 5, angleDeg: 180 },
        { at: [100, 56], text: '2 of 2, mirrored', heightMm: 5, angleDeg: 180 },
      ],
    });
    const sheet = drawn([part]);
    const lines = ['Fin, port', '2 of 2, mirrored', 'upper face up'].map((text) => named(sheet, text)[0]);
    // Down a page is to the right of the way the letters run.
    const down = lines.map((text) => {
      if (!text) throw new Error('a line of the label is missing');
      const rad = radFromDeg(text.angleDeg);
      return text.at[0] * Math.sin(rad) - text.at[1] * Math.cos(rad);
    });
    const [name = 0, count = 0, face = 0] = down;
    expect(count).toBeGreaterThan(name);
    expect(face).toBeGreaterThan(count);
    expect(face - name).toBeLessThan(20);
  });
});

describe('what has no room', () => {
  it('gets a mark on the part and its words in the key', () => {
    const { texts, key } = drawn([makePart('tab', rectangle(14, 9), { name: 'A tab with a long name' })]);
    expect(key).toEqual([{ mark: 'K1', text: 'A tab with a long name: upper face up' }]);
    expect(texts.filter(({ text }) => text === 'K1')).toHaveLength(1);
  });

  it('is listed without a mark when not even that fits', () => {
    const { texts, key } = drawn([makePart('chip', rectangle(3, 3), { name: 'Chip' })]);
    expect(key).toEqual([{ mark: null, text: 'Chip: upper face up' }]);
    expect(texts.some(({ text }) => text.startsWith('K'))).toBe(false);
  });

  it('is never a note without a line: a fold in a narrow part is said in the key', () => {
    const part = makePart('strip', rectangle(300, 8), {
      name: 'Strip',
      operations: [
        crease({
          angleDeg: 12,
          path: [
            [150, 0],
            [150, 8],
          ],
        }),
      ],
    });
    const { texts, key } = drawn([part]);
    const notes = [...texts.map(({ text }) => text), ...key.map(({ text }) => text)];
    expect(notes.filter((text) => text.includes('fold 12°'))).toHaveLength(1);
  });
});

describe('notes', () => {
  const part = (operation: Operation, more: Partial<Part> = {}): Drawing =>
    drawn([makePart('side', rectangle(300, 200), { operations: [operation], ...more })]);

  it.each([
    { name: 'a fold that closes the face in view', operation: crease({ angleDeg: 5 }), says: 'fold 5° towards you' },
    { name: 'a fold that opens it', operation: crease({ angleDeg: -5 }), says: 'fold 5° away from you' },
    {
      name: 'a fold cut to the far paper, with its note',
      operation: crease({ kind: 'cutToPaper', angleDeg: 15.4, note: 'varnish' }),
      says: 'fold 15.4° towards you · varnish',
    },
    {
      name: 'work from the face below',
      operation: crease({ kind: 'bevel', angleDeg: 2, face: 'lower' }),
      says: 'bevel 2° · on the lower face',
    },
    {
      name: 'tape on the face below',
      operation: crease({ kind: 'tape', face: 'lower' }),
      says: 'tape here · on the lower face',
    },
  ])('say $name', ({ operation, says }) => {
    expect(named(part(operation), says)).toHaveLength(1);
  });

  it('say which edge is the front one, on its inside', () => {
    // The frame's x axis runs aft, so the front edge is the left one before the part is laid; it may lie turned.
    const sheet = part(crease({ angleDeg: 5 }));
    const [front] = named(sheet, 'front');
    const outline = sheet.lines.find(({ id }) => id === 'side#outline')?.points ?? [];
    const [a, , , d] = outline;
    if (!front || !a || !d) throw new Error('the front edge or its word is missing');
    expect(pointToSegment(front.at, [a, d])).toBeLessThan(13);
  });

  it('say which edge is the top one on a part that stands across', () => {
    const sheet = part(crease({ angleDeg: 5 }), { frame: { origin: [0, 0, 0], ex: [0, 1, 0], ey: [0, 0, 1] } });
    expect(named(sheet, 'top')).toHaveLength(1);
    expect(named(sheet, 'front')).toHaveLength(0);
  });
});
