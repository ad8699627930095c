import { bodyHalfWidthMm } from '@/lib/aero/bodyWidth';
import { cutAt } from '@/lib/aero/lattice/stations';
import type { LatticeSection } from '@/lib/aero/lattice/types';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import type { Body } from '@/lib/airframe/schema/fuselage';
import { motorCentre, thrustDirection } from '@/lib/airframe/thrust';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts as shared } from '@/lib/text/en/figures';
import { texts } from '@/lib/text/en/figures/stability';
import type { FigureContext } from './context';
import type { WingReference } from './reference';
import { FINGER_MM } from './trimBands';
import type { FigureValue } from './types';
import { doesNotApply, type FigureSet, known } from './value';

// The CG of the first flight from places that a hand can find on the aircraft.

/** A place on the wing's leading edge, mm. */
interface Edge {
  readonly y: number;
  readonly leX: number;
}

type Places = Pick<FigureContext, 'airframe' | 'resolved' | 'areas' | 'stability'>;

/** The first-flight CG from the leading edge at the body's side, from it where the CG line crosses the wing, and from the nose. */
export function touchFigures(places: Places): FigureSet {
  const { firstFlightX, figures } = places.stability;
  if (firstFlightX === null) {
    const none = figures.firstFlightCgXMm ?? doesNotApply(shared.problems.needsLattice);
    return { cgFromBodySideMm: none, firstFlightAtStationMm: none, firstFlightFromNoseMm: none };
  }
  const nose = foremost(places.airframe, places.resolved);
  const fromEdge = (edge: Edge | null, name: string, why: string) =>
    edge === null
      ? doesNotApply(why)
      : known(firstFlightX - edge.leX, { inputs: [{ name, value: edge.y, unit: 'mm' }] });
  return {
    cgFromBodySideMm: fromEdge(edgeAtBodySide(places), shared.inputs.bodySide, shared.problems.noWing),
    firstFlightAtStationMm: fromEdge(
      edgeOnCgLine(places, firstFlightX),
      texts.inputs.station,
      texts.problems.noWingAbove,
    ),
    firstFlightFromNoseMm: nose
      ? known(firstFlightX - nose.x, { inputs: [{ name: nose.name, value: nose.x, unit: 'mm' }] })
      : doesNotApply(shared.problems.noWing),
  };
}

/** The CG itself from where a finger can find it, and as a share of the MAC, with the band and verdict that it has along the drawing. */
export function cgTouchFigures(
  places: Places,
  { macLeXMm, macMm }: Pick<WingReference, 'macLeXMm' | 'macMm'>,
  cg: FigureValue,
): FigureSet {
  const edge = edgeAtBodySide(places);
  const none = doesNotApply(shared.problems.noWing);
  return {
    cgAtBodySideMm: edge
      ? moved(cg, (x) => x - edge.leX, [{ name: shared.inputs.bodySide, value: edge.y, unit: 'mm' }])
      : none,
    cgPct: moved(cg, (x) => (100 * (x - macLeXMm)) / macMm, [{ name: shared.inputs.mac, value: macMm, unit: 'mm' }]),
  };
}

/** The same figure told from another place. */
function moved(figure: FigureValue, tell: (x: number) => number, inputs: FigureValue['inputs']): FigureValue {
  const { value, band } = figure;
  if (value === null) return figure;
  return {
    ...figure,
    value: tell(value),
    ...(band ? { band: { ...band, low: tell(band.low), high: tell(band.high) } } : {}),
    inputs,
  };
}

const wingsOf = ({ areas }: Places) =>
  areas.surfaces.filter(({ surface }) => surface.role === 'wing' && surface.mirrored);

/** How far from the centre line the body's side is, along a wing's root chord. */
const bodySide = ({ airframe, resolved }: Places, root: LatticeSection): number =>
  bodyHalfWidthMm(airframe, resolved, root.le[0], root.le[0] + root.chord);

/** Leading edge of the first wing beside the body, or at its root where no body covers it. */
function edgeAtBodySide(places: Places): Edge | null {
  const [wing] = wingsOf(places);
  const root = wing?.sections[0];
  if (!wing || !root) return null;
  const spans = wing.sections.map(({ le }) => le[1]);
  const y = Math.min(Math.max(bodySide(places, root), root.le[1]), spans.at(-1) ?? 0);
  return { y, leX: cutAt(wing.sections, spans, y).le[0] };
}

/**
 * The station nearest the body at which a finger under the CG line finds wing on every side; failing that, any wing at all; null when the
 * line crosses none.
 */
function edgeOnCgLine(places: Places, x: number): Edge | null {
  const finger = FINGER_MM.value;
  for (const margin of [finger, 0])
    for (const { sections } of wingsOf(places)) {
      const root = sections[0];
      const edge = root && innermost(sections, x, bodySide(places, root) + margin, margin);
      if (edge) return edge;
    }
  return null;
}

/** The innermost place, at `fromY` or beyond, whose chord holds x with a margin ahead of it and behind it. */
function innermost(sections: readonly LatticeSection[], x: number, fromY: number, margin: number): Edge | null {
  const ahead = ({ le }: LatticeSection) => x - margin - le[0];
  const behind = ({ le, chord }: LatticeSection) => le[0] + chord - margin - x;
  const beyond = ({ le }: LatticeSection) => le[1] - fromY;
  for (const [i, b] of sections.entries()) {
    const a = sections[i - 1];
    if (!a || b.le[1] <= a.le[1]) continue;
    const t = firstShare([ahead, behind, beyond].map((room) => [room(a), room(b)]));
    if (t !== null) return { y: a.le[1] + (b.le[1] - a.le[1]) * t, leX: a.le[0] + (b.le[0] - a.le[0]) * t };
  }
  return null;
}

/** The first share of the way at which none of these straight-running values is negative. */
function firstShare(values: readonly (readonly number[])[]): number | null {
  let [low, high] = [0, 1];
  for (const [from = 0, to = 0] of values) {
    if (from < 0 && to < 0) return null;
    const zero = from / (from - to);
    if (from < 0) low = Math.max(low, zero);
    if (to < 0) high = Math.min(high, zero);
  }
  return low <= high ? low : null;
}

interface Nose {
  readonly x: number;
  readonly name: string;
}

/** The foremost point of bodies, booms, drives and surfaces, and what it belongs to. */
function foremost(airframe: Airframe, resolved: ResolvedAirframe): Nose | null {
  const { inputs } = texts;
  const points: Nose[] = [
    ...airframe.bodies.map((body) => ({ x: foreOfBody(body, resolved), name: inputs.noseBody })),
    ...resolved.booms.flatMap(({ fore, aft }) => [fore, aft].map(([x]) => ({ x, name: inputs.noseBoom }))),
    ...airframe.drives.map((drive) => ({ x: foreOfDrive(drive, resolved), name: inputs.noseDrive })),
    ...resolved.surfaces.flatMap(({ panels }) =>
      panels.flatMap(({ root, tip }) => [root, tip].map(({ le }) => ({ x: le[0], name: inputs.noseSurface }))),
    ),
  ];
  return points.reduce<Nose | null>((most, point) => (most && most.x <= point.x ? most : point), null);
}

const placeOf = (id: string, { places }: ResolvedAirframe): Vec3 => {
  const at = places.get(id)?.at;
  if (!at) throw new RangeError(`${id} has no place`);
  return at;
};

const foreOfBody = ({ id, stations, outline }: Body, resolved: ResolvedAirframe): number =>
  placeOf(id, resolved)[0] + Math.min(...stations.map(({ xMm }) => xMm), ...(outline ?? []).map(([x]) => x));

/** The disc or the motor's front end, whichever is further forward. */
function foreOfDrive(drive: Drive, resolved: ResolvedAirframe): number {
  const disc = placeOf(drive.id, resolved);
  const front = motorCentre(drive, disc)[0] + (thrustDirection(drive)[0] * drive.motor.lengthMm) / 2;
  return Math.min(disc[0], front);
}
