import { execFile } from 'node:child_process';
import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { promisify } from 'node:util';
import type { Page } from '@playwright/test';
import { PDFDocument } from 'pdf-lib';

const run = promisify(execFile);
/** A point of PDF is 1/72 inch (ISO 32000). */
const MM_PER_POINT = 25.4 / 72;

export interface PlanPage {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly text: string;
}
export interface PlanOnDisk {
  readonly sha256: string;
  readonly pages: readonly PlanPage[];
}

/** Takes a file that a link hands out and answers where the browser put it. */
export async function download(page: Page, take: () => Promise<void>): Promise<{ path: string; name: string }> {
  const coming = page.waitForEvent('download');
  await take();
  const file = await coming;
  const failure = await file.failure();
  if (failure !== null) throw new RangeError(`the download failed: ${failure}`);
  return { path: await file.path(), name: file.suggestedFilename() };
}

/** A downloaded plan, read by programs that had no part in writing it where there is one: sizes by pdf-lib, text by poppler. */
export async function readPlan(path: string): Promise<PlanOnDisk> {
  const bytes = await readFile(path);
  const { stdout } = await run('pdftotext', ['-layout', path, '-'], { maxBuffer: 64 * 1024 * 1024 });
  const texts = stdout.split('\f');
  const pdf = await PDFDocument.load(bytes, { updateMetadata: false });
  const pages = pdf.getPages().map((page, index): PlanPage => {
    const { x, y, width, height } = page.getMediaBox();
    if (x !== 0 || y !== 0 || page.getRotation().angle !== 0)
      throw new RangeError(`page ${index + 1} is shifted or turned: a printer may fit it`);
    return { widthMm: width * MM_PER_POINT, heightMm: height * MM_PER_POINT, text: texts[index] ?? '' };
  });
  return { sha256: createHash('sha256').update(bytes).digest('hex'), pages };
}
