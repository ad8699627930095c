// Texts of the review: the drawing, pins and threads, verdicts, figures and parts.

export const review = {
  title: 'Revision {number}',
  print: 'Print',
  revisions: 'All revisions',
  reason: 'Reason',
  effect: 'Effect expected',
  released: 'Released by {name}',
  frozen: 'This revision is frozen. Comments and verdicts are added to it; nothing in it changes.',
  offline: 'No answer from the server. What you see may be old; it catches up by itself.',
} as const;

export const sheet = {
  title: 'Plan view',
  drawing: 'Plan view of {name}, nose to the left',
  place: 'Pin a comment to a place on the plan',
  hint: 'Click the drawing to pin a comment to that place, or choose what it is about from the list.',
  rule: 'Balance rule, mm from the wing’s leading edge on the centre line',
  mac: 'MAC',
  np: 'NP',
  cg: 'CG',
  range: 'CG range',
} as const;

export const threads = {
  title: 'Comments',
  none: 'No comments yet.',
  openCount: '{open} open, {closed} closed',
  about: 'What is it about?',
  aboutNone: 'Choose…',
  groupElements: 'On the aircraft',
  groupParts: 'Parts',
  groupFigures: 'Figures',
  new: 'New comment: {place}',
  text: 'Comment',
  pin: 'Pin the comment',
  answer: 'Answer',
  send: 'Send the answer',
  close: 'Close',
  closeOf: 'Close comment {number}',
  reopen: 'Open again',
  reopenOf: 'Open again: comment {number}',
  closedBy: 'Closed by {name}',
  pinLabel: 'Comment {number}, {state}: {place}',
  number: 'Comment {number}',
  emptyText: 'Write what you see, or what should change.',
  atPlace: '{element}, {x} mm {along}, {y} mm to {side}',
  atBare: '{x} mm {along}, {y} mm to {side}',
  aft: 'aft',
  ahead: 'ahead',
  starboard: 'starboard',
  port: 'port',
  onPart: 'part: {part}',
  onFigure: 'figure: {figure}',
  onSheet: 'sheet: {key}',
  onRule: 'rule: {key}',
  whole: 'the whole revision',
} as const;

export const verdicts = {
  title: 'Verdict',
  none: 'No verdict yet.',
  give: 'Give your verdict',
  legend: 'Before foam is cut',
  goodToCut: { label: 'Good to cut', hint: 'Nothing stands in the way.' },
  hold: { label: 'Hold, change first', hint: 'Say below what has to change.' },
  seen: { label: 'Seen', hint: 'Read, without a verdict on cutting.' },
  note: 'Note',
  noteHold: 'What has to change first',
  submit: 'Give the verdict',
  given: 'Your verdict is given.',
  own: 'does not count: own release',
  ownWarning: 'You released this revision, so your own verdict is kept but does not count.',
  reviewersOnly: 'Reviewers give the verdict.',
} as const;

export const figuresText = {
  title: 'Figures',
  lead: 'Estimates. Open a row to see what it means, how it was worked out and when not to trust it.',
  band: 'Expected within',
  bandOf: '{low} to {high}',
  because: 'because {cause}',
  means: 'What it means',
  method: 'How it was worked out',
  source: 'Source',
  limits: 'When not to trust it',
  inputs: 'What went in',
  notWorkedOut: 'not worked out',
  comment: 'Comment on {name}',
} as const;

export const partsText = {
  title: 'Parts',
  part: 'Part',
  sheet: 'Cut from',
  thickness: 'Thickness',
  size: 'Size',
  side: 'Side',
  stbd: 'starboard',
  centre: 'centre',
  port: 'port',
  stock: 'Tubes, rods and strips',
  tube: 'Stock',
  about: 'Comment',
  length: 'Length',
  count: 'Pieces',
  comment: 'Comment on {name}',
  none: 'This revision holds no list of parts.',
} as const;

/** A control by the surface that carries it. */
export const controlOn = '{what} of the {parent}';
