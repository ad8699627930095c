import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import type { MassLine } from './line';
import { mirrorPiece } from './piece';

/** A line on the centre, or the same mass on each side. */
export function onSides(line: MassLine, mirrored: boolean): MassLine[] {
  if (!mirrored) return [line];
  const side = (which: 'stbd' | 'port') => ({
    key: `${line.key}/${which}`,
    name: fill(texts.side, { name: line.name, side: texts[which] }),
  });
  return [
    { ...line, ...side('stbd') },
    { ...line, ...side('port'), ...mirrorPiece(line) },
  ];
}
