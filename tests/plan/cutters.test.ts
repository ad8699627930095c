import DxfParser from 'dxf-parser';
import { describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import type { Vec2 } from '@/lib/numerics/vec';
import { draw } from '@/lib/plan/draw';
import { LAYERS, writeDxf } from '@/lib/plan/dxf/writeDxf';
import { expectedLines } from '@/lib/plan/expected';
import { writeSvg } from '@/lib/plan/svg/writeSvg';
import { svgPage } from '@/scripts/cli/svgPage';
import { makePart, rectangle, sampleParts } from '@/tests/support/parts';

// The files for a cutter, read back by parsers that know nothing of the writers.

const stock = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'none' },
  { id: 'ply', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200, count: null, grain: 'none' },
] as const;
const HOSTILE = `</svg><script>alert("x")</script> =cmd|' /C calc'!A0 %%u \u0007`;

const laid = () => {
  const parts = [...sampleParts(), makePart('hostile', rectangle(420, 30), { name: HOSTILE })];
  const layout = layOut(parts, stock, LAYOUT_DEFAULTS);
  const expected = expectedLines(parts, layout);
  return draw(parts, layout).map((drawing) => ({ drawing, expected: expected.get(drawing.id) ?? [] }));
};

const nearest = (found: readonly (readonly Vec2[])[], wanted: readonly Vec2[]): number =>
  Math.min(
    ...found
      .filter(({ length }) => length === wanted.length)
      .map((points) =>
        Math.max(...points.map(([x, y], i) => Math.hypot(x - (wanted[i]?.[0] ?? 0), y - (wanted[i]?.[1] ?? 0)))),
      ),
  );

describe('DXF', () => {
  it.each(laid())('$drawing.id reads back with the same outlines to 0.01 mm', ({ drawing, expected }) => {
    const text = writeDxf(drawing);
    expect(writeDxf(drawing)).toBe(text);
    const dxf = new DxfParser().parseSync(text);
    expect(dxf?.header.$ACADVER).toBe('AC1021');
    // DXF reference, $INSUNITS: 4 is millimetres.
    expect(dxf?.header.$INSUNITS).toBe(4);
    const cuts = dxf?.entities.filter(({ layer }) => layer === LAYERS.cut || layer === LAYERS.check) ?? [];
    const paths = cuts.map((entity) =>
      'vertices' in entity && Array.isArray(entity.vertices) ? entity.vertices.map(({ x, y }): Vec2 => [x, y]) : [],
    );
    expect(cuts.every(({ type }) => type === 'LWPOLYLINE')).toBe(true);
    expect(paths).toHaveLength(expected.length);
    for (const { points } of expected) expect(nearest(paths, points)).toBeLessThan(0.01);
    const closed = cuts.filter((entity) => 'shape' in entity && entity.shape === true);
    expect(closed).toHaveLength(expected.filter((line) => line.closed).length);
  });

  it('keeps a hostile name one text of one line', () => {
    const [first] = laid();
    const dxf = new DxfParser().parseSync(first ? writeDxf(first.drawing) : '');
    const texts = dxf?.entities.filter(({ type }) => type === 'TEXT') ?? [];
    const names = texts.map((entity) => ('text' in entity ? String(entity.text) : ''));
    expect(names.filter((name) => name.includes('alert'))).toHaveLength(1);
    expect(names.some((name) => name.includes('%%'))).toBe(false);
  });
});

describe('DXF texts', () => {
  it('stand with their middle where the label has room, as on paper', () => {
    const [first] = laid();
    if (!first) throw new Error('nothing was laid');
    const entities = new DxfParser().parseSync(writeDxf(first.drawing))?.entities ?? [];
    const wing = first.drawing.texts.find(({ text }) => text === 'Wing panel, stbd');
    const found = entities.find((entity) => 'text' in entity && entity.text === 'Wing panel, stbd');
    // DXF reference, TEXT: 72 = 1 is centre, 73 = 2 is middle, and 11/21 is then the point it stands on.
    expect(found).toMatchObject({ halign: 1, valign: 2 });
    const end = found && 'endPoint' in found ? found.endPoint : null;
    expect(end).toMatchObject({ x: expect.closeTo(wing?.at[0] ?? NaN, 3), y: expect.closeTo(wing?.at[1] ?? NaN, 3) });
  });

  it('list the key beside the sheet', () => {
    const parts = [makePart('tab', rectangle(14, 9), { name: 'A tab with a long name' })];
    const [drawing] = draw(parts, layOut(parts, stock, LAYOUT_DEFAULTS));
    if (!drawing) throw new Error('nothing was drawn');
    const entities = new DxfParser().parseSync(writeDxf(drawing))?.entities ?? [];
    const row = entities.find((entity) => 'text' in entity && String(entity.text).startsWith('K1 = A tab'));
    const start = row && 'startPoint' in row ? row.startPoint : null;
    expect(start).toMatchObject({ x: drawing.sheetMm[0] + 10 });
    expect(writeSvg(drawing, svgPage())).toContain('<desc>K1 = A tab with a long name: upper face up</desc>');
  });
});

/** Start tags of an SVG text with their attributes; enough for a file without comments, as is checked. */
const tagsOf = (svg: string): { name: string; attributes: Map<string, string> }[] =>
  [...svg.matchAll(/<([a-z][a-zA-Z]*)((?:\s+[\w:-]+="[^"<]*")*)\s*\/?>/g)].map(([, name = '', rest = '']) => ({
    name,
    attributes: new Map([...rest.matchAll(/([\w:-]+)="([^"]*)"/g)].map(([, key = '', value = '']) => [key, value])),
  }));

describe('SVG', () => {
  it.each(laid())(
    '$drawing.id is in millimetres, one group an operation, outlines to 0.01 mm',
    ({ drawing, expected }) => {
      const text = writeSvg(drawing, svgPage());
      expect(writeSvg(drawing, svgPage())).toBe(text);
      const [w, h] = drawing.sheetMm;
      const tags = tagsOf(text);
      expect(tags[0]?.attributes.get('width')).toBe(`${w}mm`);
      expect(tags[0]?.attributes.get('viewBox')).toBe(`0 0 ${w} ${h}`);
      const groups = tags.filter(({ name }) => name === 'g').map(({ attributes }) => attributes.get('id'));
      expect(new Set(groups)).toEqual(new Set([...drawing.lines.map(({ type }) => type), 'names']));
      const strokes = tags
        .map(({ attributes }) => attributes.get('stroke'))
        .filter((stroke) => stroke && stroke !== 'none');
      expect(new Set(strokes)).toEqual(new Set(['#000000']));
      const paths = tags
        .filter(({ name }) => name === 'path')
        .map(({ attributes }) =>
          [...(attributes.get('d') ?? '').matchAll(/[ML](\S+) ([^MLZ]+)/g)].map(
            ([, x, y]): Vec2 => [Number(x), h - Number(y)],
          ),
        );
      for (const { points } of expected) expect(nearest(paths, points)).toBeLessThan(0.01);
    },
  );

  it('escapes a hostile name', () => {
    const [first] = laid();
    const text = first ? writeSvg(first.drawing, svgPage()) : '';
    expect(text).toContain('&lt;script&gt;');
    expect(tagsOf(text).map(({ name }) => name)).not.toContain('script');
    expect(text.match(/<\/svg>/g)).toHaveLength(1);
    expect(text).not.toContain('\u0007');
  });
});
