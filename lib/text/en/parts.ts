// What is written on parts, and what the development of an airframe into parts says to a person.

const names = {
  sheetSide: '{surface}, {side}',
  sheetPanelSide: '{surface} {panel}, {side}',
  sheet: '{surface}',
  sheetPanel: '{surface} {panel}',
  controlSide: '{surface}, {control}, {side}',
  control: '{surface}, {control}',
  spar: '{surface}, spar',
  sparOf: '{surface}, spar {number}',
  bodySide: '{body}, side, {side}',
  bodyTop: '{body}, top',
  bodyBottom: '{body}, bottom',
  bodyPlate: '{body}, plate',
  former: '{body}, former {id}',
  firewall: '{body}, firewall',
  firewallOf: '{body}, firewall {number}',
  doublerSide: '{body}, doubler {id}, {side}',
  doubler: '{body}, doubler {id}',
  body: 'Body',
};

const sides = { stbd: 'starboard', port: 'port', centre: 'centre' };
const faces = { upper: 'upper', lower: 'lower', inner: 'inner', outer: 'outer' };

const notes = {
  dihedralJoint: 'glue: both edges bevelled, block up the panel while it sets',
  buttJoint: 'glue; tape across the joint on both faces, or lay a doubler over it',
  paperHinge: 'paper hinge: varnish or tape the paper, damp softens it',
  flexGroove: 'groove: leave half of the foam',
  tapeHinge: 'tape hinge',
  pinnedHinge: 'pin hinges along this line',
  slit: 'cut through',
  pivot: 'turns about this line',
  channel: 'channel {width} wide, {depth} deep',
  boomAxis: 'middle of {boom}',
  boomSaddle: 'glue on saddles',
  boomThrough: 'slot {width} wide, through the sheet',
  foldGroove: 'groove both sides of the fold',
  hatch: 'keep this piece: it is the hatch',
  motorTilt: 'tilted {down} down, {right} right',
};

const words = { wide: 'wide', high: 'high' };

const marks = {
  count: '{index} of {of}, mirrored',
  turnOver: 'worked from both faces: pin through, turn over',
  grain: 'grain',
};

const notBuilt = {
  sectionKind: 'only flat and folded sheet can be turned into parts so far, not a "{kind}" section',
  washout: 'sheet cannot be cut for a twist so far; set it to 0',
  tipOutline: 'a tip drawn point by point',
  jointKind: 'a "{joint}" at a joint; the panels are bevelled and glued without it',
  ribs: 'ribs on a flat sheet',
  sparLet: 'a flat sheet takes a tube let into a face or through, nothing else so far',
  allMovingPart: 'a surface that turns over part of its length only',
  allMovingRoll: 'two halves that turn apart at the centre line',
  corner: 'rounded corners of a body; its corners are drawn square',
  profileFormers: 'formers across a flat plate',
  profileDoublers: 'doublers on a flat plate',
  saddleOpening: 'a saddle as wide as the body',
};

const problems = {
  chordStep: 'this panel begins with a chord of {here} mm, but the panel before it ends with {before} mm',
  chordStepFix: 'give both the same chord where they meet',
  unknownMaterial: 'there is no material "{id}"',
  controlAcrossJoint: 'this control crosses the joint between two pieces of sheet, where it would be cut in two',
  controlAcrossJointFix: 'end it at share {station}, or make two controls',
  controlOffSheet: 'this control does not end on the trailing edge',
  jointTooSharp: 'the panels meet at so sharp an angle that the bevels would be flatter than a blade can cut',
  jointTooSharpFix: 'reduce the angle between the panels, or set them apart',
  tipDoesNotFit: 'the tip is too short for this shape; it is left square',
  paperHingeNeedsPaper: 'a paper hinge needs a paper-faced board; this sheet has no paper',
  paperHingeNeedsPaperFix: 'choose tape, pins or, in EPP, a flexing hinge',
  bevelTooSmall: 'the bevel on the {face} face is {has} degrees; it needs the throw towards it and 10 more: {need}',
  bevelTooSmallFix: 'set it to at least {need} degrees or reduce the throw',
  partCannotBeCut: '"{part}" cannot be cut from a sheet as it is drawn ({fault}); it is left out',
  partCannotBeCutFix: 'look for edges that cross, ends that meet in a point, or sizes near zero here',
  openingTooSmall: 'this opening is smaller than a blade can cut',
  openingPartsSheet: 'this cutout would part the sheet in two',
  sparTooHigh: 'the tube is {tube} mm high, the sheet only {sheet} mm thick',
  sparTooHighFix: 'choose a thinner tube or a thicker sheet, or let it through the sheet',
  sparOffSheet: 'this spar leaves the sheet or runs through a control',
  sparAcrossJoint: 'this spar crosses a joint, where a straight tube cannot follow',
  tubeTooShort: 'this needs {length} mm of tube, and it is sold in lengths of {stock} mm',
  tubeTooShortFix: 'choose a tube sold in a greater length, or end it earlier',
  bodyTooNarrow: 'here the body is {size} mm {which}, less than its two sheets of {sheet} mm',
  bodyTooNarrowFix: 'make it at least {need} mm {which}',
  stationsNotRising: 'stations must follow each other from nose to tail',
  formerOutsideBody: 'this former lies outside the body, which runs from {from} to {to} mm',
  doublerOutsideBody: 'this doubler leaves the body, which runs from {from} to {to} mm, or ends before it begins',
  openingOffFace: 'this opening leaves the face it is cut in',
  openingOffFaceFix:
    'keep it inside {from} to {to} mm and, between the sheets beside this face, at most {widest} mm wide',
  plateCrosses: 'the outline crosses itself',
};

export const texts = { names, sides, faces, notes, marks, notBuilt, problems, words };
