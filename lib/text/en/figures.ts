// What the figures say to a person: causes of bands, names of inputs, verdicts and problems. What each figure is called and means
// stands in figureTable.ts.

const problems = {
  impossibleDrag: 'the lattice gives a drag of lift that cannot be: surfaces lie too close together',
  surfaceNotFinite: 'this surface holds a number that is not finite',
  surfaceWithoutLength: 'this surface has no length, so it cannot lift',
  surfaceWithoutChord: 'this surface has no chord, so it cannot lift',
  surfaceOneSided: 'a surface that is not mirrored must stand on the centre plane; one wing alone cannot be worked out',
  surfaceDoubled: 'a mirrored surface that stands on the centre plane lies on top of its own image',
  noLift: 'no surface gives lift when the aircraft pitches',
  noLiftFix: 'add a wing',
  coincident: 'two surfaces, or two parts of one, lie in the same place, so their lift cannot be told apart',
  coincidentFix: 'move one of them, or remove it',
  wakePlane:
    'it lies in the very plane of the wing’s wake: the lattice takes the mean over its width, and in the air the wake may shake it',
  wakePlaneFix: 'raise or lower it by a sheet’s thickness',
  latticeTooLarge: 'the surfaces come to {count} panels of lift, and at most {most} are worked out',
  latticeTooLargeFix: 'use fewer surfaces, panels or controls',
  foldsOnItself: 'panels of this surface cross each other or lie on each other',
  foldsOnItselfFix: 'give its panels less dihedral between them',
  surfacesCross: 'this surface cuts lengthwise through another one',
  surfacesCrossFix: 'move one of them up or down, or change its dihedral',
  noWing: 'there is no wing, so there is nothing to measure areas and margins by',
  noWingFix: 'add a mirrored surface with the role "wing"',
  wingFoldsBack: 'the wing comes back towards the centre line, so its projected area cannot be worked out',
  wingFoldsBackFix: 'keep cant and dihedral together under 90 degrees',
  noMass: 'nothing in the document weighs anything yet',
  noMassFix: 'give the sheet a mass, and add the pack, motor and servos',
  noPitchControl:
    'no control answers to the elevator stick, so the forward CG limit is by the largest wanted margin alone',
  noPitchControlFix: 'add an elevator or elevons, or give a control a share of pitch in its mix',
  noTailplane: 'there is no tailplane: the wing has to be stable by itself',
  noFin: 'there is no fin',
  foreplaneVolume: 'there is a foreplane instead of a tailplane',
  foreplaneHandbook: 'the simple estimate is for a tail behind one wing, not for a foreplane or wings in tandem',
  needsLattice: 'it needs the lift of the whole aircraft, which could not be worked out',
  notFinite: 'the arithmetic gives no finite number',
} as const;

const causes = {
  latticeEnds: 'the lattice: strips of finite width at tips and fins',
  neutralPoint: 'the band of the neutral point',
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
  volumeGood: 'usual',
  volumeSmall: 'small',
  volumeVerySmall: 'very small',
  volumeLarge: 'large',
  volumeVeryLarge: 'very large',
  handbookAgrees: 'agrees with the lattice within {limit} % of the MAC',
  handbookDiffers:
    '{difference} % of the MAC from the lattice: look for a short tail, a low aspect ratio or surfaces close together',
} as const;

const inputs = {
  mac: 'MAC',
  neutralPoint: 'neutral point',
  cg: 'CG',
  leastMargin: 'smallest wanted margin',
  largestMargin: 'largest wanted margin',
  neutralPointBand: 'band of the neutral point, each way',
  clMax: 'greatest lift coefficient',
  speed: 'speed',
  tailArea: 'tail area',
  finArea: 'fin area',
  arm: 'arm',
  foreByMargin: 'limit by the largest margin',
  foreByTrim: 'limit by the elevator',
  liftingLine: 'wing alone by the lifting line',
  bodySide: 'body side from the centre line',
  throwDeg: 'full throw',
} as const;

export const texts = { problems, causes, verdicts, inputs } as const;
