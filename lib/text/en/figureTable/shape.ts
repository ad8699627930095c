import { FOR_DRAWING } from './lattice';

export const shapeFigures = {
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
    explanation: `Where the wing alone carries added lift. The tail moves it back to the neutral point. ${FOR_DRAWING}`,
    method: 'Quarter point of the mean aerodynamic chord.',
    source: 'Thin-aerofoil theory; Raymer, Aircraft Design, ch. 7.',
    limits:
      'A rule: strongly swept or very low wings lie up to 5 % of the MAC off it. The neutral point does not use it.',
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
  spanEfficiency: {
    name: 'Span efficiency',
    explanation:
      'How close lift comes to the least drag that it can cost on this span: 1 is an elliptic load. Fins at the tips bring it over 1.',
    method:
      "Lift coefficient squared over pi, aspect ratio and the induced drag of the wake far behind, for the load that angle of attack gives the whole aircraft. Beside it the wing alone by Glauert's lifting line.",
    source:
      'Munk, NACA TR 121; Katz & Plotkin, Low-Speed Aerodynamics, ch. 12. Lifting line: Glauert, Elements of Aerofoil and Airscrew Theory.',
    limits:
      'The lifting line knows neither sweep nor tail, so the two differ for swept wings and with fins at the tips.',
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
