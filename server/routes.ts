import type { Act } from '@/lib/contract/roles';

/** What a caller must be: a member who may do the act, signed in at all, or anybody. */
export type Needs = Act | 'signedIn' | 'public';

export interface RouteDef {
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly path: `/api/${string}`;
  readonly needs: Needs;
  /** Takes an Idempotency-Key: sent twice, it is done once. */
  readonly creates?: true;
}

const W = '/api/workshops/[workshop]';
const D = `${W}/designs/[design]`;
const R = `${D}/revisions/[number]`;

/** Every route there is. A test reads app/api from disk and holds the two together; the permission matrix is made from it. */
export const ROUTES = [
  { method: 'GET', path: '/api/health', needs: 'public' },
  { method: 'GET', path: '/api/auth/[...all]', needs: 'public' },
  { method: 'POST', path: '/api/auth/[...all]', needs: 'public' },

  { method: 'GET', path: '/api/workshops', needs: 'signedIn' },
  { method: 'POST', path: '/api/workshops', needs: 'signedIn', creates: true },
  { method: 'POST', path: '/api/invitations/[token]/accept', needs: 'signedIn', creates: true },
  { method: 'GET', path: W, needs: 'workshop.read' },
  { method: 'PATCH', path: W, needs: 'workshop.rename' },
  { method: 'GET', path: `${W}/members`, needs: 'member.list' },
  { method: 'PATCH', path: `${W}/members/[member]`, needs: 'member.setRoles' },
  { method: 'DELETE', path: `${W}/members/[member]`, needs: 'member.remove' },
  { method: 'GET', path: `${W}/invitations`, needs: 'invitation.list' },
  { method: 'POST', path: `${W}/invitations`, needs: 'invitation.create', creates: true },
  { method: 'DELETE', path: `${W}/invitations/[invitation]`, needs: 'invitation.revoke' },

  { method: 'GET', path: `${W}/designs`, needs: 'design.list' },
  { method: 'POST', path: `${W}/designs`, needs: 'design.create', creates: true },
  { method: 'GET', path: D, needs: 'design.read' },
  { method: 'PATCH', path: D, needs: 'design.rename' },
  { method: 'DELETE', path: D, needs: 'design.archive' },
  { method: 'GET', path: `${D}/draft`, needs: 'draft.read' },
  { method: 'PUT', path: `${D}/draft`, needs: 'draft.save' },
  { method: 'GET', path: `${D}/draft/plan`, needs: 'draft.print' },
  { method: 'GET', path: `${D}/draft/manifest`, needs: 'draft.print' },

  { method: 'GET', path: `${D}/revisions`, needs: 'revision.list' },
  { method: 'POST', path: `${D}/revisions`, needs: 'revision.release', creates: true },
  { method: 'GET', path: R, needs: 'revision.read' },
  { method: 'GET', path: `${R}/plan`, needs: 'revision.print' },
  { method: 'GET', path: `${R}/manifest`, needs: 'revision.print' },
  { method: 'GET', path: `${R}/export`, needs: 'revision.export' },
  { method: 'GET', path: `${R}/threads`, needs: 'thread.list' },
  { method: 'POST', path: `${R}/threads`, needs: 'thread.create', creates: true },
  // Closing and opening again are two acts with the same roles; the table of roles is asked for the one that the body names.
  { method: 'PATCH', path: `${R}/threads/[thread]`, needs: 'thread.close' },
  { method: 'POST', path: `${R}/threads/[thread]/comments`, needs: 'comment.create', creates: true },
  { method: 'GET', path: `${R}/verdicts`, needs: 'verdict.list' },
  { method: 'POST', path: `${R}/verdicts`, needs: 'verdict.give', creates: true },
] as const satisfies readonly RouteDef[];

export type Route = (typeof ROUTES)[number];
type KeyOf<R> = R extends { method: infer M extends string; path: infer P extends string } ? `${M} ${P}` : never;
export type RouteKey = KeyOf<Route>;
/** Routes inside a workshop. */
export type MemberRoute = KeyOf<Extract<Route, { needs: Act }>>;
export type SignedInRoute = KeyOf<Extract<Route, { needs: 'signedIn' }>>;

type Names<Path extends string> = Path extends `${string}[${infer Name}]${infer Rest}` ? Name | Names<Rest> : never;
/** Names in brackets in the route's path. */
export type ParamsOf<Key extends RouteKey> = Readonly<Record<Names<Key>, string>>;

/** The route's row, by "METHOD /path". */
export function routeOf(key: RouteKey): Route {
  const found = ROUTES.find((route) => `${route.method} ${route.path}` === key);
  if (found === undefined) throw new RangeError(`no such route: ${key}`);
  return found;
}
