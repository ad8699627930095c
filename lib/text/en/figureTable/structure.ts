const TWIST_METHOD =
  'Strips along half the surface: what the control lifts and twists against the stiffness of sheet and spars, bending of a swept wing in it. The sheet behind the hinge carries nothing.';
const TWIST_SOURCE =
  'Bisplinghoff, Ashley & Halfman, Aeroelasticity, ch. 8; flap by thin-aerofoil theory: Glauert, ARC R&M 1095 (1927). Stiffness: Young & Budynas, Roark’s Formulas for Stress and Strain; faced board: Seide (1956), from memory.';
const TWIST_LIMITS =
  'Known no better than the sheet’s stiffness: bend an offcut and type its modulus in. Covering, tape and ribs stiffen it and are not counted; strips lift without feeling each other; flutter is not in it.';

export const structureFigures = {
  sparStressMpa: {
    name: 'Spar stress',
    explanation: 'How hard the spar is pulled and pressed at the largest load the aircraft has to bear.',
    method:
      'Weight times load factor laid along the span as half an ellipse, the bending moment at the spar’s inner end over its section modulus; the sheet is taken to carry nothing.',
    source: 'Young & Budynas, Roark’s Formulas for Stress and Strain, ch. 8 and table A.1.',
    limits:
      'The wing’s own weight, which relieves the spar, is left out. Crushing, glue and the spar’s ends are not checked. Where no strength is typed in, 600 MPa for pultruded carbon, from memory.',
  },
  tipDeflection1gMm: {
    name: 'Tip rises by',
    explanation: 'How far the wing tip bends up in level flight.',
    method: 'Half a wing held at its root, loaded with half an ellipse; sheet and spars bend together.',
    source: 'Young & Budynas, Roark’s Formulas for Stress and Strain, ch. 8.',
    limits:
      'Moduli that are not typed in are from memory. Joints, covering and the wing’s own weight are left out; the spar is taken as glued along its whole length.',
  },
  controlLossAtCruisePct: {
    name: 'Control lost to twist',
    explanation:
      'A control that goes down also twists the foam ahead of it nose down, and the twist takes some of its effect away: more, the faster it flies. This is the share lost at cruise, of the control that loses most.',
    method: TWIST_METHOD,
    source: TWIST_SOURCE,
    limits: `${TWIST_LIMITS} What counts as much is common practice, no source.`,
  },
  tipTwistPerDeg: {
    name: 'Tip twist per degree of control',
    explanation:
      'How many degrees the tip turns against each degree of control at cruise: nose down for a trailing edge that goes down. Below zero it turns with the control.',
    method: TWIST_METHOD,
    source: TWIST_SOURCE,
    limits: TWIST_LIMITS,
  },
  reversalSpeedMs: {
    name: 'Controls reverse at',
    explanation:
      'At this speed the twist takes all of the control’s effect; above it the aircraft answers the wrong way. Long before, it feels dead.',
    method: `${TWIST_METHOD} The speed at which the control’s power is nil.`,
    source: TWIST_SOURCE,
    limits: TWIST_LIMITS,
  },
  divergenceSpeedMs: {
    name: 'Wing twists off at',
    explanation:
      'At this speed the wing’s own lift twists it further, without end. A wing swept back has no such speed; one swept forward, or a straight one whose stiffness lies far behind the quarter chord, has.',
    method: `${TWIST_METHOD} The speed at which the twist feeds itself.`,
    source: TWIST_SOURCE,
    limits: `${TWIST_LIMITS} Worked out for surfaces with controls.`,
  },
} as const;
