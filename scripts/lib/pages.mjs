import { Failure } from './failure.mjs';
import { hashOf, replaceFile, textOf } from './files.mjs';
import { inRoot } from './root.mjs';
import { runNode } from './run.mjs';

const SOURCES = [
  ...['app', 'components', 'client', 'workers', 'lib', 'db', 'server', 'public', 'examples'],
  ...['proxy.ts', 'instrumentation.ts', 'next.config.mjs', 'postcss.config.mjs'],
  ...['tsconfig.json', 'tsconfig.build.json', 'package-lock.json'],
];
const STAMP = inRoot('.next', 'foldspar.hash');

export const nextProgram = inRoot('node_modules', 'next', 'dist', 'bin', 'next');

/** Environment of the pages' build: no database in reach, so that none is opened. */
function buildEnv() {
  const { DATABASE_URL: _url, FOLDSPAR_DB_SOCKET: _socket, NODE_ENV: _mode, ...env } = process.env;
  return { ...env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' };
}

/** Builds the pages unless the build that stands there was made from these sources. */
export async function ensurePages(say) {
  const hash = hashOf(SOURCES);
  if (textOf(STAMP) === hash && textOf(inRoot('.next', 'BUILD_ID')) !== null) return;
  say('Building the pages (about a minute) ...');
  const { code, output } = await runNode([nextProgram, 'build'], { env: buildEnv(), quiet: true });
  if (code !== 0) throw new Failure(`${output}\nThe pages could not be built.`);
  replaceFile(STAMP, hash);
}
