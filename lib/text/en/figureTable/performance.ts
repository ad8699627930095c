const DRAG_SOURCE =
  'Friction: Schlichting, Boundary-Layer Theory, ch. 7 and 21. Edges, bodies, tubes, wheels: Hoerner, Fluid-Dynamic Drag, from memory. Growth with lift: Pelletier & Mueller, Journal of Aircraft 37 (2000).';
const DRAG_LIMITS =
  'A build-up by hand rules, and a hand-built aircraft is rougher or smoother than they: measure a glide. No propeller stream, no compressibility; the tail’s own growth with lift is left out.';
const THRUST_LIMITS =
  'A stand-in until motor, pack and propeller are worked out: static thrust falling in a straight line to nothing at pitch speed (fans: at the speed of their jet). Propellers pull past pitch speed: the band reaches 1.65 times as far.';
const LEVEL = 'Anderson, Aircraft Performance and Design, ch. 5.';

export const performanceFigures = {
  stallSpeedMs: {
    name: 'Stall speed',
    explanation: 'The slowest it can fly level, power off.',
    method:
      'Weight equals lift at the greatest lift coefficient: typed in, or the wing’s sections weighted by area, each by its kind, sweep and Reynolds number at the stall. Air of the given height and temperature.',
    source:
      'Flat plate: Pelletier & Mueller, Journal of Aircraft 37 (2000). Folded and shaped sections: from memory. Stepped: common practice. Sweep: Raymer, Aircraft Design, ch. 12. Air: U.S. Standard Atmosphere 1976.',
    limits: 'An estimate: plates stall softly, and a twisted or rough wing stalls sooner. Type in what you measured.',
  },
  launchSpeedMs: {
    name: 'Launch speed',
    explanation: 'What a throw, bungee or take-off run has to give it.',
    method: '1.1 times the stall speed.',
    source: 'Common practice, no source.',
    limits: 'In calm air. A headwind helps by its own speed.',
  },
  bestGlideRatio: {
    name: 'Best glide ratio',
    explanation: 'How far it glides for each metre of height, motor off, at its best speed in calm air.',
    method:
      'Most lift over drag: drag build-up, growth with lift, induced drag by the far field in trim, and the propeller or fan standing still.',
    source: `${LEVEL} ${DRAG_SOURCE}`,
    limits: `${DRAG_LIMITS} A propeller that folds glides further, one that turns freely less far.`,
  },
  bestGlideSpeedMs: {
    name: 'Speed of best glide',
    explanation: 'The speed to hold when the motor stops.',
    method: 'The speed of least drag, motor off.',
    source: LEVEL,
    limits: DRAG_LIMITS,
  },
  leastSinkMs: {
    name: 'Least sink',
    explanation: 'How fast it comes down at the slowest, motor off.',
    method: 'Least power over weight, motor off.',
    source: LEVEL,
    limits: DRAG_LIMITS,
  },
  leastSinkSpeedMs: {
    name: 'Speed of least sink',
    explanation: 'The speed that keeps it up longest. Close to the stall: leave a margin.',
    method: 'The speed of least power, motor off, from the stall up.',
    source: LEVEL,
    limits: DRAG_LIMITS,
  },
  topSpeedMs: {
    name: 'Highest level speed',
    explanation: 'How fast it flies level at full throttle.',
    method: 'The fastest speed at which thrust equals drag.',
    source: `${LEVEL} Thrust past pitch speed: UIUC Propeller Database, volume 1.`,
    limits: `${THRUST_LIMITS} ${DRAG_LIMITS}`,
  },
  climbMs: {
    name: 'Best climb',
    explanation: 'Height gained in a second at full throttle, at its best speed.',
    method: 'Most excess of thrust over drag, times speed, over weight.',
    source: LEVEL,
    limits: `${THRUST_LIMITS} Drag is that of level flight, which is too much for a steep climb.`,
  },
  turnRadius2gM: {
    name: 'Turn radius at 2 g',
    explanation: 'How tight it turns, banked 60°, at cruise speed; faster when it would stall there.',
    method: 'Speed squared over g times the root of 3, at the larger of cruise speed and 1.41 times the stall speed.',
    source: 'Anderson, Aircraft Performance and Design, ch. 6.',
    limits: 'Level turn; it takes the thrust to hold the height, which is not asked for here.',
  },
  staticThrustN: {
    name: 'Static thrust',
    explanation: 'What all motors pull standing still.',
    method:
      'As stated in the document; else by momentum theory from the motor’s largest power, with the losses of a small motor and a small propeller or fan.',
    source:
      'Rankine and Froude; figure of merit and thrust coefficient: UIUC Propeller Database, volume 1. Ducts: Pereira, University of Maryland thesis (2008). Motor losses: common practice.',
    limits: 'Only a bench test tells. The pack’s voltage does not enter yet.',
  },
  thrustToWeight: {
    name: 'Thrust over weight',
    explanation: 'Over 1 it can hang on its propeller; a trainer wants 0.6 to 0.8.',
    method: 'Static thrust over weight.',
    source: 'Bands: common practice, no source.',
    limits: 'Static thrust says little about speed.',
  },
  pitchSpeedMs: {
    name: 'Pitch speed',
    explanation: 'How fast the propeller would screw itself forward: 2.5 to 3 times the stall speed suits most.',
    method: 'Turns that a general propeller of this size needs for the static thrust, times the pitch.',
    source: 'Thrust coefficient: UIUC Propeller Database, volume 1. Band: common practice, no source.',
    limits: 'The turns are not measured here, and no slip is taken off. The propeller still pulls a little beyond it.',
  },
  levelPowerW: {
    name: 'Power to cruise',
    explanation: 'Power that must reach the air to fly level at cruise speed. The pack gives about twice that.',
    method: 'Drag times speed at cruise.',
    source: LEVEL,
    limits: DRAG_LIMITS,
  },
  dragCruiseN: {
    name: 'Drag at cruise',
    explanation: 'The thrust that level flight at cruise speed needs.',
    method:
      'Drag without lift by the build-up, growth of the sections’ drag with lift, and induced drag by the far field in trim.',
    source: DRAG_SOURCE,
    limits: DRAG_LIMITS,
  },
  dragAreaCm2: {
    name: 'Drag area',
    explanation: 'All drag without lift as a plate of this size would make it; what goes in shows where it comes from.',
    method:
      'Strip by strip: friction by the local Reynolds number, tripped at cut edges and laminar to the thickest place of folded sections; blunt edges; hinge gaps; bodies with their form and base; tubes, wheels, motors; a tenth for what is too small to draw.',
    source: DRAG_SOURCE,
    limits: DRAG_LIMITS,
  },
  zeroLiftDrag: {
    name: 'Drag coefficient without lift',
    explanation: 'The drag area over the wing area, to compare aircraft of different size.',
    method: 'Drag area at cruise speed over the wing area.',
    source: DRAG_SOURCE,
    limits: DRAG_LIMITS,
  },
  reynoldsRoot: {
    name: 'Reynolds number at the root',
    explanation: 'How the air feels the size and speed of the wing where it begins.',
    method: 'Cruise speed times root chord over the kinematic viscosity.',
    source: 'U.S. Standard Atmosphere 1976.',
    limits: 'Under about 50 000 curved sections lose lift.',
  },
  reynoldsTip: {
    name: 'Reynolds number at the tip',
    explanation: 'The same at the tip, where it is least: small tips stall first.',
    method: 'Cruise speed times tip chord over the kinematic viscosity.',
    source: 'U.S. Standard Atmosphere 1976.',
    limits: 'Under about 50 000 curved sections lose lift.',
  },
} as const;
