// Workshop aids and the stock coupon: what is written on the pieces, and what is wrong with typed readings.

// A drawing breaks a line at the dot where there is no room for all of it.
const notPart = 'gauge, not a part · of the aircraft';

const cgStand = {
  upright: 'CG stand, upright',
  base: 'CG stand, base',
  marker: 'CG stand, marker',
  uprightAbout: '{y} mm from the middle',
  line: 'first-flight CG',
  baseAbout: 'upright in each slot, {apart} mm apart',
  baseUse: 'wing on both fingers: shift the pack until it lies level',
  markerAbout: 'hook on the leading edge · {y} mm from the middle',
  markerUse: 'notch {d} mm behind it · is the first-flight CG',
};

const throwGauge = {
  name: 'Throw gauge, {surface}, {control}',
  slipOn: 'slip it over the trailing edge · beside the control',
  layOn: 'lay it against the end of the control · cross on the hinge',
  reads: 'mm straight from neutral · {r} mm behind the hinge',
  neutral: 'neutral',
  hinge: 'hinge',
  chord: 'along the surface',
  /** A throw without a rate switch has no word for its rate. */
  mark: { high: '{mm} mm {way}, high', low: '{mm} mm {way}, low', only: '{mm} mm {way}' },
  withSticks: '{sticks} {mark}',
  sticks: { pitch: 'pitch', roll: 'roll', yaw: 'yaw', flap: 'flap' },
  ways: { up: 'up', down: 'down', stbd: 'starboard', port: 'port', none: 'neutral' },
};

const incidence = {
  name: 'Incidence gauge, {surface}',
  tipName: 'Incidence gauge, {surface}, tip',
  decalageName: 'Decalage gauge, {surface} against {other}',
  up: '{deg}° leading edge up',
  down: '{deg}° leading edge down',
  level: '0°, level',
  sits: 'feet on the upper face · {station} mm from the root',
  holds: 'edges in the two notches · {station} mm from the root',
  topLevel: 'right when the top edge · is level with the datum',
  bottomLevel: 'right when the bottom edge · is level with the datum',
  topAlong: 'right when the top edge runs · along the chord of: {other}',
  bottomAlong: 'right when the bottom edge runs · along the chord of: {other}',
  alsoDecalage: 'the decalage too: level is {other}',
};

const dihedral = {
  prop: 'Dihedral prop, {surface}, {panel}',
  cross: 'Dihedral prop, {surface}, {panel}, foot',
  about: '{height} mm high, {station} mm from the root',
  upright: 'root flat on the bench',
  inverted: 'upside down, root flat on the bench',
  crossAbout: 'into the slot of the prop',
};

const bevel = {
  cheek: 'Bevel block {deg}°',
  spacer: 'Bevel block, spacer',
  about: 'slope {deg}° from square',
  toe: 'toe on the bevel line',
  spacerAbout: 'tabs into two cheeks · of one angle',
  spacerFor: 'for {degs}',
  degrees: '{deg}°',
};

const boomJig = {
  front: 'Boom jig, front',
  rear: 'Boom jig, rear',
  apart: 'booms {spacing} mm apart, middle to middle',
  height: 'underside of the boom {heights} mm over the bench',
  stands: 'stand it square across the bench, pin or tape it',
  between: 'front and rear {length} mm apart',
  middle: 'middle',
};

const coupon = {
  square: 'Stock coupon, square, {material}',
  strip: 'Stock coupon, bending strip, {material}',
  comb: 'Stock coupon, slot comb, {material}',
  squareAbout: 'weigh it in g · measure its thickness in mm at all four sides',
  stripAbout: 'on two edges {span} mm apart',
  stripReads: 'read the load in g · and how far the middle sinks in mm',
  combAbout: 'slide a scrap of the same board in without force',
  combReads: 'read the narrowest slot that lets it in and holds it',
  support: 'support',
  load: 'load here',
  slot: '{width}',
};

const problems = {
  notNumber: 'this reading must be a number above 0',
  massDensity: 'this mass would make a board of {density} kg/m³; between {low} and {high} was expected',
  massDensityFix: 'weigh the 100 x 100 mm square alone, in grams, and measure the thickness in millimetres',
  thickness: 'a sheet of {thickness} mm was not expected; between {low} and {high} mm was',
  thicknessFix: 'measure without pressing, in millimetres, and take the mean of the four sides',
  tooThick: 'a strip of {thickness} mm is too thick for {span} mm between the supports: that tells shear, not bending',
  tooThickFix: 'bend it over at least {need} mm and type that length',
  deflectionSmall: 'a deflection of {deflection} mm is too small to be read well; at least {least} mm was expected',
  deflectionSmallFix: 'load the strip more',
  deflectionLarge: 'a deflection of {deflection} mm is over a tenth of the {span} mm between the supports',
  deflectionLargeFix: 'load the strip less: the formula holds for small deflections only',
  load: 'a load of {load} g was not expected; between {low} and {high} g was',
  loadFix: 'type the load at the middle of the strip in grams, without the strip itself',
  stiffness: 'these readings give a modulus of {mpa} MPa; between {low} and {high} MPa was expected',
  stiffnessFix: 'check load, deflection and thickness: a strip {width} mm wide over {span} mm',
  slotNarrow: 'this slot is narrower than the board is thick ({thickness} mm)',
  slotNarrowFix: 'push without force and read the narrowest slot that the board slides into',
  slotWide: 'this slot is {more} mm wider than the board is thick, which holds nothing',
  slotWideFix: 'read the narrowest slot that the board slides into and is held by',
};

export const texts = {
  notPart,
  cgStand,
  throwGauge,
  incidence,
  dihedral,
  bevel,
  boomJig,
  coupon,
  problems,
} as const;
