import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { FigureMarks } from '@/lib/figures/types';
import { light } from '@/lib/look/tokens';
import { foldSheet, type Sheet, screenFromMm } from './fold';
import { type Picture, paintSheet } from './paintSheet';
import type { Pen } from './pen';
import { extentsOf, sceneOf } from './scene';

const example = (name: string): Airframe => JSON.parse(readFileSync(`examples/${name}.json`, 'utf8'));

const MARKS: FigureMarks = {
  mac: { lengthMm: 170, leXMm: 7, yMm: 145, zMm: 0 },
  aerodynamicCentreXMm: 50,
  neutralPointXMm: 81,
  neutralPointBandXMm: [73, 90],
  cgRangeXMm: [52, 61],
  firstFlightCgXMm: 54,
  cg: [58, 0, -10],
};
const labels = {
  plan: 'plan',
  side: 'side',
  front: 'front',
  mac: 'MAC',
  cg: 'CG',
  np: 'NP',
  range: 'range',
  rule: { metric: 'rule, mm', imperial: 'rule, in' },
};

interface Call {
  readonly name: string;
  readonly args: readonly unknown[];
}

/** Writes down every call with its arguments instead of drawing. */
function notingPen() {
  const calls: Call[] = [];
  const note =
    (name: string) =>
    (...args: unknown[]) => {
      calls.push({ name, args });
    };
  const pen: Pen = {
    save: note('save'),
    restore: note('restore'),
    beginPath: note('beginPath'),
    closePath: note('closePath'),
    moveTo: note('moveTo'),
    lineTo: note('lineTo'),
    arc: note('arc'),
    rect: note('rect'),
    clip: note('clip'),
    fill: note('fill'),
    stroke: note('stroke'),
    fillRect: note('fillRect'),
    fillText: note('fillText'),
    setLineDash: note('setLineDash'),
    createLinearGradient: (...args) => {
      calls.push({ name: 'createLinearGradient', args });
      return { addColorStop: note('addColorStop') };
    },
    strokeStyle: '',
    fillStyle: '',
    lineWidth: 1,
    lineJoin: 'miter',
    lineCap: 'butt',
    globalAlpha: 1,
    font: '',
    textAlign: 'left',
    textBaseline: 'middle',
  };
  return { pen, calls };
}

const pictureOf = (airframe: Airframe, change: Partial<Picture> = {}): Picture => {
  const scene = sceneOf(airframe);
  const sheet = foldSheet({ width: 1440, height: 700, insetRight: 0 }, extentsOf(scene));
  return {
    sheet,
    scene,
    marks: MARKS,
    cg: [58, 0, -10],
    selected: 'wing',
    palette: light,
    system: 'metric',
    labels,
    ...change,
  };
};

const texts = (calls: readonly Call[]) => calls.filter(({ name }) => name === 'fillText').map(({ args }) => args[0]);

describe('paintSheet', () => {
  it.each(['tarrel-620', 'ombry-1000', 'quenlet-700', 'quenlet-1050', 'hask'])(
    'draws %s with finite numbers only',
    (name) => {
      const { pen, calls } = notingPen();
      paintSheet(pen, pictureOf(example(name)));
      const numbers = calls.flatMap(({ args }) => args.filter((arg) => typeof arg === 'number'));
      expect(numbers.length).toBeGreaterThan(500);
      expect(numbers.filter((number) => !Number.isFinite(number))).toEqual([]);
    },
  );

  it('says CG, range and neutral point in numbers, and leaves out what is not known', () => {
    const known = notingPen();
    paintSheet(known.pen, pictureOf(example('tarrel-620')));
    expect(texts(known.calls)).toEqual(expect.arrayContaining(['CG 58', 'range 52…61', 'NP 81']));
    const unknown = notingPen();
    paintSheet(unknown.pen, pictureOf(example('tarrel-620'), { marks: null, cg: null }));
    expect(
      texts(unknown.calls).filter((text) => String(text).startsWith('CG') || String(text).startsWith('NP')),
    ).toEqual([]);
  });

  it('draws the wing’s corner where the transform puts it', () => {
    const airframe = example('tarrel-620');
    const picture = pictureOf(airframe);
    const { pen, calls } = notingPen();
    paintSheet(pen, picture);
    const wing = picture.scene.plan.find(({ elementId, kind }) => elementId === 'wing' && kind === 'surface');
    const corner = wing?.points[0];
    if (corner === undefined) throw new RangeError('the wing has an outline');
    const sheet: Sheet = picture.sheet;
    const [x, y] = screenFromMm(sheet.plan, corner);
    expect(calls).toContainEqual({ name: 'moveTo', args: [x, y] });
  });
});
