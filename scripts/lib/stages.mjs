import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBundles } from './bundle.mjs';
import { countOne, countPlaywright, countVitest } from './counts.mjs';
import { Failure } from './failure.mjs';
import { ensurePages, nextProgram } from './pages.mjs';
import { inRoot } from './root.mjs';
import { runNode } from './run.mjs';

const REPORTS = inRoot('test-results', 'reports');
const program = (...parts) => inRoot('node_modules', ...parts);

/** A fresh place for a report: one of an earlier run must not be counted. */
function reportPath(name) {
  mkdirSync(REPORTS, { recursive: true });
  const path = join(REPORTS, `${name}.json`);
  rmSync(path, { force: true });
  return path;
}

async function typeCheck(env) {
  const generated = await runNode([nextProgram, 'typegen'], { env });
  return countOne(generated.code || (await runNode([program('typescript', 'bin', 'tsc'), '--noEmit'], { env })).code);
}

const lint = async (env) =>
  countOne((await runNode([program('@biomejs', 'biome', 'bin', 'biome'), 'check', '.'], { env })).code);

const vitest = (project) => async (env) => {
  const report = reportPath(project);
  const args = ['run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const { code } = await runNode([program('vitest', 'vitest.mjs'), ...args], { env });
  return countVitest(report, code);
};

async function build() {
  try {
    await ensureBundles();
    await ensurePages((line) => console.log(line));
    return countOne(0);
  } catch (error) {
    console.error(error instanceof Failure ? error.message : error);
    return countOne(1);
  }
}

async function browser(env) {
  const report = reportPath('browser');
  const args = ['test', '--reporter=list,json'];
  const cli = program('@playwright', 'test', 'cli.js');
  const { code } = await runNode([cli, ...args], { env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report } });
  return countPlaywright(report, code);
}

/** Every stage of the tests in its order. Each answers { passed, failed }. */
export const STAGES = [
  ['types', typeCheck],
  ['lint', lint],
  ...['unit', 'published', 'plan', 'db', 'api'].map((project) => [project, vitest(project)]),
  ['build', build],
  ['browser', browser],
];
