import { getDb } from '@/db/client';
import { texts } from '@/lib/text/en/server';
import { type ActContext, newId } from '../context';
import { runEngine } from '../engine';
import { isSameOrigin, originOf } from '../origin';
import { claim, type Member } from '../permissions';
import { AppError } from '../problems';
import { type MemberRoute, type ParamsOf, routeOf, type SignedInRoute } from '../routes';
import { whoOf } from '../session';
import { jsonResponse, type Reply } from './answers';
import { Call } from './call';
import { asAppError, logRefusal, problemResponse } from './refuse';

type Handler<Params> = (request: Request, context: { params: Promise<Params> }) => Promise<Response>;
type WorkshopParams<Key extends MemberRoute> = ParamsOf<Key> & { readonly workshop: string };

/** A handler answers with data, or with a finished response when it sends a file. */
type Work<C> = (call: C) => Promise<Reply | Response>;

/** A call whose membership has been proven for the act that the registry names. */
export type MemberCall<Params> = Call<Params> & { readonly member: Member };

/** A route inside a workshop: who, may they, then the work, which reads the body's shape first. */
export function inWorkshop<Key extends MemberRoute>(
  key: Key,
  work: Work<MemberCall<WorkshopParams<Key>>>,
): Handler<WorkshopParams<Key>> {
  const { needs } = routeOf(key);
  if (needs === 'public' || needs === 'signedIn') throw new RangeError(`${key} does not lie in a workshop`);
  return (request, context) =>
    guarded(request, async () => {
      const params = await context.params;
      const base = await openCall(request, params);
      const member = await claim(base.db, base.who, params.workshop, needs);
      const proof: ActContext['proof'] = (tx) => claim(tx, base.who, params.workshop, needs);
      return work(Object.assign(base, { member, context: { ...base.context, proof } }));
    });
}

/** A route for anybody who is signed in. */
export function signedIn<Key extends SignedInRoute>(key: Key, work: Work<Call<ParamsOf<Key>>>): Handler<ParamsOf<Key>> {
  if (routeOf(key).needs !== 'signedIn') throw new RangeError(`${key} is not for everybody who is signed in`);
  return (request, context) => guarded(request, async () => work(await openCall(request, await context.params)));
}

/** Refuses what another site's page sent, and turns every failure into a problem. */
async function guarded(request: Request, work: () => Promise<Reply | Response>): Promise<Response> {
  const { pathname } = new URL(request.url);
  try {
    if (request.method !== 'GET' && !isSameOrigin(request.headers))
      throw new AppError('cross-origin', texts.details.crossOrigin);
    const reply = await work();
    return reply instanceof Response ? reply : jsonResponse(request, reply);
  } catch (error) {
    const refusal = asAppError(error, `${request.method} ${pathname}`);
    if (refusal.kind === 'forbidden' || refusal.kind === 'cross-origin')
      logRefusal(`${request.method} ${pathname}`, { kind: refusal.kind });
    return problemResponse(refusal, pathname);
  }
}

async function openCall<Params>(request: Request, params: Params): Promise<Call<Params>> {
  const now = new Date();
  const who = await whoOf(request.headers, now);
  if (who === null) throw new AppError('not-signed-in', texts.details.notSignedIn);
  const db = await getDb();
  const context: ActContext = {
    db,
    who,
    now,
    newId,
    engine: (job, signal) => runEngine(job, signal, who.userId),
    // Links in mails: a Host header that is not ours leads nowhere but here.
    baseUrl: originOf(request.headers) ?? '',
    signal: request.signal,
  };
  return new Call(request, params, context);
}
