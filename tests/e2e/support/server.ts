import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

const root = resolve(import.meta.dirname, '../../..');
/** A first start builds the pages. */
const START_MS = 10 * 60_000;

function freePort(): Promise<number> {
  return new Promise((done, fail) => {
    const server = createServer();
    server.once('error', fail);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() =>
        typeof address === 'object' && address !== null ? done(address.port) : fail(new RangeError('no port')),
      );
    });
  });
}

/** Waits for the one line that says where the server is. */
function untilReady(child: ChildProcess): Promise<void> {
  return new Promise((done, fail) => {
    let printed = '';
    const timer = setTimeout(() => fail(new RangeError(`the server did not start in time:\n${printed}`)), START_MS);
    const finish = (act: () => void) => {
      clearTimeout(timer);
      act();
    };
    const read = (bytes: Buffer) => {
      printed += bytes.toString('utf8');
      if (printed.includes('Foldspar is ready: ')) finish(done);
    };
    child.stdout?.on('data', read);
    child.stderr?.on('data', read);
    child.once('exit', (code) => finish(() => fail(new RangeError(`the server ended with ${code}:\n${printed}`))));
  });
}

/**
 * Starts the application as a person would, on a free port with a fresh data folder, and leaves its address and the demo's
 * sign-ins to the tests. Answers with the function that ends it.
 */
export default async function startForTests(): Promise<() => Promise<void>> {
  const data = mkdtempSync(join(tmpdir(), 'foldspar-e2e-'));
  const port = await freePort();
  const { DATABASE_URL: _url, FOLDSPAR_DB_SOCKET: _socket, FOLDSPAR_URL: _address, ...env } = process.env;
  const child = spawn(process.execPath, [join(root, 'scripts/start.mjs')], {
    cwd: root,
    env: { ...env, HOST: '127.0.0.1', PORT: String(port), FOLDSPAR_DATA: data },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const exited = new Promise<number | null>((done) => {
    child.once('exit', (code) => done(code));
  });
  const end = async () => {
    child.kill('SIGTERM');
    const code = await exited;
    rmSync(data, { recursive: true, force: true });
    if (code !== 0) throw new RangeError(`the server ended with ${code} when it was told to stop`);
  };
  try {
    await untilReady(child);
  } catch (error) {
    child.kill('SIGTERM');
    await exited;
    rmSync(data, { recursive: true, force: true });
    throw error;
  }
  process.env.FOLDSPAR_E2E_URL = `http://127.0.0.1:${port}`;
  process.env.FOLDSPAR_E2E_SIGN_INS = readFileSync(join(data, 'demo-sign-ins.txt'), 'utf8');
  return end;
}
