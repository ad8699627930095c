import { describe, expect, it } from 'vitest';
import hask from '@/examples/hask.json';
import ombry from '@/examples/ombry-1000.json';
import quenlet from '@/examples/quenlet-1050.json';
import tarrel from '@/examples/tarrel-620.json';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { parseAirframe } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { texts } from '@/lib/text/en/checks';
import { airframe } from '@/tests/support/airframe';
import { item, straightBody } from './testing/boxBody';
import { allChecked } from './testing/checked';
import { applyWaivers } from './waivers';

const parsed = (data: unknown): Airframe => {
  const result = parseAirframe(data);
  if (!result.ok) throw new RangeError('an example does not parse');
  return result.value;
};
const aircraft = [
  ...[hask, ombry, quenlet, tarrel].map((data) => ({ name: data.name, made: parsed(data) })),
  ...startingLayouts.map(({ id, name }) => ({ name, made: startFrom(id, name) })),
];
const FIGURES = { cg: [60, 0, -10], packFirstFlightMm: 3, hingeTorquePct: 60 } as const;

/** Follows a path with dots into a document. */
const reached = (document: unknown, path: string): unknown =>
  path.split('.').reduce<unknown>((at, key) => (at instanceof Object ? Reflect.get(at, key) : undefined), document);

describe.each(aircraft)('$name', ({ made }) => {
  const results = allChecked(made, FIGURES);

  it('has one result for a rule and an element, pinned to a place and to the document', () => {
    const keys = results.map(({ ruleId, elementId }) => `${ruleId} ${elementId}`);
    expect(new Set(keys).size).toBe(keys.length);
    for (const { at, path } of results) {
      expect(at.every(Number.isFinite)).toBe(true);
      expect(reached(made, path.replace(/\.(slide|duct)$/, ''))).toBeDefined();
    }
  });

  it('says what was measured in words and numbers, and what to do where something is to be done', () => {
    for (const { level, fix, measured, words, waivable } of results) {
      expect(words).not.toMatch(/[{}]|NaN|Infinity|undefined/);
      expect(measured === null || Number.isFinite(measured.value)).toBe(true);
      expect(fix === null).toBe(level === 'ok');
      expect(waivable).toBe(level === 'watch' || level === 'bad');
    }
  });
});

it('says the same again', () => {
  for (const { made } of aircraft) expect(allChecked(made, FIGURES)).toEqual(allChecked(made, FIGURES));
});

it('every rule speaks of at least one of them', () => {
  const spoken = new Set(aircraft.flatMap(({ made }) => allChecked(made, FIGURES).map(({ ruleId }) => ruleId)));
  expect([...spoken].sort()).toEqual(Object.keys(texts.rules).sort());
});

describe('waivers', () => {
  const clash = airframe({
    bodies: [straightBody()],
    items: [
      item('pack', 'pack', [200, 0, 0], [80, 34, 24]),
      item('servo', 'servo', [200, 0, 0], [20, 12, 24]),
      item('rx', 'receiver', [205, 0, 0], [20, 12, 10]),
    ],
  });
  const results = allChecked(clash);
  const waiver = { ruleId: 'boxes-meet', elementId: 'pack', reason: 'the pack has a notch there' };

  it('mark the one finding they name, with the reason, and leave it as measured', () => {
    const marked = applyWaivers(results, [waiver]);
    const waived = marked.filter((one) => one.waived !== null);
    expect(waived.map(({ ruleId, elementId, waived: reason }) => [ruleId, elementId, reason])).toEqual([
      ['boxes-meet', 'pack', 'the pack has a notch there'],
    ]);
    expect(marked.map((one) => ({ ...one, waived: null }))).toEqual(results);
  });

  it('without a reason, for another place, or for what is kept or only noted change nothing', () => {
    const kept = results.filter(({ waivable }) => !waivable);
    expect(kept.length).toBeGreaterThan(0);
    const vain = [
      { ...waiver, reason: '  ' },
      { ...waiver, elementId: 'nothing' },
      { ...waiver, ruleId: 'nothing' },
      ...kept.map(({ ruleId, elementId }) => ({ ruleId, elementId, reason: 'because' })),
    ];
    expect(applyWaivers(results, vain)).toEqual(results);
  });

  it('the last one for a place counts', () => {
    const later = { ...waiver, reason: 'another pack' };
    const found = applyWaivers(results, [waiver, later]).find((one) => one.waived !== null);
    expect(found?.waived).toBe('another pack');
  });
});
