import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { AppError } from '../problems';
import { scanJson } from './scanJson';

/** The largest airframe that the parser takes is well under this. */
export const BODY_MAX_MB = 2;
const BODY_MAX_BYTES = BODY_MAX_MB * 1024 * 1024;

const tooLarge = (): AppError => new AppError('too-large', fill(texts.details.tooLarge, { max: BODY_MAX_MB }));

/** Reads no further than the cap, whatever Content-Length says. */
async function readCapped(request: Request): Promise<Uint8Array> {
  if (Number(request.headers.get('content-length') ?? 0) > BODY_MAX_BYTES) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let total = 0;
  const reader = request.body?.getReader();
  while (reader !== undefined) {
    const { done, value } = await reader.read();
    if (done) break;
    total += value.byteLength;
    if (total > BODY_MAX_BYTES) {
      await reader.cancel();
      throw tooLarge();
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks);
}

/** The body as JSON, with its text. Refuses what is too large, too deep, not JSON, not UTF-8, or says one thing twice. */
export async function readJson(request: Request): Promise<{ text: string; value: unknown }> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^application\/json\s*(;|$)/i.test(type)) throw new AppError('wrong-media-type', texts.details.wrongMediaType);
  const bytes = await readCapped(request);
  let text: string;
  let value: unknown;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    value = JSON.parse(text);
  } catch (error) {
    if (!(error instanceof SyntaxError || error instanceof TypeError)) throw error;
    throw new AppError('bad-json', texts.details.badJson);
  }
  scanJson(text);
  return { text, value };
}
