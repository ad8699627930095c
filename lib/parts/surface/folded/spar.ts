import { upperHeight } from '@/lib/airframe/foldedSection';
import type { Tube } from '@/lib/airframe/schema/stock';
import type { Surface } from '@/lib/airframe/schema/surface';
import { pointAt } from '@/lib/airframe/section';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { add3, length3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import { texts as common } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Operation, StockPiece } from '../../types';
import type { Run } from '../run';
import { surfaceName, tooLong } from '../spar';
import { noseWidthMm } from './edge';
import { chordAt, faceAt, flatAt, innerHeight, type Shell } from './shell';

// Tubes in a folded panel: inside, on the lower skin beside the web, or let into the outer face of a skin.

export interface FoldedSpars {
  /** Work on the skins, each with the skin it belongs to. */
  readonly work: readonly { readonly skin: 'upper' | 'lower'; readonly operation: Operation }[];
  readonly stockPieces: readonly StockPiece[];
  readonly problems: readonly Problem[];
}

type Spar = Surface['spars'][number];
const NONE: FoldedSpars = { work: [], stockPieces: [], problems: [] };
const mm = (value: number): string => trimmedDigits(value, 1);

const refused = (...problems: readonly Problem[]): FoldedSpars => ({ ...NONE, problems });

interface Place {
  readonly run: Run;
  readonly shell: Shell;
  readonly spar: Spar;
  readonly tube: Tube;
  readonly path: string;
  /** Along the panel, 0 root to 1 tip, of the spar's two ends. */
  readonly along: readonly [number, number];
  readonly webStands: boolean;
}

function alongPanel(run: Run, { from, to }: Spar): readonly [number, number] {
  const [panel] = run.panels;
  if (!panel) throw new RangeError('a folded piece needs a panel');
  const span = panel.tip.station - panel.root.station;
  return [(from - panel.root.station) / span, (to - panel.root.station) / span];
}

/** Where a tube is looked at along its length. */
const STEPS = [0, 0.25, 0.5, 0.75, 1] as const;

interface Seat {
  readonly end: 'root' | 'tip';
  /** Room over the lower skin at the lower of the tube's two sides, mm; null where the tube leaves the closed part. */
  readonly roomMm: number | null;
  /** How far the tube's rear side stands behind the web's front face, and its front side before the web's rear face, mm. */
  readonly behindMm: number;
  readonly beforeMm: number;
}

function seatAt({ shell, spar, tube, along }: Place, t: number): Seat {
  const [a, b] = spar.chordShare;
  const share = a + (b - a) * t;
  const at = along[0] + (along[1] - along[0]) * t;
  const [widthMm] = tube.outerMm;
  const chord = chordAt(shell, at);
  const [fore, aft] = [share * chord - widthMm / 2, share * chord + widthMm / 2];
  const heights = [-widthMm / 2, widthMm / 2].map((aside) => innerHeight(shell, share, at, aside));
  const closed = fore >= noseWidthMm(shell) && aft <= shell.section.lowerTo * chord;
  const web = shell.section.webAt * chord;
  return {
    end: t <= 0.5 ? 'root' : 'tip',
    roomMm: closed ? Math.min(...heights) - shell.thicknessMm : null,
    behindMm: aft - web,
    beforeMm: web + shell.thicknessMm - fore,
  };
}

/** What is in the way of a tube that lies on the lower skin. */
function roomProblems(place: Place): Problem[] {
  const { tube, path, webStands } = place;
  const [widthMm, heightMm] = tube.outerMm;
  const seats = STEPS.map((t) => seatAt(place, t));
  const tight = seats.find(({ roomMm }) => roomMm === null || roomMm < heightMm);
  const at = `${path}.chordShare`;
  if (tight) {
    const room = mm(Math.max(0, tight.roomMm ?? 0));
    const message = fill(texts.problems.sparOutside, { tube: mm(heightMm), room, end: texts.ends[tight.end] });
    return [{ code: 'spar-outside-section', path: at, message, fix: texts.problems.sparOutsideFix }];
  }
  // Wholly ahead of the web all along, or wholly behind it: a tube that changes sides goes through it.
  const clear = seats.every(({ behindMm }) => behindMm <= 0) || seats.every(({ beforeMm }) => beforeMm <= 0);
  if (!webStands || clear) return [];
  const fix = fill(texts.problems.sparInWebFix, { clear: mm(widthMm / 2) });
  return [{ code: 'spar-in-web', path: at, message: texts.problems.sparInWeb, fix }];
}

function pieceOf({ run, shell, spar, tube, path }: Place, heightsMm: readonly [number, number]): FoldedSpars {
  const { surface } = run.surface;
  const ends = ([0, 1] as const).map(
    (i): Vec3 =>
      add3(pointAt(run.surface, i === 0 ? spar.from : spar.to, spar.chordShare[i]), scale3(shell.up, heightsMm[i])),
  );
  const [from, to] = ends;
  if (!from || !to) throw new RangeError('a spar has two ends');
  const values = { surface: surfaceName(surface), number: surface.spars.indexOf(spar) + 1 };
  const lengthMm = length3(sub3(to, from));
  const piece: StockPiece = {
    key: `${surface.id}/${spar.id}/tube`,
    name: fill(surface.spars.length > 1 ? common.names.sparOf : common.names.spar, values),
    tubeId: tube.id,
    lengthMm,
    count: surface.mirrored ? 2 : 1,
    from,
    to,
  };
  return { work: [], stockPieces: [piece], problems: tooLong(tube, lengthMm, `${path}.to`) };
}

function insideSpar(place: Place): FoldedSpars {
  const problems = roomProblems(place);
  if (problems.length > 0) return refused(...problems);
  const { shell, spar, tube, along } = place;
  const seat: Operation = {
    id: `${spar.id}-seat`,
    kind: 'reference',
    path: [flatAt(shell, 'lower', spar.chordShare[0], along[0]), flatAt(shell, 'lower', spar.chordShare[1], along[1])],
    closed: false,
    face: 'inner',
    widthMm: tube.outerMm[0],
    note: fill(texts.notes.tubeSeat, { tube: tube.id }),
  };
  const height = shell.thicknessMm + tube.outerMm[1] / 2;
  const made = pieceOf(place, [height, height]);
  return { ...made, work: [{ skin: 'lower', operation: seat }] };
}

function channelSpar(place: Place): FoldedSpars {
  const { shell, spar, tube, along, path } = place;
  const [widthMm, depthMm] = tube.outerMm;
  if (depthMm > shell.thicknessMm) {
    const message = fill(common.problems.sparTooHigh, { tube: mm(depthMm), sheet: mm(shell.thicknessMm) });
    return refused({ code: 'spar-too-high', path: `${path}.tubeId`, message, fix: common.problems.sparTooHighFix });
  }
  const [a, b] = spar.chordShare.map((share) => faceAt(shell, spar.face, share));
  if (a !== b) return refused(notBuiltYet(`${path}.chordShare`, texts.notBuilt.sparAcrossFold));
  if (spar.face === 'lower' && Math.max(...spar.chordShare) > shell.section.lowerTo)
    return refused({ code: 'spar-off-sheet', path: `${path}.chordShare`, message: common.problems.sparOffSheet });
  const channel: Operation = {
    id: `${spar.id}-channel`,
    kind: 'foamOut',
    path: [
      flatAt(shell, spar.face, spar.chordShare[0], along[0]),
      flatAt(shell, spar.face, spar.chordShare[1], along[1]),
    ],
    closed: false,
    face: 'outer',
    widthMm,
    depthMm,
    note: fill(common.notes.channel, { width: mm(widthMm), depth: mm(depthMm) }),
  };
  // The tube lies flush in the outer face.
  const outer = ([0, 1] as const).map((i) =>
    spar.face === 'lower'
      ? depthMm / 2
      : upperHeight(shell.section, spar.chordShare[i]) * chordAt(shell, along[i]) - depthMm / 2,
  );
  return { ...pieceOf(place, [outer[0] ?? 0, outer[1] ?? 0]), work: [{ skin: spar.face, operation: channel }] };
}

function placed(place: Place): FoldedSpars {
  switch (place.spar.let) {
    case 'inside':
      return insideSpar(place);
    case 'face':
      return channelSpar(place);
    case 'through':
      return refused(notBuiltYet(`${place.path}.let`, texts.notBuilt.through));
  }
}

/** Every spar that begins on this panel. */
export function foldedSpars(run: Run, shell: Shell, tubes: ReadonlyMap<string, Tube>, webStands: boolean): FoldedSpars {
  const start = run.panels[0]?.root.station ?? 0;
  const end = run.panels[0]?.tip.station ?? 1;
  const found = run.surface.surface.spars.map((spar, index): FoldedSpars => {
    const path = `surfaces.${run.surface.index}.spars.${index}`;
    if (spar.from < start || spar.from >= end) return NONE;
    if (spar.to > end + 1e-9)
      return refused({ code: 'spar-across-joint', path: `${path}.to`, message: common.problems.sparAcrossJoint });
    const tube = tubes.get(spar.tubeId ?? '');
    if (!tube) return refused(notBuiltYet(`${path}.materialId`, common.notBuilt.sparLet));
    return placed({ run, shell, spar, tube, path, along: alongPanel(run, spar), webStands });
  });
  return {
    work: found.flatMap(({ work }) => work),
    stockPieces: found.flatMap(({ stockPieces }) => stockPieces),
    problems: found.flatMap(({ problems }) => problems),
  };
}
