// Who may do what. The server enforces this table; the pages read it only to leave out what would be refused.

export const ROLES = ['owner', 'designer', 'builder', 'reviewer'] as const;
/** A membership holds a set of these; rights are their union. */
export type Role = (typeof ROLES)[number];

const everyone = ROLES;

/** Acts inside a workshop, and the roles that may do each. */
export const MAY = {
  'workshop.read': everyone,
  'workshop.rename': ['owner'],
  'member.list': everyone,
  'member.setRoles': ['owner'],
  'member.remove': ['owner'],
  'invitation.list': ['owner'],
  'invitation.create': ['owner'],
  'invitation.revoke': ['owner'],
  'design.list': everyone,
  'design.read': everyone,
  'design.create': ['designer'],
  'design.rename': ['designer'],
  'design.archive': ['owner', 'designer'],
  'draft.read': everyone,
  'draft.save': ['designer'],
  'draft.print': ['designer', 'builder'],
  'revision.list': everyone,
  'revision.read': everyone,
  'revision.release': ['designer'],
  'revision.print': everyone,
  'revision.export': everyone,
  'thread.list': everyone,
  'thread.create': everyone,
  'comment.create': everyone,
  'thread.close': ['designer', 'reviewer'],
  'thread.reopen': ['designer', 'reviewer'],
  'verdict.list': everyone,
  'verdict.give': ['reviewer'],
} as const satisfies Record<string, readonly Role[]>;
export type Act = keyof typeof MAY;

/** True when any of the roles may do the act. */
export const may = (roles: readonly Role[], act: Act): boolean => {
  const allowed: readonly Role[] = MAY[act];
  return roles.some((role) => allowed.includes(role));
};
