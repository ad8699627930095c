import { FOR_DRAWING } from './lattice';

const MASSES_LIMITS =
  'As good as the masses: weigh the sheet, the pack and the motor. Paint and the glue of horns, servos, gear and motor are not counted.';
const BAND =
  'The band takes sheets to be out by 10 %, coverings by 20 %, glue and tape by 40 %, tubes by 5 %, typed masses by 2 % (common practice, no source).';
const PARALLEL_AXES =
  'Parallel axes: e.g. Meriam & Kraige, Engineering Mechanics: Dynamics, app. B. Error: JCGM 100:2008, 5.1 and 5.2.';
const INERTIA_METHOD =
  'Parallel axes over the mass list about the CG: parts as the plates they are folded to, tubes and glue as rods, things put in as boxes, motors and propellers as round bars and discs.';
const INERTIA_LIMITS = `As good as the places and sizes typed in; the air that moves with a light wing is not counted. ${BAND}`;
const GYRATION_SOURCE =
  'Definition. For comparison: Raymer, Aircraft Design, table 16.1, single-engine light aircraft, from memory:';
const PACK_METHOD =
  'Moments about the CG: the packs that the drives run on, moved together; without any named, the heaviest pack. A pack for the receiver alone stays.';
const PACK_LIMITS =
  'By place only: look whether the pack passes its hatch and clears servos and formers. Positive is aft, negative forward.';

export const balanceFigures = {
  cgXMm: {
    name: 'CG',
    explanation: `Centre of gravity of the aircraft ready to fly. ${FOR_DRAWING}`,
    method:
      'From the mass list: foam parts by area less what bevels and channels take away, glue by its joints, tubes by length, everything else as typed in.',
    source: 'Sum of moments. Error of the masses to first order: JCGM 100:2008, 5.1 and 5.2.',
    limits: `${MASSES_LIMITS} ${BAND}`,
  },
  cgYMm: {
    name: 'CG off the centre plane',
    explanation: 'How far the aircraft is heavier on one side: positive to starboard. It rolls towards that side.',
    method: 'Sum of moments over the mass list.',
    source: 'Sum of moments. Limits 0.5 and 2 % of the half span: common practice, no source.',
    limits: 'One half of a sheet can be heavier than the other: hang the finished aircraft by nose and tail and look.',
  },
  cgZMm: {
    name: 'CG height',
    explanation: 'Centre of gravity above (or below) the wing root: what the thrust line and the dihedral work about.',
    method: 'Sum of moments over the mass list.',
    source: 'Sum of moments.',
    limits: MASSES_LIMITS,
  },
  tipBalanceG: {
    name: 'Mass that levels the wing',
    explanation: 'What the lighter wing tip must carry for the aircraft to hang level from side to side.',
    method: 'All-up mass times the distance of the CG from the centre plane, over the half span.',
    source: 'Sum of moments. Limits as for the CG off the centre plane.',
    limits: 'Moving a servo or the pack across is better than weight in a tip, which slows the roll.',
  },
  packForeMm: {
    name: 'Pack, furthest forward',
    explanation: 'How far the pack can go forward from where it is before the CG leaves its range at the front.',
    method: PACK_METHOD,
    source: 'Sum of moments.',
    limits: PACK_LIMITS,
  },
  packAftMm: {
    name: 'Pack, furthest aft',
    explanation: 'How far the pack can go aft from where it is before the CG leaves its range at the back.',
    method: PACK_METHOD,
    source: 'Sum of moments.',
    limits: PACK_LIMITS,
  },
  packFirstFlightMm: {
    name: 'Pack, move for the first flight',
    explanation: 'How far the pack must be moved from where it is for the first-flight CG.',
    method: PACK_METHOD,
    source: 'Sum of moments.',
    limits: PACK_LIMITS,
  },
  packCgPerCm: {
    name: 'CG for each 10 mm of the pack',
    explanation: 'How far the CG moves when the pack is moved by 10 mm.',
    method: 'Mass of the pack over the all-up mass.',
    source: 'Sum of moments.',
    limits: 'Exact.',
  },
  packSwapCgMm: {
    name: 'CG with a pack a quarter heavier',
    explanation:
      'How far the CG moves when a pack a quarter heavier is put in the same place: positive is aft. The inputs list packs of 75, 125 and 150 %, with the margin and the move that each then needs for the first-flight CG.',
    method: 'The mass list with another pack, its centre where the pack is now. The neutral point stays.',
    source: 'Sum of moments.',
    limits: 'The size of another pack is not looked at, nor the flight time.',
  },
  ballastG: {
    name: 'Least ballast',
    explanation:
      'What must be added to bring the CG just into its range, once the pack has gone as far towards it as it can. The place is where the document has an item of ballast on the right side, else 10 mm inside the nose or the tail.',
    method: 'All-up mass times the way still to go, over the distance from there to the ballast.',
    source:
      'Sum of moments. More than a tenth of the all-up mass is called bad, 10 mm inside the end: common practice, no source.',
    limits: 'The range itself is taken to stay where it is; ballast also raises stall speed and pitch inertia.',
  },
  allUpMassG: {
    name: 'All-up mass',
    explanation: 'Everything that flies. A limit is the one that you typed: no claim about any law.',
    method: 'Sum of the mass list.',
    source: 'Sum. Error of the masses: JCGM 100:2008, 5.1 and 5.2.',
    limits: `${MASSES_LIMITS} ${BAND}`,
  },
  wingLoadingGdm2: {
    name: 'Wing loading',
    explanation: 'How much each piece of wing carries: it sets how fast the aircraft has to fly.',
    method: 'All-up mass over wing area.',
    source: 'Definition.',
    limits: 'Tail and foreplane areas are not counted.',
  },
  cubicLoadingKgM3: {
    name: 'Cubic loading',
    explanation: 'Wing loading made comparable between sizes: floaters below about 5, sport 6 to 10, fast above 12.',
    method: 'All-up mass over wing area to the power 1.5.',
    source: 'Definition; the classes are common practice, no source.',
    limits: 'A rough class, not a prediction.',
  },
  rollInertiaKgM2: {
    name: 'Roll inertia',
    explanation: 'How hard it is to start and stop a roll. Weight far out on the wing raises it.',
    method: INERTIA_METHOD,
    source: PARALLEL_AXES,
    limits: INERTIA_LIMITS,
  },
  pitchInertiaKgM2: {
    name: 'Pitch inertia',
    explanation:
      'How hard it is to start and stop the nose moving. Heavy things far from the CG raise it with the square of the distance.',
    method: INERTIA_METHOD,
    source: PARALLEL_AXES,
    limits: INERTIA_LIMITS,
  },
  yawInertiaKgM2: {
    name: 'Yaw inertia',
    explanation: 'How hard it is to start and stop the nose swinging from side to side.',
    method: INERTIA_METHOD,
    source: PARALLEL_AXES,
    limits: INERTIA_LIMITS,
  },
  productXzKgM2: {
    name: 'Product of inertia, length and height',
    explanation:
      'Positive when what lies aft also lies high, or what lies forward lies low: a roll then swings the nose too.',
    method: INERTIA_METHOD,
    source: PARALLEL_AXES,
    limits: `Integral of x z over the mass about the CG, x aft and z up; the same with x forward and z down. ${INERTIA_LIMITS}`,
  },
  gyrationPitchMacPct: {
    name: 'Radius of gyration in pitch, by MAC',
    explanation:
      'Where the whole mass would have to lie ahead or behind the CG to be as hard to pitch, as a share of the chord that steadies it.',
    method: 'Root of pitch inertia over mass, over the MAC.',
    source: 'Definition.',
    limits: 'A tailless aircraft has little to steady it: there the same share swings for longer.',
  },
  gyrationPitchLengthPct: {
    name: 'Radius of gyration in pitch, by length',
    explanation: 'How far the mass is spread along the aircraft: heavy ends give a large share.',
    method: 'Root of pitch inertia over mass, over the length without the propeller.',
    source: `${GYRATION_SOURCE} 19 % of the length.`,
    limits: 'A comparison, not a limit.',
  },
  gyrationRollSpanPct: {
    name: 'Radius of gyration in roll, by span',
    explanation: 'How far the mass is spread along the span.',
    method: 'Root of roll inertia over mass, over the span.',
    source: `${GYRATION_SOURCE} 12.5 % of the span.`,
    limits: 'A comparison, not a limit.',
  },
  gyrationYawSpanPct: {
    name: 'Radius of gyration in yaw, by span',
    explanation: 'How far the mass is spread in plan.',
    method: 'Root of yaw inertia over mass, over the span.',
    source: `${GYRATION_SOURCE} 19.5 % of the mean of span and length.`,
    limits: 'A comparison, not a limit.',
  },
} as const;
