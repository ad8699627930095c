import { LATTICE_LIMITS } from './lattice';

const TRIM =
  'Lift with the thrust along it carries the weight and no moment is left about the CG: two linear equations for angle of attack and stick.';
const TRIM_SOURCE =
  'Etkin & Reid, Dynamics of Flight, ch. 2; Roskam, Airplane Flight Dynamics and Automatic Flight Controls I, ch. 4.';

export const trimFigures = {
  trimElevatorDeg: {
    name: 'Elevator at cruise',
    explanation:
      'Where the elevator has to stand to fly straight at cruise speed, power off, from its rest position. Plus is trailing edge down, minus is up.',
    method: `${TRIM} Of several controls, the one that moves most.`,
    source: TRIM_SOURCE,
    limits: `${LATTICE_LIMITS} Half a degree of incidence built differently changes it by about as much.`,
  },
  trimShareOfThrowPct: {
    name: 'Throw taken by the trim',
    explanation: 'How much of the elevator throw is already used to fly straight at cruise speed.',
    method: 'Elevator at cruise over the full throw on that side; of elevons, over what roll leaves.',
    source: 'Definition; watch over 25 % and bad over 50 % are common practice, no source.',
    limits: LATTICE_LIMITS,
  },
  stallElevatorSharePct: {
    name: 'Throw that reaches the stall',
    explanation:
      'Share of full up-elevator that slows it to the stall, power off. Over 100 %: it cannot be slowed that far. Far under 50 %: the stick is too strong.',
    method: `${TRIM} At the greatest lift coefficient.`,
    source: `${TRIM_SOURCE} That full up should reach 90 % of the greatest lift, and half of it should not stall it, is common practice, no source.`,
    limits: `${LATTICE_LIMITS} Near the ground the elevator works less; near the stall too.`,
  },
  throttleTrimDeg: {
    name: 'Elevator change with power',
    explanation:
      'How far the elevator has to move to hold cruise speed when the throttle opens from nothing to full. Plus is trailing edge down.',
    method:
      'Trim with each thrust line, its force and its moment about the CG, less trim without. Thrust falls in a straight line with speed.',
    source: TRIM_SOURCE,
    limits:
      'The thrust line alone: no propeller stream over wing and tail, which often matters as much. The climb is left out.',
  },
} as const;
