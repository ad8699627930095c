import { LATTICE_LIMITS, LATTICE_SOURCE } from './lattice';

const MODES =
  'Etkin & Reid, Dynamics of Flight, ch. 4 and 6; Nelson, Flight Stability and Automatic Control, ch. 4 and 5.';
const PULL = 'Etkin & Reid, Dynamics of Flight, ch. 3 (elevator angle per g).';
const PULL_UP =
  'Steady pull-up: lift and moment in balance with angle of attack, pitch rate and elevator about the CG.';
const TWIST = 'Static aeroelasticity by strips: Bisplinghoff, Ashley & Halfman, Aeroelasticity (1955), ch. 8.';
const TWIST_LIMITS =
  'The root is held, and damping is that of the rigid wing. How stiff foam and spar are decides it: measure yours.';
const PRACTICE = 'The bands of feel are common practice, no source, and do not scale: the pilot does not.';
const IN_PITCH =
  'Roots of the four equations of motion in the plane of symmetry at cruise, trimmed, thrust constant; inertia by the mass list.';
const IN_ROLL =
  'Roots of the four equations of motion in roll and yaw at cruise, trimmed, controls held still; inertia by the mass list.';
const NO_ALPHA_DOT =
  'A steady lattice has no alpha-dot term, so the damping of a tail behind a wing is left out in part: the aircraft settles sooner. Linear: no stall, no compressibility; rigid foam.';
const PHUGOID_LIMITS =
  'Drag by its build-up; thrust that falls with speed damps it more. Linear: no stall, no compressibility; rigid foam.';
const SIDE_LIMITS = `${LATTICE_LIMITS} Foam fins that flex do less.`;
const SCALED = 'made for this size by Froude scaling, N = 10 m over the span';

export const handlingFigures = {
  pitchPowerPerDeg: {
    name: 'Pull per degree of elevator',
    explanation: 'How many g a degree of up-elevator adds in a steady pull-up at cruise speed: what the thumb feels.',
    method: PULL_UP,
    source: PULL,
    limits: `${LATTICE_LIMITS} Slop and servo centring add to it; foam that twists takes from it. ${PRACTICE}`,
  },
  pitchPowerTwistedPerDeg: {
    name: 'Pull per degree of elevator, foam twisting',
    explanation:
      'The same pull less what the controls lose because the foam twists under them at cruise speed. Of elevons this is what the thumb gets; a stiff tail hardly differs from the rigid figure.',
    method: `${PULL_UP} Each control has the share of its power that the twist of its surface leaves.`,
    source: `${PULL} ${TWIST}`,
    limits: `${LATTICE_LIMITS} ${TWIST_LIMITS}`,
  },
  pitchRatePerDeg: {
    name: 'Pitch rate per degree of elevator',
    explanation: 'How fast the nose turns for each degree of up-elevator in that pull-up.',
    method: 'Pull per degree times g over speed.',
    source: PULL,
    limits: LATTICE_LIMITS,
  },
  pullPerStickMm: {
    name: 'Pull per millimetre of stick',
    explanation: 'How many g a millimetre at the end of the stick adds at high rate: whether a thumb can be that fine.',
    method: 'Pull per degree times the largest throw, over the travel of the stick; without expo.',
    source: `${PULL} Stick travel 20 mm each way: common practice, no source.`,
    limits: `${LATTICE_LIMITS} Expo makes it softer at the centre. ${PRACTICE}`,
  },
  slopPullG: {
    name: 'Pull that slop alone makes',
    explanation:
      'Play in the linkage and a servo that does not quite find its centre let the elevator rest anywhere between two stops. This is how many g that is worth either way from trim: large, and the aircraft flies erratically whatever the pilot does.',
    method:
      'Half of the free movement of each control that answers to pitch, as for the figure of slop, times its pull per degree; all to the same side.',
    source: `${PULL} Play of the holes and centring of the servo: common practice, no source; measure yours.`,
    limits:
      'The worst case: air that presses the surface to one side takes up part of it. A tight linkage with long horns halves it. Unlike the pull of the stick, no transmitter setting takes it away. Judged unscaled, for the pilot is no smaller.',
  },
  controlAnticipation: {
    name: 'Control anticipation',
    explanation:
      'How sharply the nose starts to turn, against the pull that follows. Little: it starts slowly and overshoots. Much: abrupt.',
    method: 'Square of the short-period undamped frequency over the load factor for a radian of angle of attack.',
    source: `MIL-F-8785C (1980), 3.2.2.1.1, category C because the aircraft has to land with it, ${SCALED}: limits times N.`,
    limits: NO_ALPHA_DOT,
  },
  manoeuvrePointXMm: {
    name: 'Manoeuvre point',
    explanation: 'The CG behind which a pull tightens by itself. It lies aft of the neutral point.',
    method: 'Where the elevator for one g more becomes none, stick held, at cruise speed and this mass.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 3 (stick-fixed manoeuvre point).',
    limits: LATTICE_LIMITS,
  },
  manoeuvreMarginPct: {
    name: 'Manoeuvre margin',
    explanation: 'How far the CG lies ahead of the manoeuvre point.',
    method: 'Manoeuvre point less CG, as a share of the mean aerodynamic chord.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 3.',
    limits: 'Carries the whole bands of the neutral point and of the CG.',
  },
  shortPeriodHz: {
    name: 'Short period, swings a second',
    explanation: 'How fast the nose would nod about its path after a gust if nothing damped it.',
    method: IN_PITCH,
    source: MODES,
    limits: NO_ALPHA_DOT,
  },
  shortPeriodDamping: {
    name: 'Short period, damping',
    explanation:
      'Share of critical damping: about 0.7 settles at once, under 0.3 keeps nodding, over 1 does not swing.',
    method: IN_PITCH,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.2.2.1.2, category C because it hardly changes with speed; damping ratios do not scale.`,
    limits: NO_ALPHA_DOT,
  },
  shortPeriodHalfS: {
    name: 'Short period, time to half',
    explanation: 'How long a nod after a gust takes to die away to half.',
    method: IN_PITCH,
    source: MODES,
    limits: NO_ALPHA_DOT,
  },
  pitchDoubleS: {
    name: 'Time to double in pitch',
    explanation: 'Only for an aircraft that runs away in pitch: how long until a change has doubled.',
    method: `${IN_PITCH} Judged unscaled against a dead time of 0.3 s from eye to surface.`,
    source: `${MODES} Dead time and how many of them are needed: common practice, no source.`,
    limits: NO_ALPHA_DOT,
  },
  phugoidPeriodS: {
    name: 'Phugoid, period',
    explanation: 'How long one slow swing in speed and height takes, stick held.',
    method: IN_PITCH,
    source: MODES,
    limits: PHUGOID_LIMITS,
  },
  phugoidDamping: {
    name: 'Phugoid, damping',
    explanation: 'Share of critical damping of that slow swing. Pilots take it out without noticing.',
    method: IN_PITCH,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.2.1.2, from memory; damping ratios do not scale.`,
    limits: PHUGOID_LIMITS,
  },
  rollRatePerDeg: {
    name: 'Roll rate per degree of aileron',
    explanation: 'Steady roll rate for each degree of the up-going side at cruise speed.',
    method: 'Rolling moment of the ailerons against roll damping, both from the lattice.',
    source: `${LATTICE_SOURCE} Steady roll: Etkin & Reid, Dynamics of Flight.`,
    limits: `${LATTICE_LIMITS} A foam wing that twists rolls slower: see the figure with foam twisting.`,
  },
  rollRateTwistedPerDeg: {
    name: 'Roll rate per degree of aileron, foam twisting',
    explanation:
      'The same roll rate less what the ailerons lose because the foam twists under them at cruise speed: what to expect in the air.',
    method:
      'Rolling moment of the ailerons, each with the share of its power that the twist of its surface leaves, against roll damping.',
    source: `${LATTICE_SOURCE} ${TWIST}`,
    limits: `${LATTICE_LIMITS} ${TWIST_LIMITS}`,
  },
  rollHelix: {
    name: 'Helix angle at full aileron',
    explanation:
      'How steep a screw the wing tip flies at full throw: roll rate made comparable between sizes and speeds.',
    method: 'Roll rate times span over twice the speed, with the stick fully over and pitch at rest.',
    source:
      'Lower bound 0.07: Gilruth & Turner, NACA TR 715 (1941), from memory; upper bound common practice, no source.',
    limits: `${LATTICE_LIMITS} A foam wing that twists rolls slower.`,
  },
  sideslipPerDeg: {
    name: 'Sideslip per degree of rudder',
    explanation: 'How far the nose swings for each degree of rudder when it is held and the wings are kept level.',
    method:
      "The rudder's yawing moment over the moment with which sideslip turns the nose back, both from the lattice.",
    source: 'Etkin & Reid, Dynamics of Flight, ch. 3 (directional control).',
    limits: 'No propeller stream over the rudder, which makes it stronger with power.',
  },
  rollModeS: {
    name: 'Roll, time to build up',
    explanation: 'How long rolling takes to reach about two thirds of its steady rate.',
    method: IN_ROLL,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.3.1.2, class I, category B (cruise), ${SCALED}: times over the root of N.`,
    limits: SIDE_LIMITS,
  },
  dutchRollHz: {
    name: 'Tail wag, swings a second',
    explanation:
      'Dutch roll: the tail swings from side to side while the wings rock. A faster swing points into the wind more firmly.',
    method: IN_ROLL,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.3.1.1, class I, category B (cruise), from memory, ${SCALED}: frequencies times the root of N.`,
    limits: SIDE_LIMITS,
  },
  dutchRollDamping: {
    name: 'Tail wag, damping',
    explanation: 'Share of critical damping of the Dutch roll: little, and it wags long after a gust.',
    method: IN_ROLL,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.3.1.1, class I, category B (cruise), from memory: ratio as it is, its product with frequency ${SCALED}.`,
    limits: SIDE_LIMITS,
  },
  spiralDoubleS: {
    name: 'Time for a bank to double',
    explanation:
      'Hands off, a bank grows until it has doubled in this time. With a minus sign it dies away instead, and halves in this time.',
    method: IN_ROLL,
    source: `${MODES} Judged by MIL-F-8785C (1980), 3.3.1.3, category B (cruise), from memory, ${SCALED}, but never under seven dead times of a pilot (common practice, no source).`,
    limits: `${SIDE_LIMITS} A small difference of large numbers: trust its sense more than its size.`,
  },
} as const;
