import { randomBytes } from 'node:crypto';
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { textOf } from './files.mjs';

/**
 * The secret that signs sessions: the configured one, or one made at the first start and kept in the data folder.
 * @param {string} folder
 * @param {Record<string, string | undefined>} env
 */
export function ensureSecret(folder, env = process.env) {
  if (env.FOLDSPAR_SECRET) return env.FOLDSPAR_SECRET;
  const path = join(folder, 'secret');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const kept = textOf(path)?.trim();
  if (kept) return kept;
  const secret = randomBytes(32).toString('base64url');
  writeFileSync(path, `${secret}\n`, { mode: 0o600 });
  return secret;
}
