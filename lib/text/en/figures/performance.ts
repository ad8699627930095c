// Words of the performance figures beside their table: problems, causes of bands, names of inputs, verdicts and the chart.

const problems = {
  noThrust: 'nothing says what thrust this motor gives, so climb and level speed cannot be worked out',
  noThrustFix: 'type the thrust of a bench test, or the largest power of the motor',
  glider: 'it has no motor',
  fanPitchSpeed: 'a ducted fan has no pitch speed; its jet leaves at {speed} m/s',
  cruiseBelowStall: 'at {cruise} m/s it cannot carry its weight: it stalls at {stall} m/s',
  cruiseBelowStallFix: 'type a cruise speed above the stall, or make it lighter',
  cannotFlyLevel: 'the thrust is not enough to fly level at any speed above the stall',
  cannotFlyLevelFix: 'check the thrust that is stated, and the mass',
  pointedTip: 'the wing runs out to a point, so there is no chord to measure by',
} as const;

const causes = {
  sectionClMax: 'greatest lift of the wing’s sections ({source})',
  drag: 'drag: friction, edges and fittings of a hand-built aircraft',
  dragStopped: 'drag, and how the propeller or fan stands while the motor is off',
  thrust: 'thrust estimated from the motor’s largest power',
  thrustAndDrag: 'thrust at speed, and drag',
  coefficient: 'the propeller’s coefficient is a general one',
} as const;

const verdicts = {
  stallHand: 'slow enough to be thrown by hand',
  stallHandFast: 'needs {need} m/s; a throw gives about {throw}',
  thrustGood: 'usual thrust',
  thrustLow: 'gentle: long climbs',
  thrustVeryLow: 'little thrust: it may not climb away',
  thrustHigh: 'strong: more than most airframes need',
  thrustVeryHigh: 'very strong: check the mount and the foam',
  thrustImpossible: 'more than physics allows: the motor’s largest power cannot give it',
  thrustDoubtful: 'hardly possible with the motor’s largest power: measure it',
  pitchSpeedGood: 'suits its stall speed',
  pitchSpeedLow: 'slow for its stall speed: choose more pitch',
  pitchSpeedVeryLow: 'too slow to fly on: choose more pitch',
  pitchSpeedHigh: 'fast for its stall speed: less pitch pulls harder',
  pitchSpeedVeryHigh: 'very fast for its stall speed: a poor launch',
  climbGood: 'climbs well',
  climbLow: 'climbs slowly',
  climbVeryLow: 'hardly climbs',
  climbStraightUp: 'climbs straight up',
  turnGood: 'turns at cruise speed without stalling',
  turnStalls: 'would stall at cruise speed in this turn; shown at {speed} m/s',
} as const;

const inputs = {
  clMax: 'greatest lift coefficient',
  clMaxTyped: 'greatest lift coefficient, typed in',
  density: 'air density',
  mass: 'mass',
  speed: 'speed',
  chord: 'chord',
  liftCoefficient: 'lift coefficient',
  zeroLift: 'drag coefficient without lift',
  growth: 'added by lift in the sections',
  induced: 'induced drag coefficient',
  stopped: 'propeller or fan standing still',
  stall: 'stall speed',
  slowestTurn: 'slowest speed for it',
  thrust: 'static thrust',
  rpm: 'propeller at static thrust',
  shaftPower: 'shaft power for it',
  ideal: 'power needed without losses over the motor’s largest',
  spent: 'speed at which no thrust is left',
  overStall: 'pitch speed over stall speed',
} as const;

/** Pieces of the drag; {name} is an element. */
const drag = {
  friction: '{name}: friction',
  edges: '{name}: front and back edges',
  gaps: '{name}: hinge gaps',
  body: '{name}',
  boom: '{name}',
  gear: '{name}',
  motor: '{name}',
  small: 'horns, rods, wires and joints',
} as const;

const chart = {
  title: 'Power against speed',
  x: 'speed',
  y: 'power',
  required: 'needed to fly level',
  requiredMore: 'needed, most of its band',
  available: 'thrust times speed',
  stall: 'stall',
  bestGlide: 'best glide',
  leastSink: 'least sink',
  cruise: 'cruise',
  top: 'highest level speed',
  note: 'It flies level where the curves meet and climbs where thrust lies above. Power in the air, not from the pack; thrust falls in a straight line with speed, which is a stand-in.',
} as const;

export const texts = { problems, causes, verdicts, inputs, drag, chart } as const;
