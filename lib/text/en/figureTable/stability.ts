import { LATTICE, LATTICE_LIMITS, LATTICE_SOURCE } from './lattice';

export const stabilityFigures = {
  neutralPointXMm: {
    name: 'Neutral point',
    explanation:
      'The CG at which the aircraft would no longer return to its attitude by itself. The CG must stay ahead of it.',
    method: `${LATTICE} The place where lift due to angle of attack acts.`,
    source: LATTICE_SOURCE,
    limits: `${LATTICE_LIMITS} A body ahead of the wing moves it forward; its band covers that.`,
  },
  neutralPointHandbookXMm: {
    name: 'Neutral point, simple estimate',
    explanation: 'A check on the lattice by the tail-volume formula that can be worked by hand.',
    method:
      "Quarter MAC plus tail volume times the tail's lift slope over the whole aircraft's, less the downwash 2 CL / (pi A) of the wing.",
    source:
      'Etkin & Reid, Dynamics of Flight, ch. 2; Nelson, Flight Stability and Automatic Control, ch. 2; slopes: Lowry & Polhamus, NACA TN 3911 (1957).',
    limits: 'For a tail well behind a wing of moderate sweep; not for foreplanes.',
  },
  staticMarginPct: {
    name: 'Static margin',
    explanation: 'How far the CG lies ahead of the neutral point. More is steadier and duller; none is unflyable.',
    method: 'Neutral point less CG, as a share of the mean aerodynamic chord.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 2.',
    limits: 'Carries the whole band of the neutral point.',
  },
  cgForeLimitXMm: {
    name: 'CG range, forward limit',
    explanation:
      'Further forward it is heavier in the nose than wanted, or full up-elevator no longer slows it to the stall.',
    method:
      'The rearmost of: lowest neutral point less the largest wanted margin; the CG at which 80 % of up-elevator (elevons: what roll leaves) still trims 90 % of the greatest lift, power off.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 2; the shares are common practice, no source.',
    limits: `${LATTICE_LIMITS} Near the stall the elevator works less than the lattice says.`,
  },
  cgAftLimitXMm: {
    name: 'CG range, aft limit',
    explanation: 'Further back it has less margin than wanted, and soon none.',
    method: 'Lowest neutral point of its band less the smallest wanted margin.',
    source: "Etkin & Reid, Dynamics of Flight, ch. 2; the margin is the design's own.",
    limits: LATTICE_LIMITS,
  },
  firstFlightCgXMm: {
    name: 'CG for the first flight',
    explanation: 'One number to balance it at before it has ever flown.',
    method: 'A quarter of the way from the forward to the aft limit.',
    source: 'Common practice, no source: in the front third of the range.',
    limits: 'As the CG range.',
  },
  cgFromBodySideMm: {
    name: 'First-flight CG from the leading edge at the body side',
    explanation: 'The same, measured aft from where a finger can touch the wing: its leading edge beside the body.',
    method:
      "First-flight CG less the leading edge at the station of the body's side; without a body, at the wing's root.",
    source: 'Geometry.',
    limits: 'As the CG range.',
  },
  liftSlopePerRad: {
    name: 'Lift slope',
    explanation: 'How much lift a radian of angle of attack adds, on the wing area.',
    method: LATTICE,
    source: LATTICE_SOURCE,
    limits: LATTICE_LIMITS,
  },
} as const;
