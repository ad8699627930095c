import type { Vec2 } from '@/lib/numerics/vec';
import type { Typefaces } from './fonts';
import { letter, line, lineStyle } from './ink';

export interface Bar {
  /** Where it begins; it runs right or up from there. mm. */
  readonly from: Vec2;
  readonly lengthMm: number;
  readonly upwards: boolean;
  readonly label: string;
  readonly capMm: number;
  /** Minor ticks this far apart, mm. */
  readonly everyMm: number;
  /** Where the label stands: on the far side of the ticks (right of an upright bar, above a level one) or the near one. */
  readonly labelSide: 'before' | 'after';
}

const END_TICK_MM = 1.6;
const TICK_MM = 0.8;

/** A length to measure on the print: a line with ticks across its exact ends. */
export function bar(faces: Typefaces, spec: Bar): string {
  const { from, lengthMm, upwards, everyMm } = spec;
  const at = (along: number, off: number): Vec2 =>
    upwards ? [from[0] + off, from[1] + along] : [from[0] + along, from[1] + off];
  const parts = [lineStyle(0.2), line(at(0, 0), at(lengthMm, 0))];
  for (const end of [0, lengthMm]) parts.push(line(at(end, -END_TICK_MM), at(end, END_TICK_MM)));
  const ticks = Math.ceil(lengthMm / everyMm - 1e-9) - 1;
  for (let i = 1; i <= ticks; i++) parts.push(line(at(i * everyMm, 0), at(i * everyMm, TICK_MM)));
  const gap = END_TICK_MM + 0.6;
  // An upright bar's label is turned a quarter, so its letters rise to the left of their baseline.
  const before = upwards ? -gap : -(gap + spec.capMm);
  const after = upwards ? gap + spec.capMm : gap;
  const off = spec.labelSide === 'after' ? after : before;
  parts.push(
    letter(faces, spec.label, at(lengthMm / 2, off), {
      face: 'mono',
      capMm: spec.capMm,
      align: 'centre',
      angleDeg: upwards ? 90 : 0,
    }),
  );
  return parts.join('\n');
}
