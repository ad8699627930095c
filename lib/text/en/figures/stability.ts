// What the neutral point, the CG range and the places to measure from say to a person. Words shared with other figures stand in
// ../figures.ts.

const problems = {
  cgRangeEmpty:
    'no CG is both far enough forward for the smallest margin and far enough back to be trimmed: {fore} % of the MAC is the forward limit, {aft} % the aft limit',
  cgRangeEmptyFix: 'give the elevator more area or throw, enlarge the tail, or widen the wanted static margin',
  noWingAbove: 'the CG line for the first flight crosses no part of the wing beside the body: balance it on the body',
} as const;

const causes = {
  lattice: 'lattice {pct} %',
  bodies: 'half of what the bodies do {pct} %',
  propellers: 'half of what the propellers do {pct} %',
  leastBare: 'at least {pct} % for thickness and foam that flexes',
  leastBody: 'at least {pct} % with a body',
  leastPusherOrFan: 'at least {pct} % with a propeller behind the wing or a buried fan',
  clMax: 'the band of the greatest lift coefficient',
  neutralPointAndMass: 'the band of the neutral point, and the CG by the masses',
} as const;

const verdicts = {
  marginUnstable: 'unstable: do not fly it like this',
  cgUnstable: '{mm} mm behind the range and unstable: do not fly it like this',
} as const;

const inputs = {
  ofMac: 'from the leading edge of the MAC',
  shiftByBodies: 'shift by the bodies',
  shiftByPropellers: 'shift by the propellers',
  station: 'station from the centre line',
  noseBody: 'nose is the body, at',
  noseBoom: 'nose is a boom, at',
  noseDrive: 'nose is a motor or its propeller, at',
  noseSurface: 'nose is a leading edge, at',
} as const;

export const texts = { problems, causes, verdicts, inputs } as const;
