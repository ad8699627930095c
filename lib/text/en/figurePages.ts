// Texts of the lists of figures, their charts and the page of figures.

/** Headings that the figures stand under. */
export const groups = {
  shape: 'Shape and areas',
  balance: 'Balance',
  stability: 'Stability and CG range',
  handling: 'Handling',
  trim: 'Trim',
  performance: 'Performance',
  controls: 'Controls and linkages',
  structure: 'Structure',
  other: 'From an earlier engine',
} as const;

export const list = {
  jump: 'Groups of figures',
  bad: '{count} bad',
  watch: '{count} to watch',
  allGood: 'all good',
  only: 'Only what needs a look',
  doesNotApply: 'not for this layout',
  nothing: 'Nothing is marked bad or to watch.',
} as const;

export const chart = {
  span: '{label}: {low} to {high} {unit}',
  drawn: 'Drawn: {names}.',
  marked: 'Marked: {names}.',
  markAt: '{label} at {x} {unit}',
  points: 'Points of “{title}”',
  line: 'Line',
  thinned: 'Every line is thinned to {most} points at most, its first and last among them.',
  none: 'No curve could be worked out.',
  key: 'Lines',
} as const;

export const page = {
  title: 'Figures of revision {number}',
  link: 'Figures',
  setUp: 'Set-up sheet',
  lead: 'Estimates, frozen when the revision was released. Open a row to see what it means, how it was worked out and when not to trust it.',
  noCharts: 'Curves: worked out by an earlier engine ({engine}), so not part of this revision.',
} as const;

/** Beside the words of lib/text/en/setUp.ts, which screen and paper share. */
export const setUp = {
  title: 'Set-up sheet of revision {number}',
  lead: '{design}. Starting values for the bench, worked out from the drawing: estimates until it has flown.',
  print: 'Print this sheet',
  estimates:
    'These figures are estimates. Check each move by eye before flight, fly under the local rules and the site’s rules, and have experienced help for a first flight.',
  ticks: 'Ticks are not kept: print the sheet, or stay on this page until you are done.',
  earlier: 'Worked out by an earlier engine ({engine}): a set-up sheet is not part of this revision.',
  failed: 'No set-up sheet could be worked out of this revision.',
  throwsOf: 'Throws, {title}',
  starboard: 'Starboard side; the directions below say what port does.',
  stick: 'Stick and way',
  low: 'Low rate',
  high: 'High rate',
  set: 'Set',
  setOf: 'Set: {row}',
  row: '{stick}, {way}',
  ways: { up: 'up', down: 'down', stbd: 'to starboard', port: 'to port', none: 'stays' },
  oneRate: 'one rate',
} as const;
