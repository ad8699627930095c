import type { z } from 'zod';
import type { Db } from '@/db/types';
import type { ActContext, Who } from '../context';
import { jsonResponse } from './answers';
import { AlreadyDone, earlierAnswer, idempotencyKeyOf, type OnceRequest, onceFor } from './once';
import { parseBody } from './parseBody';
import { BODY_MAX_KB, readJson } from './readJson';

/** One request by somebody who is signed in. */
export class Call<Params> {
  readonly url: URL;
  readonly db: Db;
  readonly who: Who;
  private bodyText = '';

  constructor(
    readonly request: Request,
    readonly params: Params,
    /** For an act. */
    readonly context: ActContext,
  ) {
    this.url = new URL(request.url);
    this.db = context.db;
    this.who = context.who;
  }

  /** The JSON body in the shape that the act takes. A document may be larger than anything else. */
  async read<T>(shape: z.ZodType<T>, maxKb: number = BODY_MAX_KB): Promise<T> {
    const { text, value } = await readJson(this.request, maxKb);
    this.bodyText = text;
    return parseBody(shape, value);
  }

  /** Does an act that makes something, once for each Idempotency-Key, and answers 201 with what it made. */
  async create<Made>(act: (context: ActContext) => Promise<Made>, location: (made: Made) => string): Promise<Response> {
    const made = await this.once(act);
    return jsonResponse(this.request, { status: 201, data: made, location: location(made) });
  }

  private async once<Made>(act: (context: ActContext) => Promise<Made>): Promise<Made> {
    const key = idempotencyKeyOf(this.request.headers);
    if (key === null) return act(this.context);
    const { method } = this.request;
    const request: OnceRequest = {
      key,
      who: this.who,
      method,
      path: this.url.pathname,
      body: this.bodyText,
      now: this.context.now,
    };
    // Asked before the act as well, so that a repeated release does not compute everything again first.
    const earlier = await earlierAnswer(this.db, request);
    // The text was written from a result of this same act: the hash holds method, path and body together.
    if (earlier !== null) return JSON.parse(earlier);
    try {
      return await act({ ...this.context, once: onceFor(request) });
    } catch (error) {
      if (error instanceof AlreadyDone) return JSON.parse(error.answer);
      throw error;
    }
  }
}
