import { controlWithin, elementName } from '@/lib/airframe/names';
import { hingeShares } from '@/lib/airframe/resolve';
import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import { type MixedControl, mixedControl } from '@/lib/airframe/sticks';
import { allMovingByTurn, hingeByAlpha, hingeByTurn, hingeMomentNmm } from '@/lib/linkage/hingeMoment';
import { isUpright, type Reach, reachOf } from '@/lib/linkage/mix';
import { type ControlLinkage, leversTurned, linkageOf } from '@/lib/linkage/ofControl';
import { type ControlPlace, controlPlace } from '@/lib/linkage/place';
import { CENTRE_WANDERS } from '@/lib/linkage/practice';
import type { Result } from '@/lib/numerics/result';
import { degFromRad, radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/controls';
import { fill } from '@/lib/text/fill';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import type { FigureContext } from './context';

// Every control that moves, with its linkage and what the air asks of it.

export interface StudiedControl {
  readonly name: string;
  /** In the document, without what follows it. */
  readonly path: string;
  readonly surface: Surface;
  readonly control: Control;
  readonly mixed: MixedControl;
  readonly place: ControlPlace;
  /** By any one stick. */
  readonly single: Reach;
  /** By all its sticks together. */
  readonly together: Reach;
  readonly linkage: Result<ControlLinkage>;
}

type Studied = Pick<FigureContext, 'airframe' | 'resolved'>;

/** What the figures of controls start from. */
export type ControlContext = Pick<FigureContext, 'airframe' | 'resolved' | 'wing' | 'balance' | 'model' | 'air'>;

function study({ airframe, resolved }: Studied, surface: ResolvedSurface, control: Control): StudiedControl | null {
  const mixed = mixedControl(resolved, surface, control);
  const place = controlPlace(surface, control);
  if (!place) return null;
  const together = reachOf(mixed, true);
  const name = fill(texts.control, {
    surface: elementName(airframe, surface.surface.id),
    control: controlWithin(surface.surface, control),
  });
  return {
    name,
    path: `surfaces.${surface.index}.controls.${surface.surface.controls.indexOf(control)}`,
    surface: surface.surface,
    control,
    mixed,
    place,
    single: reachOf(mixed, false),
    together,
    linkage: linkageOf(airframe, resolved, surface, control, place, together),
  };
}

/** All controls of the aircraft that any stick moves, in the document's order. */
export const studiedControls = (from: Studied): StudiedControl[] =>
  from.resolved.surfaces
    .flatMap((surface) => surface.surface.controls.flatMap((control) => study(from, surface, control) ?? []))
    .filter(({ together }) => Math.max(together.upDeg, together.downDeg) > 0);

/** What holding full throw of one stick takes at a speed. */
export interface HingeLoad {
  readonly turnDeg: number;
  /** For all halves that the servo turns. */
  readonly momentNmm: number;
  readonly servoNmm: number;
  /** The larger force of both ends of the throw. */
  readonly rodN: number;
}

/** Angle of attack in level flight at a dynamic pressure, degrees. */
function levelAlphaDeg({ model, balance, wing }: ControlContext, pressurePa: number): number {
  const weightN = (balance.massG / 1000) * STANDARD_GRAVITY;
  const lift = weightN / (pressurePa * (wing.areaMm2 / 1e6));
  return degFromRad((lift - model.base.lift) / model.alpha.lift);
}

function coefficient({ control, mixed, place }: StudiedControl, turnDeg: number, alphaDeg: number): number {
  const turn = Math.abs(radFromDeg(turnDeg));
  if (control.kind === 'allMoving') return allMovingByTurn(hingeShares(control)[0], CENTRE_WANDERS.value) * turn;
  const alpha = isUpright(mixed) ? 0 : Math.abs(radFromDeg(alphaDeg));
  // Taken as if the angle of attack always added to the moment: which way it does depends on the throw.
  return hingeByTurn(place.chordShare) * turn + hingeByAlpha(place.chordShare) * alpha;
}

/**
 * The hardest of full up and full down for one stick at a speed, or null where the linkage does not get there. The control's rest position
 * adds to the throw on its own side.
 */
export function hingeLoad(
  context: ControlContext,
  studied: StudiedControl,
  linkage: ControlLinkage,
  speedMs: number,
): HingeLoad | null {
  const pressurePa = 0.5 * context.air.densityKgM3 * speedMs ** 2;
  const alphaDeg = levelAlphaDeg(context, pressurePa);
  const { single, control, place } = studied;
  const loads: HingeLoad[] = [];
  let rodN = 0;
  for (const turnDeg of [-single.upDeg, single.downDeg]) {
    if (turnDeg === 0) continue;
    const levers = leversTurned(linkage, turnDeg);
    if (!levers) return null;
    const ch = coefficient(studied, turnDeg + control.neutralDeg, alphaDeg);
    const momentNmm = Math.abs(hingeMomentNmm(pressurePa, ch, place.chordSquaredMm3)) * place.halves;
    rodN = Math.max(rodN, momentNmm / levers.hornMm);
    loads.push({ turnDeg, momentNmm, servoNmm: momentNmm * Math.abs(levers.ratio), rodN });
  }
  const [hardest] = loads.sort((a, b) => b.servoNmm - a.servoNmm);
  return hardest ? { ...hardest, rodN } : null;
}
