import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { AppError } from '../problems';

/** Deeper than any document of ours. */
export const MAX_DEPTH = 40;

// A string, or one of the four brackets, a comma or a colon: the rest of valid JSON says nothing about its structure.
const TOKEN = /"[^"\\]*(?:\\.[^"\\]*)*"|[{}[\],:]/gs;

/**
 * Walks valid JSON text for what JSON.parse lets through: nesting past `MAX_DEPTH`, and one key twice in an object, of which the parser
 * silently keeps the second. Throws AppError. Time grows with the length of the text alone.
 */
export function scanJson(text: string): void {
  // One entry per open bracket: the keys seen so far in an object, null in a list.
  const open: (Set<string> | null)[] = [];
  let lastString: string | null = null;
  for (const [token] of text.matchAll(TOKEN)) {
    if (token.startsWith('"')) {
      lastString = token;
      continue;
    }
    if (token === ':') noteKey(open.at(-1), lastString);
    else if (token === '{' || token === '[') {
      open.push(token === '{' ? new Set() : null);
      if (open.length > MAX_DEPTH)
        throw new AppError('invalid', fill(texts.details.tooDeep, { max: MAX_DEPTH }), {
          errors: [{ path: '', code: 'too-deep', message: fill(texts.details.tooDeep, { max: MAX_DEPTH }) }],
        });
    } else if (token === '}' || token === ']') open.pop();
    lastString = null;
  }
}

function noteKey(keys: Set<string> | null | undefined, token: string | null): void {
  if (!keys || token === null) return;
  // The same key can be spelt in two ways: "a" and "\u0061".
  const key = String(JSON.parse(token));
  if (keys.has(key)) {
    const message = fill(texts.details.duplicateKey, { key });
    throw new AppError('invalid', message, { errors: [{ path: key, code: 'duplicate-key', message }] });
  }
  keys.add(key);
}
