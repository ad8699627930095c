import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { countOne, countPlaywright, countVitest } from './counts.mjs';

let folder: string;
let report: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'foldspar-counts-'));
  report = join(folder, 'report.json');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));
const write = (value: unknown) => writeFileSync(report, JSON.stringify(value));

describe('counting a run of vitest', () => {
  const file = (status: string, tests: number) => ({
    status,
    assertionResults: Array.from({ length: tests }, () => ({})),
  });

  it('counts what passed and what failed', () => {
    write({ numTotalTests: 9, numPassedTests: 7, testResults: [file('failed', 9)] });
    expect(countVitest(report, 1)).toEqual({ passed: 7, failed: 2 });
  });

  it('counts a skipped test as failed', () => {
    write({ numTotalTests: 5, numPassedTests: 4, numPendingTests: 1, testResults: [file('passed', 5)] });
    expect(countVitest(report, 0)).toEqual({ passed: 4, failed: 1 });
  });

  it('counts a file that could not be loaded', () => {
    write({ numTotalTests: 3, numPassedTests: 3, testResults: [file('passed', 3), file('failed', 0)] });
    expect(countVitest(report, 1)).toEqual({ passed: 3, failed: 1 });
  });

  it('counts a run without tests, without a report or with a bad end as failed', () => {
    write({ numTotalTests: 0, numPassedTests: 0, testResults: [] });
    expect(countVitest(report, 0)).toEqual({ passed: 0, failed: 1 });
    expect(countVitest(join(folder, 'none.json'), 0)).toEqual({ passed: 0, failed: 1 });
    write({ numTotalTests: 3, numPassedTests: 3, testResults: [file('passed', 3)] });
    expect(countVitest(report, 1)).toEqual({ passed: 3, failed: 1 });
  });
});

it('counts skipped and flaky browser tests, and errors outside of tests, as failed', () => {
  write({ stats: { expected: 8, unexpected: 2, skipped: 3, flaky: 1 }, errors: [{}] });
  expect(countPlaywright(report, 1)).toEqual({ passed: 8, failed: 7 });
  expect(countPlaywright(join(folder, 'none.json'), 0)).toEqual({ passed: 0, failed: 1 });
});

it('counts a check as one', () => {
  expect([countOne(0), countOne(2)]).toEqual([
    { passed: 1, failed: 0 },
    { passed: 0, failed: 1 },
  ]);
});
