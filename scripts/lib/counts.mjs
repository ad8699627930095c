import { textOf } from './files.mjs';

const NOTHING = { passed: 0, failed: 0 };

/** A check that is one thing: it passes or fails as a whole. */
export const countOne = (code) => (code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });

export const add = (a, b) => ({ passed: a.passed + b.passed, failed: a.failed + b.failed });

const parse = (path) => {
  const text = textOf(path);
  return text === null ? null : JSON.parse(text);
};

/** A run that went wrong without a test that says so is one failure more: no tests, a file that does not load, a crash. */
const honest = (counts, code) => {
  if (counts.failed === 0 && (code !== 0 || counts.passed === 0)) return { ...counts, failed: 1 };
  return counts;
};

/** Counts from vitest's JSON report. A test that was skipped was not passed, so it counts as failed. */
export function countVitest(path, code) {
  const report = parse(path);
  if (report === null) return honest(NOTHING, code || 1);
  const unloaded = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  );
  const failed = report.numTotalTests - report.numPassedTests + unloaded.length;
  return honest({ passed: report.numPassedTests, failed }, code);
}

/** Counts from Playwright's JSON report; skipped and flaky ones count as failed. */
export function countPlaywright(path, code) {
  const report = parse(path);
  if (report === null) return honest(NOTHING, code || 1);
  const { expected, unexpected, skipped, flaky } = report.stats;
  return honest({ passed: expected, failed: unexpected + skipped + flaky + report.errors.length }, code);
}
