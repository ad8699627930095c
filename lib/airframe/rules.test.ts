import { describe, expect, it } from 'vitest';
import { startFrom } from './layouts';
import { at, broken, control, first, panel, pusher, put, wing } from './testing/broken';

describe('ids and references', () => {
  it.each([
    { name: 'two items', path: 'items.1.id', value: 'pack', where: 'items.1.id', other: 'items.0.id' },
    { name: 'an item and a surface', path: 'items.1.id', value: 'wing', where: 'items.1.id', other: 'surfaces.0.id' },
    {
      name: 'a spar and a panel',
      path: wing('spars.0.id'),
      value: 'p1',
      where: wing('spars.0.id'),
      other: 'surfaces.0.panels.0.id',
    },
    {
      name: 'two stations',
      path: 'bodies.0.stations.1.id',
      value: 's1',
      where: 'bodies.0.stations.1.id',
      other: 'bodies.0.stations.0.id',
    },
  ])('names both places of a duplicate: $name', ({ path, value, where, other }) => {
    const problem = broken(path, value).find(({ code }) => code === 'duplicate-id');
    expect(problem?.path).toBe(where);
    expect(problem?.message).toContain(other);
    expect(problem?.message).toContain(`"${value}"`);
  });
  it('keeps "datum" for the origin', () => {
    expect(first('items.0.id', 'datum')).toMatchObject({ code: 'reserved-id', path: 'items.0.id' });
  });
  it.each([
    { path: panel('materialId'), value: 'board-50', known: 'board-5, ply-2' },
    { path: panel('coveringId'), value: 'silk', known: 'no covering' },
    { path: wing('spars.0.tubeId'), value: 'carbon', known: 'carbon-5-3' },
    { path: 'booms.0.tubeId', value: 'carbon', known: 'carbon-5-3' },
    { path: 'bodies.0.formers.0.materialId', value: 'oak', known: 'board-5' },
    { path: 'drives.0.controllerItemId', value: 'none', known: 'esc' },
    { path: 'joints.0.between.0', value: 'canopy', known: 'wing' },
  ])('names an unknown reference at $path', ({ path, value, known }) => {
    const problem = first(path, value);
    expect(problem).toMatchObject({ code: 'unknown-reference', path });
    expect(problem?.message).toContain(`"${value}"`);
    expect(problem?.fix).toContain(known);
  });
  it('wants an item of the right kind', () => {
    expect(first('drives.0.packItemId', 'rx')).toMatchObject({ code: 'wrong-item-kind', path: 'drives.0.packItemId' });
  });
  it('wants two ends of a joint', () => {
    expect(first('joints.0.between', ['wing', 'wing'])).toMatchObject({
      code: 'joint-with-itself',
      path: 'joints.0.between',
    });
  });
  it('refuses mounts in a loop and on nothing', () => {
    expect(broken('booms.0.mount', { to: 'tail', at: [0, 0, 0] }).map(({ code }) => code)).toContain('mount-loop');
    expect(first('booms.0.mount.to', 'mast')).toMatchObject({ code: 'unknown-mount', path: 'booms.0.mount.to' });
  });
});

describe('what no sheet can be cut to', () => {
  it.each([
    {
      name: '10 m of span in 1 mm sheet',
      doc: put(pusher, at(panel('lengthMm')), 5000),
      path: 'materials.0.thicknessMm',
      value: 1,
      code: 'span-over-sheet',
      where: panel('lengthMm'),
      says: '1 mm sheet',
    },
    {
      name: 'a control that ends before it begins',
      path: control('to'),
      value: 0.3,
      code: 'control-ends-before-it-begins',
      says: 'aileron',
    },
    { name: 'a control without length', path: control('to'), value: 0.51, code: 'control-too-short', says: '12 mm' },
    {
      name: 'a control under a sheet wide',
      path: control('chordShare.1'),
      value: 0.02,
      code: 'control-too-narrow',
      says: '5 mm sheet',
    },
    {
      name: 'a control that leaves no wing',
      path: control('chordShare.0'),
      value: 1,
      code: 'control-leaves-nothing',
      says: '0 mm of fixed surface',
    },
    {
      name: 'a control at a pointed tip',
      doc: put(pusher, at(control('to')), 1),
      path: panel('tipChordMm'),
      value: 0,
      code: 'control-too-narrow',
      where: control('chordShare.1'),
      says: 'outer end',
    },
    {
      name: 'a chord under the sheet',
      path: panel('tipChordMm'),
      value: 3,
      code: 'chord-under-sheet',
      says: '5 mm sheet',
    },
    {
      name: 'a surface on the wrong side',
      path: wing('mount.at'),
      value: [0, -40, 0],
      code: 'foreign-side',
      where: wing('mirrored'),
      says: '-40 mm',
    },
    { name: 'half a wing', path: wing('mirrored'), value: false, code: 'one-sided', says: '"wing"' },
    {
      name: 'a twin inside itself',
      path: 'surfaces.2.mount',
      value: { to: 'datum', at: [400, 0, 0] },
      code: 'mirrored-on-centre-line',
      where: 'surfaces.2.mirrored',
      says: '"fin"',
    },
    {
      name: 'a boom inside its twin',
      path: 'booms.0.mount.at',
      value: [40, 1, -5],
      code: 'mirrored-on-centre-line',
      where: 'booms.0.mirrored',
      says: '"boom"',
    },
    {
      name: 'stations that go back',
      path: 'bodies.0.stations.2.xMm',
      value: 60,
      code: 'stations-not-rising',
      says: '"s3"',
    },
    {
      name: 'a station upside down',
      path: 'bodies.0.stations.1.topMm',
      value: -60,
      code: 'station-upside-down',
      says: '"s2"',
    },
    {
      name: 'a former outside the body',
      path: 'bodies.0.formers.0.xMm',
      value: 500,
      code: 'outside-body',
      says: '405 mm',
    },
    {
      name: 'an opening that ends first',
      path: 'bodies.0.openings.0.toX',
      value: 10,
      code: 'range-reversed',
      says: '"hatch"',
    },
    {
      name: 'a spar that ends first',
      doc: put(pusher, at(wing('spars.0.from')), 0.5),
      path: wing('spars.0.to'),
      value: 0.2,
      code: 'range-reversed',
      says: '"spar"',
    },
    {
      name: 'a spar of nothing',
      path: wing('spars.0.tubeId'),
      value: undefined,
      code: 'spar-material',
      where: wing('spars.0.tubeId'),
      says: '"spar"',
    },
    {
      name: 'a bore as wide as its tube',
      path: 'tubes.0.innerMm',
      value: [5, 5],
      code: 'bore-over-outside',
      where: 'tubes.0.innerMm.0',
      says: '5 mm',
    },
    {
      name: 'faces heavier than the board',
      path: 'materials.0.facesGm2',
      value: 400,
      code: 'faces-too-heavy',
      says: '320',
    },
    {
      name: 'a slide that goes backwards',
      path: 'items.0.slide',
      value: { fromMm: 20, toMm: -20 },
      code: 'range-reversed',
      where: 'items.0.slide.toMm',
      says: '20 mm',
    },
    {
      name: 'a slide that misses its place',
      path: 'items.0.slide',
      value: { fromMm: 20, toMm: 40 },
      code: 'slide-without-place',
      says: '20',
    },
    {
      name: 'a margin that goes backwards',
      path: 'flight.staticMarginPct',
      value: [12, 7],
      code: 'range-reversed',
      says: '12 %',
    },
  ])('$name', ({ doc, path, value, code, where, says }) => {
    const problem = broken(path, value, doc).find((one) => one.code === code);
    expect(problem?.path).toBe(where ?? path);
    expect(problem?.message).toContain(says);
  });
  it('refuses controls that overlap, and takes ones that meet', () => {
    const aileron = startFrom('pusher', 'Test').surfaces[0]?.controls[0];
    const flap = (to: number) => ({ ...aileron, id: 'flap', kind: 'flap', from: 0.1, to });
    const problem = first(wing('controls'), [aileron, flap(0.55)]);
    expect(problem).toMatchObject({ code: 'controls-overlap', path: 'surfaces.0.controls.1.from' });
    expect(problem?.message).toContain('from 0.5 to 0.55');
    expect(broken(wing('controls'), [aileron, flap(0.5)])).toEqual([]);
  });
  it('refuses a hinge that bends at a joint, and takes one that runs straight across it', () => {
    const [whole] = startFrom('pusher', 'Test').surfaces[0]?.panels ?? [];
    const split = (dihedralDeg: number, sweepDeg = 0) => [
      { ...whole, id: 'a', lengthMm: 210, tipChordMm: 166 },
      { ...whole, id: 'b', lengthMm: 140, rootChordMm: 166, dihedralDeg, sweepDeg },
    ];
    expect(broken(wing('panels'), split(0))).toEqual([]);
    for (const panels of [split(5), split(0, 20)]) {
      const problem = first(wing('panels'), panels);
      expect(problem).toMatchObject({ code: 'hinge-bends', path: control('to') });
      expect(problem?.fix).toContain('0.6');
    }
  });
});
