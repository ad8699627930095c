import { describe, expect, it } from 'vitest';
import type { Operation } from '@/lib/parts/types';
import { makePart, rectangle } from '@/tests/support/parts';
import { grainText, workOn } from './operationWords';

const operation = (more: Partial<Operation>): Operation => ({
  id: 'line',
  kind: 'crease',
  path: [
    [10, 0],
    [10, 20],
  ],
  closed: false,
  face: 'upper',
  ...more,
});
const told = (...operations: Partial<Operation>[]) =>
  workOn(makePart('side', rectangle(300, 20), { operations: operations.map(operation) }), 'upper');

describe('workOn', () => {
  it.each<[string, Partial<Operation>, string]>([
    ['a fold that closes the face in view', { angleDeg: 5 }, '1 × crease, fold 5° towards you'],
    ['a fold that opens it', { angleDeg: -5.26 }, '1 × crease, fold 5.3° away from you'],
    ['a hinge that lies flat', { kind: 'cutToPaper', angleDeg: 0 }, '1 × cut to the far paper'],
    ['a bevel through the sheet', { kind: 'bevel', angleDeg: 26, depthMm: 5 }, '1 × bevel 26°'],
    ['a bevel to a depth', { kind: 'bevel', angleDeg: 9.1, depthMm: 2.5 }, '1 × bevel 9.1°, 2.5 mm deep'],
    ['foam out to the far paper', { kind: 'foamOut', widthMm: 8 }, '1 × foam out, 8 mm wide, to the far paper'],
    ['foam out to a depth', { kind: 'foamOut', widthMm: 5, depthMm: 3 }, '1 × foam out, 5 mm wide, 3 mm deep'],
    [
      'a channel whose note tells its size',
      { kind: 'foamOut', widthMm: 5, depthMm: 5, note: 'channel 5 wide, 5 deep' },
      '1 × foam out · channel 5 wide, 5 deep',
    ],
    [
      'a fold whose note tells its angle',
      { kind: 'cutToPaper', angleDeg: 40, note: 'fold 40 degrees, inner faces together' },
      '1 × cut to the far paper · fold 40 degrees, inner faces together',
    ],
    ['glue whose note begins with it', { kind: 'glue', note: 'glue: both edges' }, '1 × glue: both edges'],
    ['a place line with its note', { kind: 'reference', note: 'middle of boom' }, '1 × place line · middle of boom'],
    ['a pin', { kind: 'register', path: [[1, 1]] }, '1 × pin through to the other face'],
  ])('says %s', (_, one, words) => expect(told(one)).toEqual([words]));

  it('counts what is alike and keeps apart what is not', () => {
    expect(told({ angleDeg: 5 }, { angleDeg: 5 }, { angleDeg: 6 })).toEqual([
      '2 × crease, fold 5° towards you',
      '1 × crease, fold 6° towards you',
    ]);
  });

  it('tells pins first and glue last', () => {
    expect(told({ kind: 'glue' }, { kind: 'bevel', angleDeg: 3 }, { kind: 'register' }, {})).toEqual([
      '1 × pin through to the other face',
      '1 × crease',
      '1 × bevel 3°',
      '1 × glue',
    ]);
  });

  it('says each operation on its own face alone, openings on the face that is drawn, and no arrow of the grain', () => {
    const part = makePart('side', rectangle(300, 20), {
      holes: [rectangle(5, 5).toReversed(), rectangle(6, 6).toReversed()],
      operations: [
        operation({ kind: 'register' }),
        operation({ kind: 'tape', face: 'lower' }),
        operation({ id: 'grain', kind: 'reference', note: 'grain' }),
      ],
    });
    expect(workOn(part, 'upper')).toEqual(['1 × pin through to the other face', '2 × opening, cut through']);
    expect(workOn(part, 'lower')).toEqual(['1 × tape']);
  });
});

describe('grainText', () => {
  it.each([
    [null, 'any way'],
    [0, 'left to right in the picture'],
    [180, 'left to right in the picture'],
    [-90, 'up and down in the picture'],
    [90, 'up and down in the picture'],
    [30, '30° from level, rising to the right'],
    [150, '30° from level, falling to the right'],
    [-30, '30° from level, falling to the right'],
  ])('%s', (deg, words) => expect(grainText(deg)).toBe(words));
});
