import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { developResolved } from '@/lib/parts/develop';
import { type AnalyseOptions, analyse } from './analyse';
import { type AnalyseMemory, newMemory } from './memory';

// What is kept from one analysis to the next must never show in a figure, whatever is edited in between.

interface Leaf {
  readonly holder: object;
  readonly key: string;
  readonly value: unknown;
}

/** Every value of a document that holds no others. */
const leavesOf = (holder: object): Leaf[] =>
  Object.entries(holder).flatMap(([key, value]: [string, unknown]) =>
    typeof value === 'object' && value !== null ? leavesOf(value) : [{ holder, key, value }],
  );

interface Edit {
  /** Which of the values that can be edited, as a share of their number. */
  readonly at: number;
  readonly factor: number;
  readonly depth: AnalyseOptions['depth'];
  /** Taken back before the next edit. */
  readonly undone: boolean;
}

/** A copy with one number, name or switch changed. */
function edited(document: Airframe, { at, factor }: Edit): Airframe {
  const copy = structuredClone(document);
  const leaves = leavesOf(copy).filter(({ key, value }) => typeof value !== 'string' || key === 'name');
  const leaf = leaves[Math.floor(at * leaves.length)];
  if (!leaf) throw new RangeError('a document has values');
  const { holder, key, value } = leaf;
  if (typeof value === 'number') Reflect.set(holder, key, value === 0 ? factor - 1 : value * factor);
  if (typeof value === 'boolean') Reflect.set(holder, key, !value);
  if (typeof value === 'string') Reflect.set(holder, key, `${value} ${factor}`);
  return copy;
}

/** Parts as the memory has them or makes them. */
function partsOf(document: Airframe, { development }: AnalyseMemory) {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('refused');
  return developResolved(document, resolved.value, development).parts;
}

const edit: fc.Arbitrary<Edit> = fc.record({
  at: fc.double({ min: 0, max: 0.999_999, noNaN: true }),
  factor: fc.double({ min: 0.95, max: 1.05, noNaN: true }),
  depth: fc.constantFrom('live', 'live', 'full'),
  undone: fc.boolean(),
});

describe('figures with a memory', () => {
  it.each(startingLayouts.map(({ id }) => id))(
    '%s: are those without one, to the bit, through any edits',
    (id) => {
      fc.assert(
        fc.property(fc.array(edit, { minLength: 2, maxLength: 8 }), (edits) => {
          const memory = newMemory();
          let document = startFrom(id, 'Test');
          for (const step of edits) {
            const next = edited(document, step);
            expect(analyse(next, { depth: step.depth, memory })).toEqual(analyse(next, { depth: step.depth }));
            if (!step.undone) document = next;
          }
        }),
        { numRuns: 6 },
      );
    },
    60_000,
  );

  it('corrections that are switched off and on again come out the same', () => {
    const memory = newMemory();
    const document = startFrom('pusher', 'Test');
    const on = { bodies: true, propellers: true };
    for (const corrections of [on, { bodies: false, propellers: true }, { bodies: false, propellers: false }, on])
      expect(analyse(document, { depth: 'full', memory, corrections })).toEqual(
        analyse(document, { depth: 'full', corrections }),
      );
  });

  it('what the edit does not touch is not worked out again', () => {
    const memory = newMemory();
    const document = startFrom('pusher', 'Test');
    analyse(document, { depth: 'live', memory });
    const { factors } = memory.aero.lattice;
    const { loads } = memory.aero;
    const before = partsOf(document, memory);
    const heavier = {
      ...structuredClone(document),
      items: document.items.map((item) => ({ ...item, massG: item.massG + 1 })),
    };
    analyse(heavier, { depth: 'live', memory });
    expect(memory.aero.loads).toBe(loads);
    const after = partsOf(heavier, memory);
    expect(after.length).toBeGreaterThan(0);
    after.forEach((part, index) => {
      expect(part).toBe(before[index]);
    });
    const [wing, ...others] = document.surfaces;
    if (!wing) throw new RangeError('a pusher has a wing');
    const slower: Airframe = {
      ...document,
      surfaces: [{ ...wing, controls: wing.controls.map((c) => ({ ...c, chordShare: [0.2, 0.2] })) }, ...others],
    };
    analyse(slower, { depth: 'live', memory });
    expect(memory.aero.loads).not.toBe(loads);
    expect(memory.aero.lattice.factors).toBe(factors);
    const turned = partsOf(slower, memory);
    expect(turned.some((part) => before.includes(part))).toBe(true);
    expect(turned.some((part) => part.elementId === wing.id && !before.includes(part))).toBe(true);
  });
});
