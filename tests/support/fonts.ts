import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { PlanFonts } from '@/lib/plan/pdf/fonts';

const read = (name: string): Uint8Array =>
  new Uint8Array(readFileSync(join(import.meta.dirname, `../../public/fonts/${name}.ttf`)));

/** The fonts that ship with the application. */
export const planFonts = (): PlanFonts => ({
  text: read('archivo-400'),
  bold: read('archivo-700'),
  mono: read('b612-mono-400'),
});
