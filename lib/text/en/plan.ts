// What stands on paper: title blocks, legend, cautions, check bars, and what a plan refuses.

const page = {
  draft: 'DRAFT',
  draftLong: 'DRAFT: not released, may change',
  released: 'not yet approved',
  goodToCut: 'good to cut',
  held: 'ON HOLD: do not cut',
  revision: 'revision {number} · {date} · {state}',
  tile: '{sheet} · row {row} · column {column}',
  ofPages: 'page {page} of {pages}',
  bar: '50 mm',
  trim: 'trim',
  joinLeft: 'p. {page}',
  plan: 'Plan of {design}',
  cover: 'builder’s card',
  map: 'map',
  notes: 'scale, joining, key',
} as const;

const sheet = {
  name: 'Sheet {number}',
  material: '{material}, {thickness} mm',
  materialWithId: '{name} ({id})',
  check: '100 mm',
  noCheck: 'no room for the 100 mm test square on this sheet',
  bevelAngle: 'bevel {angle}°',
  foldUp: 'fold {angle}° towards you',
  foldDown: 'fold {angle}° away from you',
  onFace: 'on the {face} face',
  front: 'front',
  top: 'top',
  keyMark: 'K{number}',
  keyNote: '{part}: {note}',
  face: '{face} face up',
} as const;

const faces = { upper: 'upper', lower: 'lower', inner: 'inner', outer: 'outer' } as const;

const tubes = {
  tube: '{outer}/{inner} mm tube',
  rod: '{outer} mm rod',
  strip: '{w} × {h} mm strip',
  foamBox: '{w} × {h} mm box of foam',
} as const;

/** What to gather and how to set the aircraft up, on the first page. */
const build = {
  need: 'You need',
  counted: '{count} × {what}',
  sheet: '{material}, {thickness} mm, {w} × {h} mm',
  tube: '{kind}, {length} mm: {name} ({id})',
  noTube: 'no tube and no rod',
  setUp: 'Set-up: starting values, trim in flight',
  alsoSet: 'Also to set',
  control: '{surface}, {control}',
  throws: '{control}: up {up}° ({upLow}°), down {down}° ({downLow}°)',
  rates: 'Throws at full rate, at low rate in brackets.',
  setUpMissing: 'The figures of this revision hold no set-up sheet: no throws in millimetres, no linkages.',
  neutralUp: '{control}: neutral {angle}° up',
  neutralDown: '{control}: neutral {angle}° down',
  neutral: '{control}: neutral {move}',
  neutralLevel: 'Neutral: every control in line with the surface ahead of it.',
  pack: '{pack}: drawn with its middle {mm} mm {way} the first-flight CG (estimate)',
  packSlides: 'It slides {fore} mm forward and {aft} mm aft of there.',
  packMove: 'Pack, to bring the CG there: {words}.',
  ahead: 'ahead of',
  behind: 'behind',
  moreThere: 'and {count} more, all on page "{page}"',
  moreThrows: 'and {count} more, all on the set-up sheet',
} as const;

/** The table of throws on the first page. */
const throws = {
  title: 'Throws: starting values, trim in flight',
  low: 'Low rate: first flight',
  high: 'High rate',
  oneRate: 'one rate',
  within: ', {control}',
  withStick: ', {control} · {stick}',
  move: '{way} {mm} mm ({deg}°)',
  ways: { up: 'up', down: 'down', stbd: 'starboard', port: 'port', none: 'stays' },
  how: 'Millimetres with a rule at the trailing edge, straight from neutral, at the widest chord; of a pair, the starboard side.',
} as const;

const cover = {
  printTitle: 'Print at 100 %, no fit to page',
  printWords:
    'Measure these bars on the print before cutting. If one is off, the driver is resizing: turn off "fit to page" and print this page again.',
  cardTitle: 'No rule at hand?',
  card: 'A bank card (ISO/IEC 7810 ID-1, 85.60 × 53.98 mm) covers this outline exactly.',
  bar100: '100 mm',
  bar4in: '4 in (101.6 mm)',
  mass: 'All-up mass',
  counted: 'counted: {list}',
  countedItem: '{name} {value} {unit}',
  cgTitle: 'First-flight CG: mark it on both panels, check it with everything on board',
  bodySide: 'At the body side',
  centre: 'On the centre line',
  aftOfEdge: 'aft of the leading edge',
  out: '{y} mm from the centre line',
  station: 'Where to lift it',
  fromNose: 'From the nose',
  fromNoseWhere: 'aft of {nose}',
  noses: {
    body: 'the front end of the body',
    boom: 'the front end of a boom',
    drive: 'the motor’s or propeller’s foremost point',
    surface: 'the foremost leading edge',
    plain: 'the foremost point',
  },
  range: 'range {low} to {high} {unit}',
  margin: 'Static margin',
  marginUnit: '% MAC',
  marginDrawn: 'with the CG as drawn, at the first-flight CG',
  marginBehind: 'with the CG as drawn, {mm} mm behind the first-flight CG',
  marginAhead: 'with the CG as drawn, {mm} mm ahead of the first-flight CG',
  stall: 'Stall speed',
  massUnit: 'g',
  lengthUnit: 'mm',
  speedUnit: 'm/s',
  estimate: 'estimate',
  band: '{low} to {high}',
  notKnown: 'not worked out',
  map: 'Sheets and pages',
  mapSheet: '{name} · {material}',
  legend: 'Lines on the parts',
  notDrawn: 'Not on these sheets',
  joining: 'Joining',
  joiningWords: [
    'Pages overlap by {overlap} mm. Of each pair trim one page only: its left or its lower edge, at the "trim" ticks, which run through the middle of the overlap.',
    'Lay the trimmed edge over its neighbour so that the two halves of each mark with the same letter meet. "p. 5" beside an edge is the page that joins there.',
    'Rows first, left to right. Then row to row, from the top. Glue stick or low-tack spray: wet paper grows.',
    'Glue the joined sheet to the foam, or pin through its corners. Every part lies with the named face up: never turn the paper over.',
  ],
  checks: 'Measure after joining: within 1 mm is good',
  checkPart: '{sheet}: {part}, between its farthest corners, should read {mm} mm',
  checkMarks: '{sheet}: from mark {a} to mark {b} should read {mm} mm',
  checkNoSquare: '{sheet}: no room for the 100 mm test square; measure the 50 mm bars of its pages',
  key: 'Key: what had no room on its part',
  keyMarked: '{sheet}: {mark} = {text}',
  keyBare: '{sheet}: {text}',
  cautions: 'Before you cut',
} as const;

const cautions = [
  'Figures are estimates. Weigh and measure what you build. Fly under local rules and with experienced help.',
  'Blades: cut away from the hand, a new blade for each sheet.',
  'Foam dust, sprays and solvent glue: air the room; try a scrap first, some dissolve foam.',
  'Hot wire and hot glue burn and fume. Never laser-cut vinyl foam.',
  'Propeller or fan: off for every set-up; hands clear of its disc; never launch with fingers behind it.',
  'Lithium packs: charge attended on something that does not burn; plug in last.',
] as const;

/** One line of the legend each; what the line asks for, in our own words. */
const lines = {
  cut: 'cut through',
  cutToPaper: 'cut to the far paper, leave it whole',
  crease: 'crease, do not cut',
  bevel: 'edge of a bevel',
  paperOff: 'paper off inside this line',
  foamOut: 'foam out: as deep as noted, else to the far paper',
  glue: 'glue here',
  tape: 'tape here',
  reference: 'place line, do not cut',
  register: 'pin through to the other face',
  sheetEdge: 'edge of the sheet',
  check: '100 mm test square, in the waste',
} as const;

const problems = {
  tooLarge: 'part "{part}" ({w} × {h} mm) is larger than every sheet of its material inside the margins',
  tooLargeFix: 'list a larger sheet, shorten the part, or split it',
  noStock: 'part "{part}" needs a sheet of material "{material}", and none of that thickness is listed',
  noStockFix: 'list a sheet size for this material',
  noRoom: 'part "{part}" has no room left on {sheets} sheets',
  noRoomFix: 'add sheets of this material',
  noParts: 'there is nothing to print: the airframe gave no parts',
  paperTooSmall:
    'paper {paper} ({w} × {h} mm) leaves {left} mm to draw in after margins and overlap; at least {min} mm is needed',
  paperTooSmallFix: 'choose a larger paper or a smaller overlap',
  badOverlap: 'the overlap must be {min} to {max} mm, got {got}',
  tooManyPages: 'this plan would take {pages} pages; at most {max} are written',
  tooManyPagesFix: 'choose a larger paper',
  unknownPaper: 'unknown paper "{paper}"; known: {known}',
  tooManyParts: '{count} parts are too many to lay out; at most {most} are laid',
  tooManyPartsFix: 'split the airframe into several documents, or merge small parts',
  tooManySheets: 'the parts need more than {most} sheets',
  tooManySheetsFix: 'list larger sheets, or split the airframe into several documents',
  strangeLayout: 'the layout places part "{part}", which is not among the parts',
} as const;

/** What is wrong with a file that is to be printed. */
const file = {
  neither: 'expected an airframe ("format": "{format}") or an export with an "airframe" in it',
  unknownKey: 'unknown key "{key}"; an export holds {known}',
  badField: '"{path}": {detail}',
} as const;

/** What the command line says. */
const cli = {
  usageFigures: 'usage: figures FILE.json [--without bodies,propellers]',
  usageSheets: 'usage: npm run --silent sheets -- FILE.json --paper {papers} --out DIR [--aids]',
  usage: 'usage: figures FILE.json | sheets FILE.json --paper PAPER --out DIR | job',
  noFile: 'cannot read {file}: {detail}',
  noDirectory: 'cannot write to {directory}: {detail}',
  unknownOption: 'unknown option "{option}"',
  optionWithoutValue: 'the option "{option}" needs a value',
  missingOption: 'the option "{option}" is missing',
  warning: 'not on the sheets: {message}',
  tooLarge: 'the file is over {max} MB',
  badJson: 'this is not valid JSON: {detail}',
  badJob: 'expected a job of kind "freeze" or "plan", got {got}',
} as const;

export const plan = {
  page,
  sheet,
  faces,
  tubes,
  build,
  throws,
  cover,
  cautions,
  lines,
  problems,
  file,
  cli,
} as const;
