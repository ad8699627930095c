export const balanceFigures = {
  cgXMm: {
    name: 'CG',
    explanation: 'Centre of gravity of the aircraft ready to fly.',
    method: 'From the mass list: foam parts by area, tubes by length, everything else as typed in.',
    source: 'Sum of moments.',
    limits: 'As good as the masses: weigh the sheet, the pack and the motor. Paint is not counted.',
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
  pitchInertiaKgM2: {
    name: 'Pitch inertia',
    explanation:
      'How hard it is to start and stop the nose moving. Heavy things far from the CG raise it with the square of the distance.',
    method: 'Parallel axes over the mass list, each mass with its own extent.',
    source: 'Mechanics.',
    limits: 'As good as the places and sizes typed in.',
  },
} as const;
