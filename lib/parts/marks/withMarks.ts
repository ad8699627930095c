import type { Operation, Part } from '../types';
import { grainArrow } from './grain';
import { partLabels } from './labels';
import { registerMarks } from './register';
import { roomIn } from './room';

/** Work that a face decides: marks and glue can be read from either. */
export const cutsFace = ({ kind }: Operation): boolean =>
  kind === 'cutToPaper' || kind === 'crease' || kind === 'bevel' || kind === 'foamOut' || kind === 'paperOff';

/** Which of how many alike a part is: a mirrored pair, starboard first. */
function countOf(part: Part, paired: ReadonlySet<string>): { index: number; of: number } {
  if (part.mirrorOf) return { index: 2, of: 2 };
  return { index: 1, of: paired.has(part.key) ? 2 : 1 };
}

function marked(part: Part, paired: ReadonlySet<string>): Part {
  const room = roomIn(part.outline, part.holes);
  const twoFaced = part.operations.some((operation) => cutsFace(operation) && operation.face !== part.face);
  return {
    ...part,
    operations: [
      ...part.operations,
      ...(part.grainDeg === null ? [] : grainArrow(room, part.grainDeg, part.face)),
      ...(twoFaced ? registerMarks(room.places, part.face) : []),
    ],
    labels: partLabels(room, part.name, { ...countOf(part, paired), twoFaced }),
  };
}

/**
 * The parts with what a builder reads on them: grain arrows, pin points where a part is worked from both faces, and labels.
 * Nothing that is cut changes, so what only weighs or measures parts can do without: finding room for marks costs more
 * than the parts themselves.
 */
export function withMarks(parts: readonly Part[]): Part[] {
  const paired = new Set(parts.flatMap(({ mirrorOf }) => mirrorOf ?? []));
  return parts.map((part) => marked(part, paired));
}
