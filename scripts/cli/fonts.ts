import { readFile } from 'node:fs/promises';
import type { PlanFonts } from '@/lib/plan/pdf/fonts';

/** The fonts that ship with the application. The bundle lies in dist/, one folder below the project's root. */
export async function readFonts(): Promise<PlanFonts> {
  const read = async (name: string): Promise<Uint8Array> =>
    new Uint8Array(await readFile(new URL(`../public/fonts/${name}.ttf`, import.meta.url)));
  const [text, bold, mono] = await Promise.all([read('archivo-400'), read('archivo-700'), read('b612-mono-400')]);
  return { text, bold, mono };
}
