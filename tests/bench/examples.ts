import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { airframeLattice } from '@/lib/aero/lattice/fromAirframe';
import type { LatticeInput } from '@/lib/aero/lattice/types';
import { parseAirframeText } from '@/lib/airframe/parse';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { areasOf } from '@/lib/figures/reference';

export interface Example {
  readonly name: string;
  readonly airframe: Airframe;
  readonly input: LatticeInput;
  readonly macMm: number;
}

/** Every example with its lattice, as the figures lay it. */
export function examples(): Example[] {
  return readdirSync('examples')
    .filter((file) => file.endsWith('.json'))
    .sort()
    .map((file): Example => {
      const parsed = parseAirframeText(readFileSync(join('examples', file), 'utf8'));
      if (!parsed.ok) throw new RangeError(`${file} is refused`);
      const resolved = resolve(parsed.value);
      if (!resolved.ok) throw new RangeError(`${file} does not resolve`);
      const { wing } = areasOf(parsed.value, resolved.value);
      if (!wing.ok) throw new RangeError(`${file} has no wing`);
      const { areaMm2, macMm, spanMm, quarterXMm } = wing.value;
      const reference = { area: areaMm2, chord: macMm, span: spanMm, point: [quarterXMm, 0, 0] as const };
      const input = { ...airframeLattice(parsed.value, resolved.value), reference };
      return { name: parsed.value.name, airframe: parsed.value, input, macMm };
    });
}
