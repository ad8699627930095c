// Every text of the pages, by subject. Plain, short, in the trade's words. {names} are filled by lib/text/fill.ts.

export const shell = {
  product: 'Foldspar',
  wordmark: 'foldspar',
  titleTemplate: '%s · Foldspar',
  description: 'Design, check, print and review radio-controlled aircraft made of flat foam sheet.',
  skip: 'Skip to the content',
  account: 'Account',
  workshops: 'Workshops',
  signIn: 'Sign in',
  signUp: 'Sign up',
  breadcrumb: 'You are here',
  main: 'Main',
} as const;

export const ui = {
  close: 'Close',
  cancel: 'Cancel',
  unreachable: 'No answer from the server. Check the connection and try again; nothing was changed.',
  working: 'Working…',
  required: 'Fill this in.',
} as const;

/** States and verdicts in a word or two. */
export const words = {
  good: 'good',
  watch: 'watch',
  bad: 'bad',
  draft: 'draft',
  released: 'released',
  goodToCut: 'good to cut',
  held: 'on hold',
  hold: 'hold, change first',
  seen: 'seen',
  open: 'open',
  closed: 'closed',
} as const;

export const roles = {
  owner: { name: 'Owner', what: 'Runs the workshop: members, invitations, roles.' },
  designer: { name: 'Designer', what: 'Changes designs and releases revisions.' },
  builder: { name: 'Builder', what: 'Prints plans, cuts and builds.' },
  reviewer: { name: 'Reviewer', what: 'Comments and gives the verdict before foam is cut.' },
} as const;

export const front = {
  title: 'Draw the aircraft. Know it balances. Print its parts.',
  lead: 'Foldspar is for radio-controlled aircraft made of flat foam sheet. Drag a wing and see at once where it balances, how steady it is and how it answers its controls.',
  steps: [
    'Shape one airframe by hand or by number; area, neutral point and CG range follow.',
    'Release a revision with its reason. A reviewer pins comments to it and says “good to cut” or “hold”.',
    'Print its flat parts on an ordinary printer, true to scale, tile by tile.',
  ],
  tryBoard: 'Try the board',
  tryHint: 'No account needed. Nothing is stored until you sign up.',
  drawing: 'Plan view of {name}, nose to the left',
  drawn: '{name}: one of the layouts to start from, with its own figures',
  caution:
    'Figures are estimates. Fly under the local rules and the site’s rules, and with experienced help for a first flight.',
  figures: 'Figures of {name}',
  rule: 'Balance rule: where it balances, from the wing’s leading edge on the centre line',
} as const;

export const auth = {
  signInTitle: 'Sign in',
  signIn: 'Sign in',
  signUpTitle: 'Sign up',
  signUp: 'Make the account',
  email: 'Email',
  name: 'Your name',
  nameHint: 'Members of your workshops see it beside what you do.',
  password: 'Password',
  newPassword: 'New password',
  passwordHint: 'At least {min} characters. A short sentence is easy to keep.',
  forgotLink: 'Forgot the password?',
  noAccount: 'No account yet?',
  haveAccount: 'Already have an account?',
  wrong: 'Email and password do not match. Check both.',
  notConfirmed: 'The address is not confirmed yet. Open the link in the mail that went out when you signed up.',
  tooMany: 'Too many tries from here. Wait a minute, then try again.',
  nameBad: 'A name is at most 80 characters on one line.',
  notAnAddress: 'Write an address such as name@example.org.',
  short: 'Use at least {min} characters.',
  long: 'Use at most {max} characters.',
  failed: 'That did not work. Try again in a moment.',
  forgotTitle: 'Forgot the password',
  forgotLead: 'Give the address of the account. If there is one, a mail with a link to set a new password goes out.',
  forgot: 'Send the link',
  forgotSent: 'If there is an account with this address, the mail is on its way. The link holds for an hour.',
  resetTitle: 'Set a new password',
  reset: 'Set the password',
  resetBad: 'This link has been used or is too old. Ask for a new one.',
  resetDone: 'The new password is set. Sign in with it.',
  verifyTitle: 'Look in your mail',
  verifyLead:
    'A mail with a link went to the address you gave. Open the link to confirm the address; then you can sign in.',
  verifyNothing:
    'Nothing there after a few minutes? Look among the unwanted mail, or sign up again with the address spelled right.',
  outbox: 'This server sends no mail; every mail lies in the outbox.',
  openOutbox: 'Open the outbox',
} as const;

export const outbox = {
  title: 'Outbox',
  lead: 'No mail server is set up, so mails stay here. Only this computer can see the page.',
  empty: 'No mail yet. Sign up, or invite somebody.',
  to: 'To',
} as const;

export const account = {
  title: 'Account',
  name: 'Your name',
  save: 'Save the name',
  saved: 'Saved.',
  signedInAs: 'Signed in as {email}',
  signOut: 'Sign out',
  sessions: 'Signed in on',
  sessionsLead: 'Every browser that is signed in to this account.',
  thisOne: 'this browser',
  unknownAgent: 'a browser that does not say its name',
  since: 'since',
  endOthers: 'Sign out everywhere else',
  look: 'Light or dark',
  lookDevice: 'As the device says',
  lookLight: 'Light',
  lookDark: 'Dark',
  lookSave: 'Use it',
} as const;

export const workshops = {
  title: 'Your workshops',
  lead: 'A workshop is the team that shares designs.',
  empty: 'You are in no workshop yet. Start one, or open the link of an invitation.',
  emptyTry: 'Or try the board first; nothing is stored.',
  create: 'Start a workshop',
  name: 'Name',
  nameHint: 'What the team calls itself.',
  made: 'Start it',
  yours: 'You are {roles}',
} as const;

export const designs = {
  title: 'Designs',
  empty: 'No designs yet.',
  emptyDesigner: 'Start from a layout; it flies by its own figures and everything can be changed.',
  emptyOther: 'A designer of this workshop starts the first one.',
  board: 'Open the board',
  look: 'Look at the draft',
  review: 'Review {number}',
  print: 'Print {number}',
  printDraft: 'Print the draft',
  revisions: 'Revisions',
  noRevision: 'no revision yet',
  revision: 'Revision {number}',
  span: 'Span',
  mass: 'Mass',
  massUnknown: 'not known',
  changed: 'Changed',
  members: 'Members',
  picture: 'Plan view of {name}',
  newDesign: 'New design',
  layout: 'Start from',
  name: 'Name of the design',
  nameHint: 'A name of your own; it stands on every printed page.',
  make: 'Start the design',
} as const;

export const members = {
  title: 'Members',
  name: 'Name',
  email: 'Email',
  roles: 'Roles',
  acts: 'Change',
  you: 'you',
  setRoles: 'Set roles',
  setRolesOf: 'Set roles of {name}',
  save: 'Save the roles',
  remove: 'Remove',
  removeTitle: 'Remove {name}?',
  removeBody: '{name} loses access to this workshop at once. Comments and verdicts stay.',
  removeYes: 'Remove {name}',
  ownerOnly: 'Only an owner changes members and invitations.',
  invite: 'Invite somebody',
  inviteEmail: 'Email of the person',
  inviteHint: 'A link goes to this address. It holds until the date beside it.',
  inviteSend: 'Send the invitation',
  invited: 'The invitation to {email} is sent.',
  invitations: 'Open invitations',
  noInvitations: 'No open invitations.',
  until: 'Holds until',
  by: 'Invited by',
  revoke: 'Take back',
  revokeTitle: 'Take back the invitation to {email}?',
  revokeBody: 'The link in the mail stops working.',
  pickRole: 'Pick at least one role.',
} as const;

export const invite = {
  title: 'Invitation',
  lead: 'You are invited to a workshop. The roles stand in the mail; an owner can change them later.',
  signedOut:
    'Sign in with the address the invitation went to, or make an account with it. This page comes back afterwards.',
  as: 'You are signed in as {email}.',
  accept: 'Join the workshop',
  other: 'Another address? Sign out and come back with the link.',
} as const;

export const release = {
  title: 'Release a revision',
  lead: 'A revision is frozen and numbered. Its parts, layout and figures stay as they are, so that a tile printed next year still meets its neighbours.',
  notYours: 'Only a designer releases a revision.',
  version: 'Draft version {version}, saved by {by}',
  reason: 'Reason for the change',
  reasonHint: 'What was wrong or wanted. Reviewers read this first.',
  effect: 'Effect expected',
  effectHint: 'What should be different in the air or on the bench, so that it can be checked.',
  submit: 'Release revision {number}',
  deciding: 'Figures that decide',
  changes: 'Changed since revision {number}',
  firstChanges: 'First revision: nothing to compare with.',
  noChanges: 'Nothing changed since revision {number}.',
  more: '{count} more changes',
  was: 'Revision {number}',
  now: 'Draft',
  what: 'What',
  reload: 'Load the newest draft',
  problems: 'Not everything could be worked out:',
} as const;

export const revisions = {
  title: 'Revisions',
  empty: 'No revision yet. The draft can be printed; it says “draft” on every page.',
  number: 'Number',
  state: 'State',
  reason: 'Reason',
  effect: 'Effect expected',
  by: 'Released',
  comments: 'Open comments',
  acts: 'Go to',
  review: 'Review {number}',
  print: 'Print {number}',
  release: 'Release a revision',
} as const;

export const print = {
  title: 'Print',
  titleRevision: 'Print revision {number}',
  titleDraft: 'Print the draft',
  draft:
    'This is the draft. Every page says “draft”, and a later print may not match its neighbours. Release a revision before you cut for good.',
  held: 'A reviewer holds this revision: something has to change before foam is cut.',
  notYours: 'Builders and designers print a draft. A released revision can be printed by every member.',
  paper: 'Paper in the printer',
  what: 'What comes out',
  whatList: [
    "a first page with the builder's card, legend, cautions and bars to check the scale",
    'a page that says how it is joined, with the map of tiles, and the set-up sheet of the controls',
    'every sheet with its parts, cut into tiles named by row and column',
    'a 50 mm bar in both directions on every page',
  ],
  how: 'Before you print',
  howList: [
    'Set the printer to 100 % or “actual size”; turn off “fit to page”.',
    'Print the first page, measure its bars, then print the rest.',
    'Trim one edge of each pair, join rows first, then rows to each other.',
  ],
  cut: 'Before you cut',
  cutList: [
    'Cut away from the hand that holds; change blades before they drag.',
    'Hot wire and hot glue burn and fume: air the room.',
    'Never laser-cut vinyl foam (chlorine), never leave a laser alone with polystyrene.',
    'Carbon dust and splinters: mask, and wet-sand.',
    'Solvent glue, sprays and resins can dissolve polystyrene: try a scrap first.',
  ],
  download: 'Download the plan (PDF)',
  manifest: 'Manifest (JSON)',
  exportFile: 'Airframe file',
  counting: 'Counting pages…',
  pages: '{count} pages on {paper}',
  noPages: 'The plan could not be laid out: {why}',
  estimate: 'Figures are estimates. Weigh and measure what you build.',
} as const;

export const errors = {
  notFoundTitle: 'Nothing here',
  notFoundLead: 'The address is wrong, the thing was removed, or it belongs to a workshop you are not in.',
  home: 'Go to the first page',
  toWorkshops: 'Go to your workshops',
  errorTitle: 'Something broke',
  errorLead: 'The page could not be shown. What was saved is safe.',
  retry: 'Try again',
  reference: 'Reference for whoever runs this server: {digest}',
} as const;
