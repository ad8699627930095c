// What the figures of balance say to a person.

const causes = {
  mass: 'masses: the sheet’s stated mass, glue and coverings are estimates until weighed',
} as const;

const moves = {
  stay: 'where it is',
  forward: '{mm} mm forward',
  aft: '{mm} mm aft',
} as const;

const places = {
  nose: 'the nose',
  tail: 'the tail',
  item: 'the place of "{name}"',
  portTip: 'the port tip',
  stbdTip: 'the starboard tip',
} as const;

const verdicts = {
  massInLimit: 'under the {limit} g you set',
  massNearLimit: 'could be over the {limit} g you set',
  massOverLimit: '{over} g over the {limit} g you set',
  level: 'balanced from side to side',
  heavy: 'needs {mass} g in {tip}',
  veryHeavy: 'rolls by itself: {mass} g in {tip}, or move something across',
  packEnd: '{move} of where it is now',
  packEndHere: 'where it is now',
  packFree: 'move it {move}; no slide is given, so look whether it fits',
  packStay: 'leave it where it is',
  packMove: 'move it {move}',
  packShort: 'its slide ends {mm} mm short of {move}',
  packNoReach: 'no place on its slide brings the CG into range',
  ballastNone: 'none needed',
  ballastMove: 'none, once the pack is moved {move}',
  ballastAdd: 'add {mass} g at {place}',
  ballastPack: 'the pack cannot reach it: add {mass} g at {place}',
  ballastPackMoved: 'the pack cannot reach it: move it {move} and add {mass} g at {place}',
  ballastHeavy: '{words}; that much is dead weight, so move something heavy instead',
} as const;

const inputs = {
  foam: 'foam',
  covering: 'coverings',
  glue: 'glue and tape',
  tube: 'tubes',
  item: 'things put in',
  drive: 'motor and propeller',
  gear: 'gear',
  massLimit: 'mass limit',
  allUp: 'all-up mass',
  packMass: 'pack',
  slideFore: 'slide, forward end',
  slideAft: 'slide, aft end',
  reachFore: 'reached, forward end',
  reachAft: 'reached, aft end',
  swapCg: 'with {mass} g: CG moves',
  swapMargin: 'with {mass} g: static margin',
  swapMove: 'with {mass} g: move the pack',
  ballastFromNose: 'place of the ballast, behind the nose',
  ballastFirstFlight: 'for the first-flight CG instead',
  packMoved: 'pack moved first',
  span: 'span',
  mac: 'MAC',
  length: 'length without propeller',
  radius: 'radius of gyration',
} as const;

const problems = {
  noPack: 'there is no pack to move',
  noPackFix: 'add an item of the kind "pack" with its mass',
  noBallastPlace: 'ballast at {place} cannot bring the CG there: the place lies on the wrong side of it',
  noBallastPlaceFix: 'move something heavy, or change the wanted static margin',
} as const;

export const texts = { causes, moves, places, verdicts, inputs, problems } as const;
