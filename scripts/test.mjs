import { parseArgs } from 'node:util';
import { ensureBundles } from './lib/bundle.mjs';
import { add } from './lib/counts.mjs';
import { ensureDependencies } from './lib/dependencies.mjs';
import { Failure, runMain } from './lib/failure.mjs';
import { root } from './lib/root.mjs';
import { endRunning } from './lib/run.mjs';
import { STAGES } from './lib/stages.mjs';
import { ensureSystem } from './lib/system.mjs';

// npm test: installs what is missing, runs every stage, closes with "N passed, N failed".
// npm test -- --only unit,db runs these stages alone.

const say = (line) => console.log(line);

/** The stages that were asked for, in their order; all of them without a wish. */
function chosen() {
  const { values } = parseArgs({ options: { only: { type: 'string', multiple: true } } });
  const wished = (values.only ?? []).flatMap((list) => list.split(','));
  const names = STAGES.map(([name]) => name);
  const unknown = wished.filter((name) => !names.includes(name));
  if (unknown.length > 0)
    throw new Failure(`There is no stage "${unknown.join(', ')}"; there are ${names.join(', ')}.`, 2);
  return wished.length === 0 ? STAGES : STAGES.filter(([name]) => wished.includes(name));
}

async function main() {
  const stages = chosen();
  process.chdir(root);
  await ensureDependencies(say);
  const places = await ensureSystem(say);
  await ensureBundles();
  // What a developer has set for a running server must not reach the tests.
  const { DATABASE_URL: _url, FOLDSPAR_DB_SOCKET: _socket, FOLDSPAR_DATA: _data, ...clean } = process.env;
  const env = { ...clean, ...places, NEXT_TELEMETRY_DISABLED: '1' };
  let total = { passed: 0, failed: 0 };
  const lines = [];
  for (const [name, stage] of stages) {
    const started = Date.now();
    say(`\n== ${name} ==`);
    const counts = await stage(env);
    total = add(total, counts);
    const seconds = ((Date.now() - started) / 1000).toFixed(1);
    lines.push(`${name}: ${counts.passed} passed, ${counts.failed} failed (${seconds} s)`);
  }
  say(`\n${lines.join('\n')}\n${total.passed} passed, ${total.failed} failed`);
  return total.failed === 0 ? 0 : 1;
}

for (const signal of ['SIGINT', 'SIGTERM'])
  process.on(signal, () => {
    endRunning();
    process.exit(130);
  });
await runMain(main);
