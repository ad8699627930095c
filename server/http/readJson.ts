import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { AppError } from '../problems';
import { scanJson } from './scanJson';

const KB = 1024;
/** The largest airframe that the parser takes is well under this. */
export const DOCUMENT_MAX_KB = 2048;
/** Anything else: two long paragraphs fit many times over. */
export const BODY_MAX_KB = 64;

/** Reads no further than the cap, whatever Content-Length says. */
export async function readCapped(request: Request, maxKb: number): Promise<Uint8Array> {
  const tooLarge = new AppError('too-large', fill(texts.details.tooLarge, { max: maxKb }));
  if (Number(request.headers.get('content-length') ?? 0) > maxKb * KB) throw tooLarge;
  const chunks: Uint8Array[] = [];
  let total = 0;
  const reader = request.body?.getReader();
  while (reader !== undefined) {
    const { done, value } = await reader.read();
    if (done) break;
    total += value.byteLength;
    if (total > maxKb * KB) {
      await reader.cancel();
      throw tooLarge;
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks);
}

function assertJsonType({ headers }: Request): void {
  const type = headers.get('content-type') ?? '';
  if (!/^application\/json\s*(;|$)/i.test(type)) throw new AppError('wrong-media-type', texts.details.wrongMediaType);
}

/** The body as JSON, with its text. Refuses what is too large, too deep, not JSON, not UTF-8, or says one thing twice. */
export async function readJson(request: Request, maxKb: number): Promise<{ text: string; value: unknown }> {
  assertJsonType(request);
  return parseJson(await readCapped(request, maxKb));
}

/** As `readJson`, and an absent body is null. */
export async function readOptionalJson(request: Request, maxKb: number): Promise<{ text: string } | null> {
  const bytes = await readCapped(request, maxKb);
  if (bytes.length === 0) return null;
  assertJsonType(request);
  return parseJson(bytes);
}

function parseJson(bytes: Uint8Array): { text: string; value: unknown } {
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
