export const controlsFigures = {
  hingeTorquePct: {
    name: 'Servo torque used',
    explanation:
      'How much of its stall torque the hardest-worked servo needs to hold full throw of one stick at twice the highest level speed, as in a dive. Half is enough.',
    method:
      'Hinge moment of a plain flap on a thin aerofoil, by its share of the chord, times dynamic pressure and the integral of the control chord squared; taken to the servo through the levers of the linkage. The wing is taken at the angle of attack of level flight at that speed.',
    source:
      'H. Glauert, ARC R&M 1095 (1927), pressure of a flapped plate integrated over the flap; Etkin & Reid, Dynamics of Flight, app. B; share left at low Reynolds numbers from memory.',
    limits:
      'No propeller stream, no gap, no balance area ahead of the hinge, no finite span: it errs on the high side. A servo without a typed torque is judged by its mass; a control without a linkage by the suggested one.',
  },
  servoTravelPct: {
    name: 'Servo travel used',
    explanation:
      'How far full throw turns the servo, as a share of 45° each way. Between 70 and 100 % is right: less wastes torque and shows every slop larger.',
    method:
      'Four-bar linkage of arm, rod and horn, solved exactly; the rod meets the arm at a right angle at neutral and the horn stands square over the hinge.',
    source:
      'Norton, Design of Machinery, position analysis of the four-bar linkage; 45° and 70 to 100 %: common practice.',
    limits:
      'In the plane square to the hinge at the horn; the servo shaft is taken at the middle of the servo. Sticks that share a control count together.',
  },
  controlSlopDeg: {
    name: 'Slop',
    explanation:
      'How far the loosest control can be moved by hand, from stop to stop, with the servo held. It sets how well trim is kept.',
    method:
      'Play at both ends of the rod over the lever of the horn, plus the centring of the servo times the gear ratio, at neutral.',
    source: 'Geometry; play 0.1 mm at each hole and 1° of centring: common practice.',
    limits: 'Rod, horn and foam are taken as stiff. Measure your own.',
  },
  controlSlopMm: {
    name: 'Slop at the trailing edge',
    explanation:
      'The same for a rule: movement of the trailing edge at the widest chord of that control, from stop to stop.',
    method: 'The straight line from stop to stop: twice the chord behind the hinge times the sine of half the angle.',
    source: 'Geometry.',
    limits: 'As for the angle.',
  },
  rodBucklingFactor: {
    name: 'Rod buckling factor',
    explanation:
      'How many times the load of full throw at twice the highest level speed the weakest rod carries before it bows out. Two is enough.',
    method: 'Euler load of a straight rod with pinned ends, over the hinge moment divided by the lever of the horn.',
    source:
      "Young & Budynas, Roark's Formulas for Stress and Strain, columns; steel 200 GPa, carbon 110 GPa from memory.",
    limits:
      'Guides are not in the document: the whole rod counts as free. Rods under 1.8 mm are taken as steel wire, others as carbon.',
  },
} as const;
