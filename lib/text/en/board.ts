// Texts of the building board: sheet, handles, slip, rule, figures, saving.

export const board = { title: 'Building board' } as const;

export const sheet = {
  region: 'Drafting sheet',
  plan: 'plan',
  side: 'side',
  front: 'from behind',
  mac: 'MAC',
  cg: 'CG',
  np: 'NP',
  range: 'range',
  ruleUnits: { metric: 'balance rule, mm', imperial: 'balance rule, in' },
  loading: 'Laying out the board…',
  fit: 'Fit to sheet',
  zoomIn: 'Closer',
  zoomOut: 'Further away',
  handles: 'Handles of {name}',
  masses: 'Masses on the balance rule',
  massOnRule: '{name}, {mass}, place along the aircraft',
} as const;

export const rule = {
  title: 'Balance rule',
  whole:
    'Measured aft from the wing’s leading edge on the centre line. MAC {mac} from {macLe}. CG range {range}. CG {cg}. Neutral point {np}.',
  between: '{fore} to {aft}',
  unknown: 'not worked out',
} as const;

export const strip = { title: 'Parts of the airframe' } as const;

export const slip = {
  title: 'Numbers of {name}',
  none: 'Nothing of this part can be changed on the board yet.',
  range: '{min} to {max}',
  notNumber: 'That is no number; write one such as {example}.',
  kept: '{reason} It stays at {value}.',
  readOnly: 'You can look at this draft; a designer of the workshop changes it.',
} as const;

export const figures = {
  title: 'Figures that decide',
  remarks: 'Remarks on this airframe',
  remarkCount: 'Remarks: {count}',
  working: 'working it out…',
  atRest: 'worked out when you let go',
  failed: 'Figures could not be worked out: {message}',
  none: 'not worked out',
  open: '{name}: what it means and how it was worked out',
  bandShort: '({low} to {high})',
  estimate: 'Figures are estimates. Weigh and measure what you build.',
  within: '{fore} inside the fore limit, {aft} inside the aft',
  more: 'All figures',
  counts: 'Counted beside the lifting surfaces',
  countBodies: 'bodies',
  countPropellers: 'propellers and fans',
  countNote: 'For comparing here. A release counts everything.',
  field: '{message} ({path})',
} as const;

export const header = {
  back: 'Designs',
  draft: 'Draft',
  noRevision: 'no revision yet',
  latest: 'last released: revision {number}, {state}',
  states: { released: 'waiting for a verdict', goodToCut: 'good to cut', held: 'on hold' },
  undo: 'Undo',
  redo: 'Redo',
  keys: 'Keys',
  metric: 'mm, g',
  imperial: 'in, oz',
  units: 'Units: {system}. Switch to {other}.',
  release: 'Release a revision',
  print: 'Print',
  review: 'Review',
  revisions: 'Revisions',
  download: 'Airframe file',
  readOnly: 'Read only',
} as const;

export const save = {
  off: 'Not saved on a server',
  saved: 'Saved',
  waiting: 'Changes not saved yet',
  saving: 'Saving…',
  offline: 'No answer from the server. Kept in this browser and sent when it answers.',
  offlineShort: 'Offline, kept here',
  retry: 'Try now',
  signedOut: 'You are signed out. Your changes are kept in this browser; sign in again and they are sent.',
  signedOutShort: 'Signed out, kept here',
  signIn: 'Sign in',
  refusedShort: 'Not saved',
  refused: 'The server did not take this draft: {title}',
  stale: '{by} saved a newer draft while you were working. Yours is not saved, and nothing of it is lost.',
  staleShort: 'A newer draft exists',
  takeTheirs: 'Go on from the newer draft',
  takeTheirsHint: 'Undo brings yours back.',
  downloadMine: 'Download mine',
  newer: '{by} saved a newer draft; the board shows it. Undo brings the former one back.',
  restored: 'Changes that had not reached the server were found in this browser and are here again.',
  keptUnreadable: 'Changes kept in this browser could not be read and were left alone: {message}',
  noRoom:
    'This browser has no room to keep changes that the server has not got. Stay on the page until it says “Saved”.',
  dismiss: 'Close the message',
} as const;

export const keys = {
  title: 'Keys',
  rows: [
    ['Tab', 'next handle or number'],
    ['Arrow keys', 'move the handle by one step'],
    ['Shift + arrow', 'ten steps'],
    ['Alt + arrow', 'a tenth of a step'],
    ['Home, End', 'smallest and largest value'],
    ['Esc', 'give up the drag'],
    ['Alt while dragging', 'tenths instead of whole steps'],
    ['Ctrl or Cmd + Z', 'undo'],
    ['Ctrl or Cmd + Shift + Z', 'redo'],
    ['?', 'this list'],
  ],
} as const;

export const tryOut = {
  title: 'Try the board',
  lead: 'Nothing is stored on the server. Your aircraft stays in this browser until you sign up.',
  choose: 'Start from',
  home: 'Foldspar',
  goOn: 'Go on with {name}',
  goOnHint: 'Kept in this browser from your last visit.',
  again: 'Start from another layout',
  signUp: 'Sign up to keep it',
  kept: 'Kept in this browser only',
  unreadable: 'What this browser kept from the last visit cannot be read: {message}',
  bring: 'Bring the aircraft you tried',
  bringHint: '“{name}” was drawn in this browser without an account. It becomes a design of this workshop.',
  bringYes: 'Bring it here',
  bringFailed: 'It could not be brought: {message}',
} as const;
