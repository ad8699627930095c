import type { ResolvedAirframe, ResolvedControl, ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import { add3, cross3, dot3, length3, lerp3, mirror3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import type { Wanted } from './check';

// The mean surface that the lattice lays its panels on, cut up by what a part's key says it is.

type Quad = readonly [Vec3, Vec3, Vec3, Vec3];

const unit = (a: Vec3): Vec3 => scale3(a, 1 / length3(a));
const quadOf = ({ root, tip }: ResolvedPanel): Quad => [root.le, root.te, tip.te, tip.le];
const upwards = ({ root, tip }: ResolvedPanel): Vec3 => unit(cross3(sub3(tip.le, root.le), sub3(root.le, root.te)));

/** A point of a control turned about its hinge to the neutral setting, positive trailing edge down. */
function settled(p: Vec3, { control, hingeInner, hingeOuter }: ResolvedControl, up: Vec3): Vec3 {
  const u = unit(sub3(hingeOuter, hingeInner));
  const r = sub3(p, hingeInner);
  const across = cross3(u, r);
  const sign = dot3(across, up) > 0 ? -1 : 1;
  const angle = radFromDeg(control.neutralDeg);
  const turned = add3(scale3(r, Math.cos(angle)), scale3(across, Math.sin(angle) * sign));
  return add3(hingeInner, add3(turned, scale3(u, dot3(u, r) * (1 - Math.cos(angle)))));
}

export interface ControlPlan {
  /** Whether the control's inner and outer end run out at a free edge, so that there is no gap. */
  readonly free: readonly [boolean, boolean];
  readonly separate: boolean;
}

/** A control as it stands: hinge inner, trailing edge inner and outer, hinge outer; its end gaps taken off. */
function controlQuad(surface: ResolvedSurface, control: ResolvedControl, plan: ControlPlan, up: Vec3): Quad {
  const { from, to, endGapMm } = control.control;
  const share = endGapMm / ((to - from) * surface.lengthMm);
  const [a, b] = [plan.free[0] ? 0 : share, plan.free[1] ? 1 : 1 - share];
  const hinge = (t: number): Vec3 => lerp3(control.hingeInner, control.hingeOuter, t);
  const te = (t: number): Vec3 => settled(lerp3(control.inner.te, control.outer.te, t), control, up);
  return [hinge(a), te(a), te(b), hinge(b)];
}

const within = (station: number, { control }: ResolvedControl): boolean =>
  station > control.from - 1e-9 && station < control.to + 1e-9;

/** What the sheet part cut from these panels of a surface must be. */
export function wantedSheet(
  resolved: ResolvedAirframe,
  surfaceId: string,
  panelIds: readonly string[],
  plans: Readonly<Record<string, ControlPlan>>,
): Wanted {
  const surface = resolved.surfaces.find((entry) => entry.surface.id === surfaceId);
  const panels = surface?.panels.filter(({ panel }) => panelIds.includes(panel.id)) ?? [];
  const [first] = panels;
  if (!surface || !first) throw new RangeError(`no panels ${panelIds.join(', ')} on ${surfaceId}`);
  const up = upwards(first);
  const [start, end] = [first.root.station, panels.at(-1)?.tip.station ?? 1];
  const controls = resolved.controls.filter(
    ({ surfaceId: on, control }) => on === surfaceId && control.from >= start - 1e-9 && control.to <= end + 1e-9,
  );
  const patches: (readonly Vec3[])[] = panels.map(quadOf);
  const corners: Vec3[] = panels.flatMap(({ root, tip }) => [root.le, tip.le]);
  for (const { root, tip } of panels) {
    for (const section of [root, tip])
      if (!controls.some((control) => within(section.station, control))) corners.push(section.te);
  }
  for (const control of controls) {
    const plan = plans[control.control.id];
    if (!plan) throw new RangeError(`no plan for control ${control.control.id}`);
    corners.push(control.hingeInner, control.hingeOuter);
    if (!plan.free[0] && control.control.from > start + 1e-9) corners.push(control.inner.te);
    if (!plan.free[1] && control.control.to < end - 1e-9) corners.push(control.outer.te);
    if (plan.separate) continue;
    const quad = controlQuad(surface, control, plan, up);
    patches.push(quad);
    corners.push(quad[1], quad[2]);
  }
  return { patches, corners, looks: up };
}

/** What a control that is a piece of its own must be. */
export function wantedControl(
  resolved: ResolvedAirframe,
  surfaceId: string,
  controlId: string,
  plan: ControlPlan,
): Wanted {
  const surface = resolved.surfaces.find((entry) => entry.surface.id === surfaceId);
  const control = resolved.controls.find((entry) => entry.surfaceId === surfaceId && entry.control.id === controlId);
  const panel = surface?.panels.find(({ tip }) => (control?.control.from ?? 0) < tip.station);
  if (!surface || !control || !panel) throw new RangeError(`no control ${controlId} on ${surfaceId}`);
  const quad = controlQuad(surface, control, plan, upwards(panel));
  const up = unit(cross3(sub3(quad[3], quad[0]), sub3(quad[0], quad[1])));
  return { patches: [quad], corners: quad, looks: up };
}

/** The same on the port side. */
export const onPort = ({ patches, corners, looks }: Wanted): Wanted => ({
  patches: patches.map((patch) => patch.map(mirror3)),
  corners: corners.map(mirror3),
  looks: mirror3(looks),
});

/** Both sides in one piece. */
export function onBothSides(half: Wanted): Wanted {
  const port = onPort(half);
  return {
    patches: [...half.patches, ...port.patches],
    corners: [...half.corners, ...port.corners],
    looks: half.looks,
  };
}

/** The part's back is its worked face. */
export const fromBelow = (wanted: Wanted): Wanted => ({ ...wanted, looks: scale3(wanted.looks, -1) });
