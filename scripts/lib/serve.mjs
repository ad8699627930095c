import { pathToFileURL } from 'node:url';
import { bundled, ensureBundles } from './bundle.mjs';
import { startDatabase } from './database.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { Failure } from './failure.mjs';
import { untilTold } from './lifetime.mjs';
import { ensurePages } from './pages.mjs';
import { addressOf, assertFree, portOf } from './port.mjs';
import { dataFolder, inRoot, root } from './root.mjs';
import { ensureSecret } from './secret.mjs';
import { startServer } from './server.mjs';
import { keepSignIns, signInsPath } from './signIns.mjs';

const load = (name) => import(pathToFileURL(bundled(name)).href);

/** What was started, ended in the opposite order. `lost` rejects when any of it ends by itself. */
class Started {
  #stops = [];
  #lose = () => undefined;
  lost = new Promise((_, reject) => {
    this.#lose = reject;
  });
  add({ stop, lost }) {
    this.#stops.push(stop);
    lost.catch(this.#lose);
  }
  async end() {
    for (const stop of this.#stops.splice(0).reverse()) await stop();
  }
}

/** Migrates, and lays out the demo workshop once in the embedded database. Answers with the fresh sign-ins, or null. */
async function prepareData(folder) {
  const { closeDb, databaseConfig, isSeeded, migrateDatabase } = await load('operate');
  await migrateDatabase(databaseConfig(), inRoot('db', 'migrations')).catch((error) => {
    const cause = error.cause?.message ?? error.message;
    throw new Failure(`The database could not be brought to this version's schema, and was left as it is: ${cause}.`);
  });
  if (process.env.DATABASE_URL || (await isSeeded(databaseConfig()))) return null;
  const { main } = await load('seed');
  try {
    const signIns = await main();
    return signIns === null ? null : keepSignIns(folder, signIns);
  } finally {
    await closeDb();
  }
}

async function bringUp(mode, started, say) {
  const host = process.env.HOST || '127.0.0.1';
  const port = portOf();
  const folder = dataFolder();
  await ensureDependencies(say);
  await ensureBundles();
  process.env.FOLDSPAR_SECRET = ensureSecret(folder);
  if (!process.env.DATABASE_URL) {
    const database = await startDatabase(folder);
    started.add(database);
    process.env.FOLDSPAR_DB_SOCKET = database.socket;
  }
  await assertFree(port, host);
  if (mode === 'start') await ensurePages(say);
  const signIns = await prepareData(folder);
  const address = addressOf(host, port);
  const env = { ...process.env, FOLDSPAR_HOST: host, FOLDSPAR_DATA: folder };
  const server = await startServer({ mode, host, port, address, env });
  started.add(server);
  if (signIns !== null) console.log(`Demo sign-ins (name, address, password, roles):\n${signIns}`);
  const demo = process.env.DATABASE_URL ? '' : ` · demo sign-ins: ${signInsPath(folder)}`;
  console.log(`Foldspar is ready: ${address}${demo}`);
}

/** Brings the application up in this mode ("start" or "dev") and keeps it up until told to end. Answers with the exit code. */
export async function serve(mode) {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 9))
    throw new Failure(`Foldspar needs Node 20.9 or newer; this is ${process.version}.`);
  process.chdir(root);
  const started = new Started();
  const say = (line) => console.log(line);
  const told = untilTold();
  const lost = started.lost;
  try {
    await Promise.race([bringUp(mode, started, say).then(() => told), told, lost]);
  } finally {
    await started.end();
  }
  return 0;
}
