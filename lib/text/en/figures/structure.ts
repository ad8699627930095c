// What the figures of strength and stiffness say to a person.

const problems = {
  noSpar: 'no bought spar in a wing: the sheet alone carries the load',
  noControl: 'no mirrored surface has a control that answers to pitch or roll',
  noReversal: 'at no speed: the wing does not twist against its controls',
  noDivergence: 'at no speed: lift twists the wing the other way, or not at all',
  twistsOff: 'the {surface} twists off by its own lift at {speed} m/s, below the cruising speed',
  twistsOffFix: 'put the spar further forward, use a stiffer sheet, or sweep the wing less far forward',
} as const;

const causes = {
  spar: 'how the load lies along the span, and what the sheet carries of it',
  stiffness: 'how stiff the sheet and the spar are',
} as const;

const verdicts = {
  sparGood: 'holds with something to spare',
  sparLow: 'holds, with less than {factor} times to spare',
  sparBad: 'breaks at {load} g',
  lossGain: 'twist adds to the control',
  lossLargeGain: 'twist adds a lot: it is close to twisting off',
  lossGood: 'stiff enough',
  lossHigh: 'twist takes {pct} % of it at cruise: it goes soft with speed',
  lossVeryHigh: 'twist takes {pct} % of it at cruise: stiffen the wing',
  lossReversed: 'reversed: the foam twists more than the control turns',
  speedGood: 'more than twice the cruising speed',
  speedLow: 'within reach of a dive: keep it slow',
  speedBad: 'close to the cruising speed: stiffen the wing',
} as const;

const inputs = {
  loadFactor: 'load factor',
  mass: 'mass',
  moment: 'bending moment at the spar’s inner end',
  strength: 'strength of the spar',
  halfSpan: 'half-span along the spar',
  control: '{control} of the {surface}, for {stick}: full throw',
  torsion: 'torsional stiffness beside it',
  speed: 'cruising speed',
  wing: 'weight that the {surface} carries',
} as const;

const sticks = { pitch: 'pitch', roll: 'roll' } as const;

export const texts = { problems, causes, verdicts, inputs, sticks } as const;
