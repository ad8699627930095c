import type { Face, Operation, OperationKind, Part } from '@/lib/parts/types';
import { grain as grainWords, operations as words } from '@/lib/text/en/partsPage';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

/** The order in which the work on a face is told: what needs the whole sheet first, joining last. */
const ORDER: readonly OperationKind[] = [
  'register',
  'reference',
  'crease',
  'cutToPaper',
  'bevel',
  'foamOut',
  'paperOff',
  'cut',
  'tape',
  'glue',
];

/** The id that every part's arrow along the grain has. */
const GRAIN_ARROW = 'grain';

const mm = (value: number): string => trimmedDigits(value, 1);

/** Angles under this are not told: what lies flat is not folded. */
const FLAT_DEG = 0.05;

/** A note may tell angle or sizes already, in better words. */
const TELLS_ANGLE = /\d ?(°|degrees)/;
const TELLS_SIZE = /\d (mm|wide|deep)/;

function angleWords({ kind, angleDeg, note }: Operation): string | null {
  const fold = kind === 'crease' || kind === 'cutToPaper';
  if (!fold || angleDeg === undefined || Math.abs(angleDeg) < FLAT_DEG || TELLS_ANGLE.test(note ?? '')) return null;
  return fill(angleDeg > 0 ? words.foldUp : words.foldDown, { angle: mm(Math.abs(angleDeg)) });
}

/** A bevel or a groove through the whole sheet needs no depth; foam out to the far paper says so. */
function sizeWords({ kind, widthMm, depthMm, note }: Operation, thicknessMm: number): (string | null)[] {
  if (TELLS_SIZE.test(note ?? '')) return [];
  const whole = depthMm === undefined || depthMm >= thicknessMm;
  return [
    widthMm === undefined ? null : fill(words.wide, { width: mm(widthMm) }),
    whole ? (kind === 'foamOut' ? words.through : null) : fill(words.deep, { depth: mm(depthMm) }),
  ];
}

const kindWords = ({ kind, angleDeg }: Operation): string =>
  kind === 'bevel' && angleDeg !== undefined
    ? fill(words.bevelAngle, { angle: mm(Math.abs(angleDeg)) })
    : words.kinds[kind];

/** One operation in words: what, how far it turns or leans, how wide and deep, and its note. */
function wordsOf(operation: Operation, thicknessMm: number): string {
  const said = [kindWords(operation), angleWords(operation), ...sizeWords(operation, thicknessMm)];
  const told = said.filter((text) => text !== null);
  const { note } = operation;
  if (note === undefined) return told.join(', ');
  const [kind = '', ...rest] = told;
  // "glue: both edges" needs no "glue" before it.
  if (note.startsWith(kind)) return [note, ...rest].join(', ');
  return fill(words.noted, { what: told.join(', '), note });
}

/** What is done on a face, in working order, equal lines counted: "2 × crease, fold 5° towards you". The arrow of the grain is no work. */
export function workOn(part: Part, face: Face): string[] {
  const lines = part.operations
    .filter((operation) => operation.face === face && operation.id !== GRAIN_ARROW)
    .sort((a, b) => ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind))
    .map((operation) => wordsOf(operation, part.thicknessMm));
  const openings = face === part.face ? part.holes.map(() => words.opening) : [];
  const counts = new Map<string, number>();
  for (const line of [...lines, ...openings]) counts.set(line, (counts.get(line) ?? 0) + 1);
  return [...counts].map(([what, count]) => fill(words.counted, { count, what }));
}

/** Which way the grain runs in the picture of the face that the part is drawn on, degrees from level; null: any way will do. */
export function grainText(pictureDeg: number | null): string {
  if (pictureDeg === null) return grainWords.any;
  const turned = ((pictureDeg % 180) + 180) % 180;
  const off = turned > 90 ? turned - 180 : turned;
  if (Math.abs(off) < 0.5) return grainWords.level;
  if (Math.abs(off) > 89.5) return grainWords.upright;
  return fill(off > 0 ? grainWords.rising : grainWords.falling, { angle: trimmedDigits(Math.abs(off), 0) });
}
