import type { Basis } from '@/lib/airframe/defaults';
import { mountedElements } from '@/lib/airframe/mounts';
import { elementWithin } from '@/lib/airframe/names';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import type { CheckInput, CheckLevel, CheckResult, Measured, RuleId } from './types';

/** What every rule reads. */
export interface Context extends CheckInput {
  readonly nameOf: (id: string) => string;
  readonly pathOf: (id: string) => string;
  /** Throws RangeError for an element without a place, which a resolved airframe never has. */
  readonly placeOf: (id: string) => Vec3;
}

/** The input with what is looked up by id. */
export function contextOf(input: CheckInput): Context {
  const paths = new Map(mountedElements(input.airframe).map(({ id, path }) => [id, path]));
  return {
    ...input,
    nameOf: (id) => elementWithin(input.airframe, id),
    pathOf: (id) => paths.get(id) ?? '',
    placeOf: (id) => {
      const place = input.resolved.places.get(id);
      if (!place) throw new RangeError(`element ${id} has no place in the resolved airframe`);
      return place.at;
    },
  };
}

interface Found {
  readonly elementId: string;
  readonly path: string;
  readonly at: Vec3;
  readonly level: CheckLevel;
  readonly words: string;
  readonly measured?: Measured;
  readonly fix: string;
  readonly basis: Basis;
}

/** One rule's result at one element. What is kept needs nothing done and no waiver. */
export const result = (ruleId: RuleId, { fix, basis, measured, ...found }: Found): CheckResult => ({
  ruleId,
  ...found,
  title: texts.rules[ruleId].title,
  measured: measured ?? null,
  fix: found.level === 'ok' ? null : fix,
  source: texts.sources[basis],
  waivable: found.level === 'watch' || found.level === 'bad',
  waived: null,
});

/** Kept at the least; bad under a share of it. */
export const leastLevel = (value: number, least: number, badShare: number): CheckLevel => {
  if (value >= least) return 'ok';
  return value < least * badShare ? 'bad' : 'watch';
};

/** Lengths in a sentence: whole millimetres hide what a limit is missed by. */
export const mm = (value: number): string => trimmedDigits(value, 1);
export const cm2 = (valueMm2: number): string => fixedDigits(valueMm2 / 100, 1);
export const whole = (value: number): string => fixedDigits(value, 0);
