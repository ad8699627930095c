import { controlWithin, elementName, elementWithin } from '@/lib/airframe/names';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import {
  SHARED_THROW_DEG,
  type Side,
  type Stick,
  type Sticks,
  sidesOf,
  sticksOf,
  turnDeg,
} from '@/lib/airframe/sticks';
import { type Way, wayOf } from '@/lib/linkage/mix';
import { type ControlLinkage, travelOf } from '@/lib/linkage/ofControl';
import { type RodStuff, rodStuff } from '@/lib/linkage/rod';
import { edgeTravelMm } from '@/lib/linkage/travel';
import { ok, type Problem, type Result } from '@/lib/numerics/result';
import { type StudiedControl, studiedControls } from './controlLoads';

// The set-up sheet: everything that is set with the transmitter and the linkages, solved from the document, as plain data. Its words
// stand in setUpWords.ts.

/** A move of the trailing edge from neutral, as magnitudes with the way; millimetres by a rule at the widest chord of the control. */
export interface EdgeMove {
  readonly way: Way;
  readonly deg: number;
  readonly mm: number;
}

/** One end of one stick, at high and at low rate, starboard side. */
export interface StickEnd {
  readonly stick: Stick;
  readonly high: EdgeMove;
  /** Null for what no rate switch changes. */
  readonly low: EdgeMove | null;
}

/** What each side does with these sticks at full: nose up, right, flaps out. */
export interface StickMove {
  readonly sticks: readonly Stick[];
  readonly sides: readonly (EdgeMove & { readonly side: Side })[];
  /** The sticks together ask for more than a shared linkage has. */
  readonly overShared: boolean;
}

export interface SetUpLinkage {
  /** Not in the document: the usual holes that suit the throw. */
  readonly suggested: boolean;
  readonly armMm: number;
  readonly hornMm: number;
  readonly servo: string | null;
  readonly rod: { readonly stuff: RodStuff; readonly diameterMm: number; readonly lengthMm: number } | null;
  /** Null where a dead centre comes before full throw. */
  readonly travel: { readonly upDeg: number; readonly downDeg: number; readonly usedPct: number } | null;
}

export interface SetUpControl {
  /** Surface and control, "wing/aileron": steady from one revision to the next. */
  readonly id: string;
  readonly surface: string;
  /** As in a sentence: "elevon". */
  readonly control: string;
  readonly mirrored: boolean;
  /** Rest position against the surface ahead of it. */
  readonly neutral: EdgeMove;
  readonly widestMm: number;
  readonly lowShare: number;
  /** Share by which the down-going side moves less; 0 where no roll stick moves it. */
  readonly differential: number;
  readonly throws: readonly StickEnd[];
  /** Each stick alone, then each pair that shares this control. */
  readonly moves: readonly StickMove[];
  readonly linkage: SetUpLinkage | null;
}

export interface SetUpSheet {
  readonly lowRate: number;
  readonly expo: number;
  readonly sharedThrowDeg: number;
  readonly controls: readonly SetUpControl[];
  /** Leading edge up positive, against the datum line. */
  readonly incidences: readonly { readonly id: string; readonly name: string; readonly deg: number }[];
  readonly thrusts: readonly {
    readonly id: string;
    readonly name: string;
    readonly downDeg: number;
    readonly rightDeg: number;
  }[];
  /** What keeps a linkage from being worked out. */
  readonly problems: readonly Problem[];
}

const edgeMove = ({ mixed, place }: StudiedControl, side: Side, turn: number): EdgeMove => ({
  way: wayOf(mixed, side, turn),
  deg: Math.abs(turn),
  mm: edgeTravelMm(place.widestMm, turn),
});

/** Both ends of each stick on the starboard side, or on the centre plane. */
function throwsOf(studied: StudiedControl): StickEnd[] {
  const [side = 'centre'] = sidesOf(studied.mixed);
  const { lowShare } = studied.control.throwsDeg;
  return sticksOf(studied.mixed).flatMap((stick) => {
    const ends = stick === 'flap' ? [1] : [1, -1];
    return ends.flatMap((end): StickEnd[] => {
      const turn = turnDeg(studied.mixed, side, { [stick]: end });
      if (turn === 0) return [];
      const low = stick === 'flap' ? null : edgeMove(studied, side, turn * lowShare);
      return [{ stick, high: edgeMove(studied, side, turn), low }];
    });
  });
}

/** Each of a list alone, then each pair of it. */
const alonePaired = <T>(list: readonly T[]): T[][] => [
  ...list.map((one) => [one]),
  ...list.flatMap((one, i) => list.slice(i + 1).map((other) => [one, other])),
];

const movesOf = (studied: StudiedControl): StickMove[] =>
  alonePaired(sticksOf(studied.mixed)).map((sticks) => {
    const full: Sticks = Object.fromEntries(sticks.map((stick) => [stick, 1]));
    const turns = sidesOf(studied.mixed).map((side) => ({ side, turn: turnDeg(studied.mixed, side, full) }));
    return {
      sticks,
      sides: turns.map(({ side, turn }) => ({ side, ...edgeMove(studied, side, turn) })),
      overShared: sticks.length > 1 && turns.some(({ turn }) => Math.abs(turn) > SHARED_THROW_DEG.value + 1e-9),
    };
  });

function linkageRow(airframe: Airframe, studied: StudiedControl, linkage: ControlLinkage): SetUpLinkage {
  const { bar, rod, servo, suggested } = linkage;
  return {
    suggested,
    armMm: bar.armMm,
    hornMm: bar.hornMm,
    servo: servo && !suggested ? elementWithin(airframe, servo.id) : null,
    rod: rod ? { stuff: rodStuff(rod.diameterMm), ...rod } : null,
    travel: travelOf(linkage, studied.together),
  };
}

function controlRow(airframe: Airframe, studied: StudiedControl): SetUpControl {
  const { control, mixed, place, surface, linkage } = studied;
  const [side = 'centre'] = sidesOf(mixed);
  return {
    id: `${surface.id}/${control.id}`,
    surface: elementName(airframe, surface.id),
    control: controlWithin(surface, control),
    mirrored: mixed.mirrored,
    neutral: edgeMove(studied, side, control.neutralDeg),
    widestMm: place.widestMm,
    lowShare: control.throwsDeg.lowShare,
    differential: control.mix.roll === 0 ? 0 : control.differential,
    throws: throwsOf(studied),
    moves: movesOf(studied),
    linkage: linkage.ok ? linkageRow(airframe, studied, linkage.value) : null,
  };
}

function sheetOf(airframe: Airframe, resolved: ResolvedAirframe): SetUpSheet {
  const studied = studiedControls({ airframe, resolved });
  return {
    lowRate: airframe.radio.lowRate,
    expo: airframe.radio.expo,
    sharedThrowDeg: SHARED_THROW_DEG.value,
    controls: studied.map((one) => controlRow(airframe, one)),
    incidences: airframe.surfaces
      .filter(({ role }) => role !== 'fin' && role !== 'tipFin')
      .map(({ id, incidenceDeg }) => ({ id, name: elementName(airframe, id), deg: incidenceDeg })),
    thrusts: airframe.drives.map(({ id, thrustDeg: [downDeg, rightDeg] }) => ({
      id,
      name: elementName(airframe, id),
      downDeg,
      rightDeg,
    })),
    problems: studied.flatMap(({ linkage }) => (linkage.ok ? [] : linkage.problems)),
  };
}

/** The set-up sheet of an airframe; refused only when the document does not resolve. */
export function setUpSheet(airframe: Airframe): Result<SetUpSheet> {
  const resolved = resolve(airframe);
  return resolved.ok ? ok(sheetOf(airframe, resolved.value)) : resolved;
}
