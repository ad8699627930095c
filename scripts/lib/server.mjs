import { pathToFileURL } from 'node:url';
import { Failure } from './failure.mjs';
import { manage } from './managed.mjs';
import { nextProgram } from './pages.mjs';
import { inRoot, root } from './root.mjs';

const PRELOADED = ['endWithParent.mjs', 'peerAddress.mjs'];
const STOP_MS = 5_000;
const READY_MS = 60_000;
const ASK_EVERY_MS = 100;

async function answers(address) {
  try {
    const response = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(10_000) });
    await response.arrayBuffer();
    return response.ok;
  } catch {
    return false; // not listening yet
  }
}

/** Waits until the server says that it and its database are well. Throws a Failure when it ends first or takes too long. */
async function untilReady(address, exited, readyMs) {
  let ended = null;
  exited.then((end) => {
    ended = end;
  });
  const deadline = Date.now() + readyMs;
  while (!(await answers(address))) {
    if (ended !== null) throw new Failure(`The server ended before it was ready (code ${ended.code}).`);
    if (Date.now() > deadline) throw new Failure('The server did not become ready in time.');
    await new Promise((resolve) => setTimeout(resolve, ASK_EVERY_MS));
  }
}

/**
 * Starts the pages' server and waits until it answers. `mode` is next's own: "start" or "dev".
 * What it prints before that is shown only when it fails.
 */
export async function startServer({ mode, host, port, address, env }) {
  const managed = manage(nextProgram, [mode, '-H', host, '-p', String(port)], {
    cwd: root,
    env: { ...env, NODE_ENV: mode === 'dev' ? 'development' : 'production', NEXT_TELEMETRY_DISABLED: '1' },
    execArgv: PRELOADED.flatMap((name) => ['--import', pathToFileURL(inRoot('scripts', 'lib', name)).href]),
    stdio: ['ignore', 'pipe', 'inherit', 'ipc'],
  });
  const early = [];
  const keep = (bytes) => early.push(bytes);
  managed.child.stdout.on('data', keep);
  const stop = () => managed.stop((child) => child.kill('SIGTERM'), STOP_MS);
  try {
    await untilReady(address, managed.exited, READY_MS);
  } catch (error) {
    process.stderr.write(Buffer.concat(early));
    await stop();
    throw error;
  }
  managed.child.stdout.off('data', keep).pipe(process.stdout);
  let stopping = false;
  const lost = managed.exited.then(() => {
    if (!stopping) throw new Failure('The server ended by itself.');
  });
  return {
    lost,
    stop: () => {
      stopping = true;
      return stop();
    },
  };
}
