import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** A path inside the checkout. */
export const inRoot = (...parts) => join(root, ...parts);

/** The folder that holds the database, the secret and the demo sign-ins. */
export const dataFolder = (env = process.env) => resolve(root, env.FOLDSPAR_DATA || 'data');
