// What each figure is called, what it means, how it is worked out, where that comes from and when not to trust it.

const LATTICE = 'Vortex lattice over all surfaces, both halves; legs along the x axis, quarter-strip tip inset.';
const LATTICE_SOURCE =
  'Katz & Plotkin, Low-Speed Aerodynamics, ch. 12; tip inset: Hough, Journal of Aircraft 10 (1973); controls: Glauert, ARC R&M 1095 (1927).';
const LATTICE_LIMITS = 'No body, no propeller stream, no stall, no compressibility, no thickness; rigid foam.';

export const figureTexts = {
  spanMm: {
    name: 'Span',
    explanation: 'Tip to tip, seen from above.',
    method: 'Twice the reach of the widest wing; dihedral shortens it.',
    source: 'Geometry.',
    limits: 'Rounded or raked tips are counted to the end of the panel.',
  },
  wingAreaDm2: {
    name: 'Wing area',
    explanation:
      'Area of the wing seen from above, with the part that the body covers. The reference for loadings and margins.',
    method: 'Sum of trapezoids of all surfaces with the role "wing".',
    source: 'Geometry; reference area as in Raymer, Aircraft Design, ch. 7.',
    limits: 'Cut-outs and tip shapes are not taken off.',
  },
  aspectRatio: {
    name: 'Aspect ratio',
    explanation: 'How slender the wing is: long and narrow glides better, short and broad is stronger.',
    method: 'Span squared over wing area.',
    source: 'Definition.',
    limits: 'Projected, so dihedral lowers it a little.',
  },
  macMm: {
    name: 'Mean aerodynamic chord',
    explanation: 'The chord that stands for the whole wing in balance: the CG range is a share of it.',
    method: 'Integral of the squared chord over the area.',
    source: 'Raymer, Aircraft Design, ch. 7; Etkin & Reid, Dynamics of Flight, app. C.',
    limits: 'Of the wing alone, projected.',
  },
  aerodynamicCentreXMm: {
    name: 'Aerodynamic centre of the wing',
    explanation: 'Where the wing alone carries added lift. The tail moves it back to the neutral point.',
    method: 'Quarter point of the mean aerodynamic chord.',
    source: 'Thin-aerofoil theory; Raymer, Aircraft Design, ch. 7.',
    limits:
      'A rule: strongly swept or very low wings lie up to 5 % of the MAC off it. The neutral point does not use it.',
  },
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
  cgXMm: {
    name: 'CG',
    explanation: 'Centre of gravity of the aircraft ready to fly.',
    method: 'From the mass list: foam parts by area, tubes by length, everything else as typed in.',
    source: 'Sum of moments.',
    limits: 'As good as the masses: weigh the sheet, the pack and the motor. Paint is not counted.',
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
  allUpMassG: {
    name: 'All-up mass',
    explanation: 'Everything that flies.',
    method: 'Sum of the mass list.',
    source: 'Sum.',
    limits: 'As good as the masses typed in; paint is not counted. Foam aircraft grow by about a tenth in building.',
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
  stallSpeedMs: {
    name: 'Stall speed',
    explanation: 'The slowest it can fly level, power off.',
    method: 'Weight equals lift at the greatest lift coefficient, air of the given height and temperature.',
    source: 'Flat plate: Pelletier & Mueller, Journal of Aircraft 37 (2000); air: U.S. Standard Atmosphere 1976.',
    limits: 'An estimate: plates stall softly, and the figure for folded sections has to be typed in.',
  },
  tailVolumeH: {
    name: 'Tail volume, horizontal',
    explanation: 'Tail area times its arm, measured by the wing: how much it steadies pitch.',
    method:
      'Tail area times arm (quarter MAC to quarter MAC), over wing area times MAC. A V-tail counts by its share seen from above.',
    source: 'Raymer, Aircraft Design, eq. 6.28; V-tail: Purser & Campbell, NACA TR 823 (1945).',
    limits: 'Says nothing of downwash; the neutral point does.',
  },
  tailVolumeV: {
    name: 'Tail volume, vertical',
    explanation: 'Fin area times its arm, measured by the wing: how much it keeps straight.',
    method: 'Fin area times arm (quarter MAC to quarter MAC), over wing area times span; both fins of a pair count.',
    source: 'Raymer, Aircraft Design, eq. 6.27; V-tail: Purser & Campbell, NACA TR 823 (1945).',
    limits: 'Says nothing of sweep and dihedral, which also weathercock.',
  },
  liftSlopePerRad: {
    name: 'Lift slope',
    explanation: 'How much lift a radian of angle of attack adds, on the wing area.',
    method: LATTICE,
    source: LATTICE_SOURCE,
    limits: LATTICE_LIMITS,
  },
  pitchPowerPerDeg: {
    name: 'Pull per degree of elevator',
    explanation: 'How many g a degree of up-elevator adds in a steady pull-up at cruise speed: what the thumb feels.',
    method: 'Steady pull-up: lift and moment in balance with angle of attack, pitch rate and elevator about the CG.',
    source: 'Etkin & Reid, Dynamics of Flight, ch. 3 (elevator angle per g).',
    limits: `${LATTICE_LIMITS} Slop and servo centring add to it; the bands of feel are common practice, no source.`,
  },
  rollRatePerDeg: {
    name: 'Roll rate per degree of aileron',
    explanation: 'Steady roll rate for each degree of the up-going side at cruise speed.',
    method: 'Rolling moment of the ailerons against roll damping, both from the lattice.',
    source: `${LATTICE_SOURCE} Steady roll: Etkin & Reid, Dynamics of Flight.`,
    limits: `${LATTICE_LIMITS} A foam wing that twists rolls slower.`,
  },
  rollHelix: {
    name: 'Helix angle at full aileron',
    explanation:
      'How steep a screw the wing tip flies at full throw: roll rate made comparable between sizes and speeds.',
    method: 'Roll rate times span over twice the speed, with the stick fully over and pitch at rest.',
    source:
      'Lower bound 0.07: Gilruth & Turner, NACA TR 715 (1941), from memory; upper bound common practice, no source.',
    limits: LATTICE_LIMITS,
  },
  pitchInertiaKgM2: {
    name: 'Pitch inertia',
    explanation:
      'How hard it is to start and stop the nose moving. Heavy things far from the CG raise it with the square of the distance.',
    method: 'Parallel axes over the mass list, each mass with its own extent.',
    source: 'Mechanics.',
    limits: 'As good as the places and sizes typed in.',
  },
  reynoldsMac: {
    name: 'Reynolds number at the MAC',
    explanation:
      'How coarse the air feels to this wing at cruise. Below about 100 000 thin plates do better than thick sections.',
    method: 'Cruise speed times MAC over kinematic viscosity.',
    source: 'Definition; air: U.S. Standard Atmosphere 1976.',
    limits: 'At the tip it is smaller by the taper.',
  },
} as const;
