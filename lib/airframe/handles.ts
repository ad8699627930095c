import { texts } from '@/lib/text/en/airframe';
import { controlGrips } from './edit/controls';
import type { Grip, Handle } from './edit/grip';
import { panelGrips, spanGrips } from './edit/panels';
import { boomGrips, placeGrips } from './edit/places';
import { resolve } from './resolve';
import { checkRules } from './rules';
import type { Airframe } from './schema/airframe';

export type { Handle } from './edit/grip';

export interface HandleSet {
  readonly airframe: Airframe;
  /** The value reached. */
  readonly value: number;
  /** Why the value asked for was not reached; null when it was. */
  readonly stopped: string | null;
}

/** Halvings between a value that holds and one that does not: leaves under a ten-thousandth of the way. */
const HALVINGS = 16;

/** Grips of the elements that are wanted: a drag asks for one and should not pay for all. */
function grips(airframe: Airframe, wanted: (elementId: string) => boolean): Grip[] {
  const resolved = resolve(airframe);
  if (!resolved.ok)
    throw new RangeError(`airframe does not resolve: ${resolved.problems[0]?.message ?? 'unknown mount'}`);
  const { surfaces, controls } = resolved.value;
  return [
    ...surfaces
      .filter(({ surface }) => wanted(surface.id))
      .flatMap((surface) => [
        ...spanGrips(airframe, surface),
        ...panelGrips(airframe, surface),
        ...controlGrips(airframe, surface, controls),
      ]),
    ...boomGrips(airframe, resolved.value),
    ...placeGrips(airframe, resolved.value, wanted),
  ];
}

/** Every handle of a parsed airframe, in the document's order. Throws RangeError when its mounts do not resolve. */
export function handles(airframe: Airframe): Handle[] {
  return grips(airframe, () => true).map(({ handle }) => handle);
}

/** The furthest value towards `target` that keeps every rule, with the words of the rule it stops at. */
function furthest(grip: Grip, airframe: Airframe, target: number, because: string): HandleSet {
  let held: { airframe: Airframe; value: number } = { airframe, value: grip.handle.value };
  let broken = { value: target, because };
  for (let step = 0; step < HALVINGS; step++) {
    const value = (held.value + broken.value) / 2;
    const candidate = grip.set(value);
    const problem = checkRules(candidate)[0];
    if (problem) broken = { value, because: problem.message };
    else held = { airframe: candidate, value };
  }
  return { ...held, stopped: broken.because };
}

/**
 * Sets a handle to a value, or as near as the document and the sheet allow; `stopped` then says why it went no further.
 * The result is an airframe that parses; ids never change; its own value changes nothing.
 * Throws RangeError for a handle that the airframe does not have.
 */
export function setHandle(airframe: Airframe, handleId: string, value: number): HandleSet {
  const elementId = handleId.split('/')[0];
  const grip = grips(airframe, (id) => id === elementId).find(({ handle }) => handle.id === handleId);
  if (!grip) throw new RangeError(`no handle "${handleId}" on this airframe`);
  const { handle, atMin, atMax, set } = grip;
  if (!Number.isFinite(value)) return { airframe, value: handle.value, stopped: texts.stops.notANumber };
  const target = Math.min(Math.max(value, handle.min), handle.max);
  const stopped = value < handle.min ? atMin : value > handle.max ? atMax : null;
  if (target === handle.value) return { airframe, value: target, stopped };
  const candidate = set(target);
  const problem = checkRules(candidate)[0];
  return problem ? furthest(grip, airframe, target, problem.message) : { airframe: candidate, value: target, stopped };
}
