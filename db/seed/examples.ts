import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { parseAirframeText } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';

export const EXAMPLES = ['tarrel-620', 'ombry-1000', 'quenlet-700', 'quenlet-1050', 'hask'] as const;
export type ExampleId = (typeof EXAMPLES)[number];

/** An example airframe from its file. Throws with the file's name when it is missing or does not parse. */
export async function example(id: ExampleId, folder = path.join(process.cwd(), 'examples')): Promise<Airframe> {
  const file = path.join(folder, `${id}.json`);
  const text = await readFile(file, 'utf8').catch((error: unknown) => {
    throw new RangeError(`the example ${id}.json cannot be read; the demo workshop needs it`, { cause: error });
  });
  const parsed = parseAirframeText(text);
  if (parsed.ok) return parsed.value;
  const [first] = parsed.problems;
  throw new RangeError(`the example ${id}.json does not parse: ${first?.path} ${first?.message}`);
}
