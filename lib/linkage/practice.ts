import { cp, m } from '@/lib/airframe/defaults';

// What linkages are laid out and judged by. CP is common practice without a source, M is from memory and wants a check on the bench.

/** A guess with the span it may lie in. */
interface Guess {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

export const ARM_MM = cp([7, 10] as const, 'mm', 'hole of the servo arm, from the shaft');
export const HORN_MM = cp([12, 16] as const, 'mm', 'hole of the horn, from the hinge');

/** What a usual transmitter turns a servo at full stick, each way. */
export const SERVO_TRAVEL_DEG = cp(45, '°', 'each way at full stick');
/** Share of the travel that full throw should take: less wastes torque and shows every slop larger. */
export const TRAVEL_WANTED = cp([0.7, 1] as const, '', 'share of the servo travel at full throw');

/** How far a rod end moves in its hole before it carries. */
export const JOINT_PLAY_MM = cp<Guess>({ value: 0.1, low: 0.05, high: 0.2 }, 'mm', 'at each hole of the rod');
/** How far apart a servo comes to rest when it is turned to neutral from one side and from the other. */
export const CENTRING_DEG = cp<Guess>({ value: 1, low: 0.5, high: 2 }, '°', 'of the servo arm');

/** What sheet and thick boundary layers leave of a thin aerofoil's hinge moment at model speeds. */
export const LOW_REYNOLDS_SHARE = m({ low: 0.5, high: 1.1 } as const, '', 'of the thin-aerofoil hinge moment');

/** How far ahead or aft of its quarter chord a thin plate's lift may act, as a share of the chord: what an all-moving surface is held against. */
export const CENTRE_WANDERS = m(0.05, '', 'of the chord, each way');

/** Rods thinner than this are taken as steel wire, thicker ones as drawn carbon. */
export const CARBON_FROM_MM = cp(1.8, 'mm', 'rod diameter');
export const STEEL_E_GPA = m(200, 'GPa', 'music wire');
export const CARBON_E_GPA = m(110, 'GPa', 'pultruded carbon, 100 to 120');

/** Rod length that a suggested linkage is worked out with: where the servo goes is not known yet. */
export const SUGGESTED_ROD_MM = cp(100, 'mm', 'between the holes');

/** Halves whose inner ends lie this close to the centre plane are joined and share a servo when they only move together. */
export const JOINED_WITHIN_MM = cp(30, 'mm', 'inner end from the centre plane');

/** Stall torque by the servo's mass, for servos whose torque nobody has typed. */
export const TORQUE_BY_MASS = m(
  [
    { upToG: 4.5, kgCm: [0.3, 0.6] },
    { upToG: 7.5, kgCm: [0.7, 1.1] },
    { upToG: 10.5, kgCm: [1, 1.5] },
    { upToG: 16, kgCm: [1.8, 2.5] },
    { upToG: 30, kgCm: [2.5, 4] },
    { upToG: Number.POSITIVE_INFINITY, kgCm: [3.5, 6] },
  ] as const,
  'kg cm',
  'stall torque at 5 V',
);
export const USUAL_SERVO_G = cp(9, 'g', 'where no servo is listed');
