import { ok, type Result, refuse } from '@/lib/numerics/result';
import { lerp3 } from '@/lib/numerics/vec';
import { placeElements } from './mounts';
import type { ResolvedAirframe, ResolvedControl, ResolvedSurface } from './resolved';
import type { Airframe } from './schema/airframe';
import type { Control } from './schema/surface';
import { sectionAt } from './section';

export { boomDirection } from './mounts';
export { chordDirection, panelAt, pointAt, sectionAt, sectionOfPanel } from './section';

/** Where an all-moving surface turns when nothing is said, as a share of its chord: near its aerodynamic centre, so that the servo holds little. Common practice, no source. */
export const ALL_MOVING_AXIS = 0.25;

/** Share of the local chord, from the leading edge, at which a control's hinge lies: at its inner and outer end. */
export function hingeShares(control: Control): readonly [inner: number, outer: number] {
  if (control.kind === 'allMoving') {
    const axis = control.hinge.axis ?? ALL_MOVING_AXIS;
    return [axis, axis];
  }
  return [1 - control.chordShare[0], 1 - control.chordShare[1]];
}

/** A control's end sections and hinge ends on its surface, starboard side. */
export function resolveControl(surface: ResolvedSurface, control: Control): ResolvedControl {
  const inner = sectionAt(surface, control.from);
  const outer = sectionAt(surface, control.to);
  const [innerShare, outerShare] = hingeShares(control);
  return {
    control,
    surfaceId: surface.surface.id,
    inner,
    outer,
    hingeInner: lerp3(inner.le, inner.te, innerShare),
    hingeOuter: lerp3(outer.le, outer.te, outerShare),
  };
}

/**
 * Works the document out to places in the aircraft's axes (x aft, y to starboard, z up; mm), starboard side of what is mirrored.
 * Refused when a mount names nothing, runs in a loop or names a place its parent does not have; a parsed airframe always resolves.
 */
export function resolve(airframe: Airframe): Result<ResolvedAirframe> {
  const { places, surfaces, booms, problems } = placeElements(airframe);
  if (problems.length > 0) return refuse(...problems);
  const controls = surfaces.flatMap((surface) =>
    surface.surface.controls.map((control) => resolveControl(surface, control)),
  );
  return ok({ surfaces, controls, booms, places });
}
