import { describe, expect, it } from 'vitest';
import tarrel from '@/examples/tarrel-620.json';
import { parseAirframe } from '@/lib/airframe/parse';
import type { Part } from '@/lib/parts/types';
import { partRows, stockRows } from './partRows';

const parsed = parseAirframe(tarrel);
if (!parsed.ok) throw new RangeError(`the example does not open: ${parsed.problems[0]?.message}`);

const part: Part = {
  key: 'wing/p1/sheet/stbd',
  name: 'Wing panel',
  elementId: 'wing',
  side: 'stbd',
  materialId: 'board-5',
  thicknessMm: 4.75,
  face: 'upper',
  outline: [
    [-10, 5],
    [300.4, 5],
    [300.4, 205],
    [-10, 180],
  ],
  holes: [],
  operations: [],
  labels: [],
  grainDeg: null,
  frame: { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] },
};

describe('partRows', () => {
  it('says what a part is cut from and how large it is', () => {
    expect(partRows([part], parsed.value)[0]).toMatchObject({
      material: 'paper-faced board',
      thickness: '4.75',
      size: '310 × 200',
    });
  });
  it('keeps the id of a sheet that the document does not know', () => {
    expect(partRows([{ ...part, materialId: 'gone' }], parsed.value)[0]?.material).toBe('gone');
  });
});

describe('stockRows', () => {
  it('writes whole millimetres', () => {
    const piece = {
      key: 'k',
      name: 'Boom',
      tubeId: 'carbon-4-2',
      lengthMm: 349.6,
      count: 2,
      from: [0, 0, 0],
      to: [1, 0, 0],
    } as const;
    expect(stockRows([piece])[0]).toMatchObject({ length: '350', count: '2' });
  });
});
