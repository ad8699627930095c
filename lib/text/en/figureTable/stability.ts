import { FOR_DRAWING, LATTICE, LATTICE_LIMITS, LATTICE_SOURCE } from './lattice';

const NEUTRAL_POINT = `${LATTICE} Body by slender-body theory and propeller by its normal force, where switched on. The place where lift due to angle of attack acts. The tail feels the wing's downwash as it comes out and the full speed of the stream (tail efficiency 1.0).`;
const NEUTRAL_POINT_LIMITS =
  'No stall, no compressibility, no thickness, no propeller stream; rigid foam. The band names what it is made of.';
const FORE_METHOD =
  'The rearmost of: lowest neutral point less the largest wanted margin; the CG at which 80 % of up-elevator (elevons: what roll leaves) still trims 90 % of the greatest lift, power off.';
const FORE_SOURCE = 'Etkin & Reid, Dynamics of Flight, ch. 2; the shares are common practice, no source.';
const AFT_SOURCE = "Etkin & Reid, Dynamics of Flight, ch. 2; the margin is the design's own.";
const FIRST_SOURCE = 'Common practice, no source: in the front third of the range.';
const OF_MAC = 'Measured from the leading edge of the MAC.';

export const stabilityFigures = {
  cgAtBodySideMm: {
    name: 'CG behind the leading edge',
    explanation:
      "Centre of gravity of the aircraft ready to fly, measured aft from where a finger can touch the wing: its leading edge beside the body, or at the wing's root where there is none.",
    method: "CG less the leading edge at the station of the body's side.",
    source: 'Sum of moments; geometry.',
    limits: 'As good as the masses: weigh the sheet, the pack and the motor.',
  },
  cgPct: {
    name: 'CG, % MAC',
    explanation: 'The same as a share of the mean aerodynamic chord, as CG ranges are given.',
    method: `CG from the mass list. ${OF_MAC}`,
    source: 'Sum of moments; geometry.',
    limits: 'As good as the masses.',
  },
  neutralPointPct: {
    name: 'Neutral point, % MAC',
    explanation:
      'The CG at which the aircraft would no longer return to its attitude by itself. The CG must stay ahead of it.',
    method: `${NEUTRAL_POINT} ${OF_MAC}`,
    source: LATTICE_SOURCE,
    limits: NEUTRAL_POINT_LIMITS,
  },
  neutralPointXMm: {
    name: 'Neutral point',
    explanation: `The same along the aircraft. ${FOR_DRAWING}`,
    method: NEUTRAL_POINT,
    source: LATTICE_SOURCE,
    limits: NEUTRAL_POINT_LIMITS,
  },
  neutralPointHandbookXMm: {
    name: 'Neutral point, simple estimate',
    explanation: `A check on the lattice by the tail-volume formula that can be worked by hand. ${FOR_DRAWING}`,
    method:
      "Quarter MAC plus tail volume times the tail's lift slope over the whole aircraft's, less the downwash 2 CL / (pi A) of the wing.",
    source:
      'Etkin & Reid, Dynamics of Flight, ch. 2; Nelson, Flight Stability and Automatic Control, ch. 2; slopes: Lowry & Polhamus, NACA TN 3911 (1957).',
    limits:
      'For a tail well behind a wing of moderate sweep, in the full speed of the stream; not for foreplanes. No body, no propeller.',
  },
  staticMarginPct: {
    name: 'Static margin',
    explanation: 'How far the CG lies ahead of the neutral point. More is steadier and duller; none is unflyable.',
    method: 'Neutral point less CG, as a share of the mean aerodynamic chord.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 2.',
    limits: 'Carries the bands of the neutral point and of the CG, by squares.',
  },
  cgForeLimitPct: {
    name: 'CG range, forward limit, % MAC',
    explanation:
      'Further forward it is heavier in the nose than wanted, or full up-elevator no longer slows it to the stall.',
    method: `${FORE_METHOD} ${OF_MAC}`,
    source: FORE_SOURCE,
    limits: `${LATTICE_LIMITS} Near the stall the elevator works less than the lattice says.`,
  },
  cgForeLimitXMm: {
    name: 'CG range, forward limit',
    explanation: `The same along the aircraft. ${FOR_DRAWING}`,
    method: FORE_METHOD,
    source: FORE_SOURCE,
    limits: `${LATTICE_LIMITS} Near the stall the elevator works less than the lattice says.`,
  },
  cgAftLimitPct: {
    name: 'CG range, aft limit, % MAC',
    explanation: 'Further back it has less margin than wanted, and soon none.',
    method: `Lowest neutral point of its band less the smallest wanted margin. ${OF_MAC}`,
    source: AFT_SOURCE,
    limits: LATTICE_LIMITS,
  },
  cgAftLimitXMm: {
    name: 'CG range, aft limit',
    explanation: `The same along the aircraft. ${FOR_DRAWING}`,
    method: 'Lowest neutral point of its band less the smallest wanted margin.',
    source: AFT_SOURCE,
    limits: LATTICE_LIMITS,
  },
  firstFlightCgPct: {
    name: 'CG for the first flight, % MAC',
    explanation: 'One number to balance it at before it has ever flown.',
    method: `A quarter of the way from the forward to the aft limit. ${OF_MAC}`,
    source: FIRST_SOURCE,
    limits: 'As the CG range.',
  },
  firstFlightCgXMm: {
    name: 'CG for the first flight',
    explanation: `The same along the aircraft. ${FOR_DRAWING}`,
    method: 'A quarter of the way from the forward to the aft limit.',
    source: FIRST_SOURCE,
    limits: 'As the CG range.',
  },
  cgFromBodySideMm: {
    name: 'First-flight CG from the leading edge at the body side',
    explanation:
      'Where to balance it, measured aft from where a finger can touch the wing: its leading edge beside the body. Minus is ahead of it.',
    method:
      "First-flight CG less the leading edge at the station of the body's side; without a body, at the wing's root.",
    source: 'Geometry.',
    limits: 'As the CG range.',
  },
  firstFlightAtStationMm: {
    name: 'First-flight CG from the leading edge, under the wing',
    explanation:
      'Where a finger under each wing balances it: the station nearest the body at which there is wing ahead of the finger and behind it. Measured aft from the leading edge there, on both panels.',
    method: 'First-flight CG less the leading edge at that station; the station is among the inputs.',
    source: 'Geometry.',
    limits: 'As the CG range. A finger is taken as 12 mm.',
  },
  firstFlightFromNoseMm: {
    name: 'First-flight CG from the nose',
    explanation: 'Where to balance it, measured aft from the foremost point of the aircraft.',
    method: 'First-flight CG less the foremost point of bodies, booms, motors and leading edges.',
    source: 'Geometry.',
    limits: 'As the CG range. A spinner or a motor that ends up elsewhere moves the nose: measure from what is named.',
  },
  liftSlopePerRad: {
    name: 'Lift slope',
    explanation: 'How much lift a radian of angle of attack adds, on the wing area.',
    method: LATTICE,
    source: LATTICE_SOURCE,
    limits: LATTICE_LIMITS,
  },
} as const;
