import { describe, expect, it } from 'vitest';
import { handles } from './handles';
import { startFrom } from './layouts';
import { controlWithin, elementName, elementWithin, namedElements } from './names';
import type { Airframe } from './schema/airframe';

const pusher = startFrom('pusher', 'Test');
const trainer = startFrom('trainer', 'Test');
const servos = pusher.items.filter(({ kind }) => kind === 'servo');

describe('names', () => {
  it('call things by kind, numbered when several are alike, and every one its own', () => {
    expect(servos.length).toBeGreaterThan(1);
    const nameless: Airframe = { ...pusher, items: pusher.items.map(({ name: _, ...item }) => item) };
    expect(servos.map(({ id }) => elementName(nameless, id))).toEqual(servos.map((_, index) => `Servo ${index + 1}`));
    expect(elementName(nameless, 'pack')).toBe('Pack');
    const all = namedElements(nameless).map(({ name }) => name);
    expect(new Set(all).size).toBe(all.length);
  });
  it('keep a given name, with its capital also inside a sentence', () => {
    const own: Airframe = { ...pusher, surfaces: pusher.surfaces.map((one) => ({ ...one, name: `Mine ${one.id}` })) };
    expect(elementName(own, 'wing')).toBe('Mine wing');
    expect(elementWithin(own, 'wing')).toBe('Mine wing');
    expect(elementWithin({ ...pusher, surfaces: pusher.surfaces.map(({ name: _, ...one }) => one) }, 'wing')).toBe(
      'wing',
    );
  });
  it('leave the V of a V-tail standing', () => {
    const vee: Airframe = {
      ...pusher,
      surfaces: pusher.surfaces.map(({ name: _, ...one }) => ({ ...one, role: 'vtail' })),
    };
    expect(elementWithin(vee, 'wing')).toBe('V-tail 1');
  });
  it('number controls of one kind on a surface', () => {
    const aileron = pusher.surfaces[0]?.controls[0];
    if (!aileron) throw new RangeError('the wing has a control');
    expect(controlWithin({ controls: [aileron] }, aileron)).toBe('aileron');
    expect(controlWithin({ controls: [aileron, { ...aileron, id: 'second' }] }, { id: 'second' })).toBe('aileron 2');
  });
  it('answer an unknown id with itself', () => {
    expect(elementName(pusher, 'nothing')).toBe('nothing');
  });
});

describe('labels of handles', () => {
  const labels = (airframe: Airframe) => new Map(handles(airframe).map(({ id, label }) => [id, label]));
  const bare: Airframe = {
    ...trainer,
    surfaces: trainer.surfaces.map(({ name: _, ...one }) => one),
    items: trainer.items.map(({ name: _, ...one }) => one),
    drives: trainer.drives.map(({ name: _, ...one }) => one),
  };
  it('say what a builder says', () => {
    const own = labels(bare);
    expect(own.get('wing/span')).toBe('Span, wing');
    expect(own.get('wing/p1/length')).toBe('Half-span, wing');
    expect(own.get('wing/p1/rootChord')).toBe('Root chord, wing');
    expect(own.get('wing/p1/sweep')).toBe('Sweep, wing');
    expect(own.get('fin/p1/length')).toBe('Height, fin');
    expect(own.get('motor/x')).toBe('Place fore and aft, motor');
    expect(own.get('wing/aileron/from')).toBe('Inner end of aileron, wing');
  });
  it('number the panels of a wing that has several', () => {
    const [wing, ...rest] = bare.surfaces;
    const [panel] = wing?.panels ?? [];
    if (!wing || !panel) throw new RangeError('the wing has a panel');
    const two: Airframe = {
      ...bare,
      surfaces: [
        { ...wing, controls: [], spars: [], panels: [panel, { ...panel, id: 'tip', dihedralDeg: 30 }] },
        ...rest,
      ],
    };
    const own = labels(two);
    expect(own.get('wing/p1/length')).toBe('Panel 1 length, wing');
    expect(own.get('wing/tip/length')).toBe('Panel 2 length, wing');
    expect(own.get('wing/tip/tipChord')).toBe('Panel 2 tip chord, wing');
  });
  it.each(['trainer', 'pusher', 'tailless', 'delta'])('%s: no two handles read alike, and none shows an id', (id) => {
    const airframe = startFrom(id, 'Test');
    const own = [...labels(airframe).values()];
    expect(new Set(own).size).toBe(own.length);
    for (const label of own) expect(label).not.toMatch(/\bp1\b|servo-|[a-z]-(ail|ele|stbd|port)/);
  });
});
