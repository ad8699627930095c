import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const ROOT = join(import.meta.dirname, '../..');
const EXAMPLE = join(ROOT, 'examples/tarrel-620.json');
const folder = mkdtempSync(join(tmpdir(), 'cli-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const run = (args: readonly string[], input = '') =>
  spawnSync(process.execPath, [join(ROOT, 'scripts/cli.mjs'), ...args], {
    encoding: 'utf8',
    input,
    maxBuffer: 1 << 28,
  });
const job = (request: unknown) => {
  const { status, stdout, stderr } = run(['job'], JSON.stringify(request));
  expect(status, stderr).toBe(0);
  const answer: Record<string, unknown> = JSON.parse(stdout);
  return answer;
};
const write = (name: string, content: unknown): string => {
  const path = join(folder, name);
  writeFileSync(path, typeof content === 'string' ? content : JSON.stringify(content));
  return path;
};
const example = (): Record<string, unknown> => JSON.parse(readFileSync(EXAMPLE, 'utf8'));
const textOf = (pdf: string): string => execFileSync('pdftotext', ['-layout', pdf, '-'], { encoding: 'utf8' });

beforeAll(() => {
  // Bundles once, so that no test below pays for it or races with another.
  run(['figures', EXAMPLE]);
});

describe('figures', () => {
  it('prints figures as JSON and nothing else', () => {
    const { status, stdout, stderr } = run(['figures', EXAMPLE]);
    expect(stderr).toBe('');
    expect(status).toBe(0);
    // The example's own span: two half wings of its two panels' projected lengths, as its name says.
    expect(JSON.parse(stdout).values.spanMm.value).toBeCloseTo(620, 6);
  });

  it.each([
    {
      name: 'a negative chord',
      broken: () => JSON.stringify(example()).replace(/"rootChordMm":\d+/, '"rootChordMm":-5'),
      field: 'rootChordMm',
    },
    { name: 'an unknown key', broken: () => JSON.stringify({ ...example(), wings: 2 }), field: 'wings' },
    { name: 'text that is not JSON', broken: () => '{"format": ', field: 'not valid JSON' },
    { name: 'an unknown version', broken: () => JSON.stringify({ ...example(), version: 99 }), field: 'version' },
  ])('refuses $name with exit code 2 and says where', ({ broken, field }) => {
    const { status, stdout, stderr } = run(['figures', write('broken.json', broken())]);
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr).toContain(field);
    expect(stderr).not.toMatch(/\bat .*\.m?js/);
  });

  it.each([[[]], [['figures']], [['figures', 'no-such-file.json']], [['unknown']]])('refuses %j', (args) => {
    const { status, stderr } = run(args);
    expect(status).toBe(2);
    expect(stderr).not.toBe('');
  });
});

describe('sheets', () => {
  const sheets = (file: string, paper: string, out: string) =>
    run(['sheets', file, '--paper', paper, '--out', join(folder, out)]);
  const bytes = (out: string, name: string) => readFileSync(join(folder, out, name));

  it('writes the workshop aids into a folder of their own, with a coupon of each foam sheet, when asked', () => {
    const { status, stderr } = run(['sheets', EXAMPLE, '--paper', 'a4', '--out', join(folder, 'aided'), '--aids']);
    expect(status, stderr).toBe(0);
    const text = textOf(join(folder, 'aided', 'aids', 'plan.pdf'));
    for (const aid of ['CG stand', 'Throw gauge', 'Incidence gauge', 'coupon'])
      expect(text.toLowerCase()).toContain(aid.toLowerCase());
    const ids = (name: string) =>
      JSON.parse(bytes(join('aided', name), 'manifest.json').toString('utf8')).sheets.flatMap(
        ({ expected }: { expected: { part: string }[] }) => expected.map(({ part }) => part),
      );
    expect(ids('aids').filter((part: string) => part.startsWith('aid/')).length).toBeGreaterThan(10);
    expect(ids('.').some((part: string) => part.startsWith('aid/'))).toBe(false);
  });

  it('writes the plan, its manifest, and every sheet for a cutter', () => {
    const { status, stdout } = sheets(EXAMPLE, 'a4', 'a4');
    expect(status).toBe(0);
    expect(stdout).toBe('');
    const manifest = JSON.parse(bytes('a4', 'manifest.json').toString('utf8'));
    expect(manifest.pdfSha256).toBe(createHash('sha256').update(bytes('a4', 'plan.pdf')).digest('hex'));
    const ids: string[] = manifest.sheets.map(({ id }: { id: string }) => id);
    const files = ids.flatMap((id) => [`${id}.svg`, `${id}.dxf`]);
    expect(readdirSync(join(folder, 'a4')).sort()).toEqual([...files, 'manifest.json', 'plan.pdf'].sort());
    const words = textOf(join(folder, 'a4/plan.pdf'));
    for (const said of [
      'DRAFT',
      'Sheet 1 · paper-faced board, 5 mm',
      '5/3 mm tube, 470 mm',
      '(15°)',
      'Propeller off for every set-up',
    ]) {
      expect(words).toContain(said);
    }
  });

  it('gives the same bytes again, and as a job', () => {
    sheets(EXAMPLE, 'letter', 'first');
    sheets(EXAMPLE, 'letter', 'second');
    for (const name of readdirSync(join(folder, 'first'))) {
      expect(bytes('second', name).equals(bytes('first', name)), name).toBe(true);
    }
    const answer = job({ kind: 'plan', airframe: example(), paper: 'letter' });
    expect(answer.ok).toBe(true);
    expect(answer.pdfBase64).toBe(bytes('first', 'plan.pdf').toString('base64'));
    expect(answer.manifest).toEqual(JSON.parse(bytes('first', 'manifest.json').toString('utf8')));
  });

  it('prints a revision from what was frozen, not from a new computation', () => {
    const answer = job({ kind: 'freeze', airframe: example() });
    expect(answer).toMatchObject({ ok: true, kind: 'freeze', engine: expect.any(String) });
    const text = JSON.stringify(answer.frozen).replace(/"allUpMassG":\{"value":[\d.]+/, '"allUpMassG":{"value":98765');
    const revision = { number: 4, state: 'goodToCut', releasedAt: '2031-04-05', design: 'Wren 1' };
    const file = write('export.json', { revision, airframe: example(), frozen: JSON.parse(text) });
    expect(sheets(file, 'a4', 'frozen').status).toBe(0);
    const words = textOf(join(folder, 'frozen/plan.pdf'));
    expect(words).toContain('98765');
    expect(words).toContain('revision 4 · 2031-04-05 · good to cut');
    expect(words).not.toContain('DRAFT');
  });

  it.each([
    { args: ['--paper', 'a99', '--out', 'x'], said: 'a99' },
    { args: ['--paper', 'a4'], said: '--out' },
    { args: ['--out', 'x', '--scale', '2'], said: '--scale' },
    { args: ['--out'], said: '--out' },
  ])('refuses $args', ({ args, said }) => {
    const { status, stderr } = run(['sheets', EXAMPLE, ...args]);
    expect(status).toBe(2);
    expect(stderr).toContain(said);
  });

  it('refuses an airframe whose part is larger than every sheet, by the part', () => {
    const small = JSON.stringify(example()).replaceAll(/"sheets":\[[^\]]*\]/g, '"sheets":[{"wMm":120,"hMm":120}]');
    const { status, stderr } = sheets(write('small.json', small), 'a4', 'small');
    expect(status).toBe(2);
    expect(stderr).not.toBe('');
  });
});

describe('job', () => {
  it.each([
    { request: { kind: 'other' } },
    { request: {} },
    { request: [] },
    { request: 'text' },
    { request: { kind: 'plan', airframe: {}, paper: 'a4' } },
  ])('answers $request with problems and exit code 0', ({ request }) => {
    const answer = job(request);
    expect(answer.ok).toBe(false);
    expect(answer.problems).not.toEqual([]);
  });

  it('answers a text that is not JSON with a problem', () => {
    const { status, stdout } = run(['job'], '{"kind":');
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ ok: false, problems: [{ code: 'bad-json' }] });
  });
});
