// Mails, plain text. {placeholders} are filled by server/mail.
// The first one goes to whatever address somebody typed, so it says nothing in that person's own words.

export const texts = {
  verify: {
    subject: 'Confirm your mail address for Foldspar',
    text: `Hello,

open this link to confirm that this mail address is yours:

{url}

The link works for one hour. If you did not sign up, do nothing: without it the account stays closed.
`,
  },
  reset: {
    subject: 'Choose a new password for Foldspar',
    text: `Hello {name},

open this link to choose a new password:

{url}

The link works once, for one hour. If you did not ask for it, do nothing: your password stays as it is.
`,
  },
  alreadyRegistered: {
    subject: 'You have a Foldspar account already',
    text: `Hello {name},

somebody, perhaps you, tried to sign up with this mail address, which has an account already. Sign in here, or choose a new password there:

{url}

If it was not you, do nothing.
`,
  },
  invitation: {
    subject: '{inviter} invites you to {workshop}',
    text: `Hello,

{inviter} invites you to the workshop "{workshop}" on Foldspar as {roles}.

Open this link and sign in, or sign up, with this mail address:

{url}

The link works until {expires}.
`,
  },
} as const;
