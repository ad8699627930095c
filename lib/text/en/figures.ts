// What the figures say to a person: causes of bands, names of inputs, verdicts and problems. What each figure is called and means
// stands in figureTable.ts.

const problems = {
  surfaceNotFinite: 'this surface holds a number that is not finite',
  surfaceWithoutLength: 'this surface has no length, so it cannot lift',
  surfaceWithoutChord: 'this surface has no chord, so it cannot lift',
  surfaceOneSided: 'a surface that is not mirrored must stand on the centre plane; one wing alone cannot be worked out',
  surfaceDoubled: 'a mirrored surface that stands on the centre plane lies on top of its own image',
  noLift: 'no surface gives lift when the aircraft pitches',
  noLiftFix: 'add a wing',
  coincident: 'two surfaces, or two parts of one, lie in the same place, so their lift cannot be told apart',
  coincidentFix: 'move one of them, or remove it',
  noWing: 'there is no wing, so there is nothing to measure areas and margins by',
  noWingFix: 'add a mirrored surface with the role "wing"',
  wingFoldsBack: 'the wing comes back towards the centre line, so its projected area cannot be worked out',
  wingFoldsBackFix: 'keep cant and dihedral together under 90 degrees',
  sectionAsFlat:
    'its lift without angle of attack is left out; the neutral point does not need it, the forward CG limit does',
  noMass: 'nothing in the document weighs anything yet',
  noMassFix: 'give the sheet a mass, and add the pack, motor and servos',
  cgRangeEmpty:
    'no CG is both far enough forward for the smallest margin and far enough back to be trimmed: {fore} mm is the forward limit, {aft} mm the aft limit',
  cgRangeEmptyFix: 'give the elevator more area or throw, enlarge the tail, or widen the wanted static margin',
  noPitchControl:
    'no control answers to the elevator stick, so the forward CG limit is by the largest wanted margin alone',
  noPitchControlFix: 'add an elevator or elevons, or give a control a share of pitch in its mix',
  noRollControl: 'no control answers to the aileron stick',
  noTailplane: 'there is no tailplane: the wing has to be stable by itself',
  noFin: 'there is no fin',
  foreplaneHandbook: 'the simple estimate is for a tail behind a wing, not for a foreplane',
  behindManoeuvrePoint: 'the CG lies so far back that the aircraft would pull tighter by itself',
  needsCg: 'it needs the CG, which could not be worked out',
  needsLattice: 'it needs the lift of the whole aircraft, which could not be worked out',
  notFinite: 'the arithmetic gives no finite number',
} as const;

const causes = {
  neutralPointBody: 'the body is left out, and foam flexes',
  neutralPointPusher: 'the stream of a propeller or fan behind the wing, and the body, are left out',
  neutralPointBare: 'lattice and flat sheet: thickness and foam that flexes are left out',
  neutralPoint: 'the band of the neutral point',
  flatPlateClMax: 'plates of sheet stall anywhere between these lift coefficients',
} as const;

const verdicts = {
  cgInRange: 'in range',
  cgBehind: '{mm} mm behind the range: bring weight forward',
  cgBehindUnstable: '{mm} mm behind the range and perhaps unstable: do not fly it like this',
  cgAhead: '{mm} mm ahead of the range: heavy in the nose',
  marginGood: 'stable, as wanted',
  marginLow: 'could be as little as {low} %, under the {min} % wanted',
  marginUnstable: 'could be unstable: do not fly it like this',
  marginHigh: 'at least {low} %, over the {max} % wanted: heavy in the nose',
  stallHand: 'slow enough to be thrown by hand',
  stallHandFast: 'a throw gives about {throw} m/s; it needs {need} m/s to fly',
  volumeGood: 'usual',
  volumeSmall: 'small',
  volumeVerySmall: 'very small',
  volumeLarge: 'large',
  volumeVeryLarge: 'very large',
  pitchGood: 'answers the elevator in a usual way',
  pitchQuick: 'quick in pitch',
  pitchVeryQuick: 'very quick in pitch',
  pitchSluggish: 'sluggish in pitch',
  pitchVerySluggish: 'hardly answers the elevator',
  rollGood: 'rolls in a usual way',
  rollQuick: 'quick in roll',
  rollVeryQuick: 'very quick in roll',
  rollSluggish: 'sluggish in roll',
  rollVerySluggish: 'hardly rolls',
  handbookAgrees: 'agrees with the lattice within {limit} % of the MAC',
  handbookDiffers:
    '{difference} % of the MAC from the lattice: look for a short tail, a low aspect ratio or surfaces close together',
} as const;

const inputs = {
  mac: 'MAC',
  wingArea: 'wing area',
  neutralPoint: 'neutral point',
  cg: 'CG',
  leastMargin: 'smallest wanted margin',
  largestMargin: 'largest wanted margin',
  neutralPointBand: 'band of the neutral point, each way',
  liftSlope: 'lift slope',
  clMax: 'greatest lift coefficient',
  density: 'air density',
  mass: 'mass',
  speed: 'speed',
  tailArea: 'tail area',
  finArea: 'fin area',
  arm: 'arm',
  upElevator: 'up-elevator used',
  foreByMargin: 'limit by the largest margin',
  foreByTrim: 'limit by the elevator',
  bodySide: 'body side from the centre line',
  throwDeg: 'full throw',
} as const;

export const texts = { problems, causes, verdicts, inputs } as const;
