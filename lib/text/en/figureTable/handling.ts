import { LATTICE_LIMITS, LATTICE_SOURCE } from './lattice';

export const handlingFigures = {
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
} as const;
