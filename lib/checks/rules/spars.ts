import { controlWithin } from '@/lib/airframe/names';
import { pointAt } from '@/lib/airframe/resolve';
import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Surface } from '@/lib/airframe/schema/surface';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Context, mm, result } from '../context';
import { SPAR } from '../practice';
import type { CheckResult } from '../types';

type Spar = Surface['spars'][number];

/** The longest spar against the inner end of the first control outside it: where the control begins the sheet is weakest. */
function reach(resolved: ResolvedSurface): CheckResult[] {
  const { surface, index, lengthMm } = resolved;
  const [spar] = [...surface.spars].sort((a, b) => b.to - a.to);
  const [control] = surface.controls.filter(({ kind }) => kind !== 'allMoving').sort((a, b) => a.from - b.from);
  if (!spar || !control) return [];
  const [has, least] = [spar.to * lengthMm, control.from * lengthMm];
  return [
    result('spar-reach', {
      elementId: surface.id,
      path: `surfaces.${index}.spars.${surface.spars.indexOf(spar)}.to`,
      at: pointAt(resolved, spar.to, spar.chordShare[1]),
      level: has > least ? 'ok' : 'watch',
      words: fill(texts.words.sparReach, { has: mm(has), least: mm(least), control: controlWithin(surface, control) }),
      measured: { value: has, quantity: 'mm', least },
      fix: fill(texts.rules['spar-reach'].fix, { least: mm(least) }),
      basis: SPAR.fromJointMm.basis,
    }),
  ];
}

interface End {
  readonly spar: Spar;
  readonly station: number;
  readonly share: number;
  /** To the nearest joint between panels, mm. */
  readonly fromJointMm: number;
}

/** Ends of spars where the sheet goes on: at neither root nor tip. */
function freeEnds({ surface, lengthMm, panels }: ResolvedSurface): End[] {
  const joints = panels.slice(0, -1).map(({ tip }) => tip.lengthMm);
  return surface.spars.flatMap((spar) =>
    [
      { spar, station: spar.from, share: spar.chordShare[0] },
      { spar, station: spar.to, share: spar.chordShare[1] },
    ]
      .filter(({ station }) => station > 0 && station < 1)
      .map((end) => {
        const away = joints.map((joint) => Math.abs(end.station * lengthMm - joint));
        return { ...end, fromJointMm: Math.min(...away, lengthMm) };
      }),
  );
}

/** Spars whose two halves end on the centre plane instead of going across it. */
const halvesMeet = ({ development }: Context, { surface, panels }: ResolvedSurface): Spar | undefined =>
  surface.spars.find((spar) => {
    const atMiddle = surface.mirrored && spar.from === 0 && Math.abs(panels[0]?.root.le[1] ?? 0) < SPAR.middleMm.value;
    const piece = development.stockPieces.find(({ key }) => key.startsWith(`${surface.id}/${spar.id}/`));
    return atMiddle && piece !== undefined && piece.count > 1;
  });

function joint(context: Context, resolved: ResolvedSurface): CheckResult[] {
  const { surface, index } = resolved;
  if (surface.spars.length === 0) return [];
  const pathOf = (spar: Spar): string => `surfaces.${index}.spars.${surface.spars.indexOf(spar)}`;
  const base = { elementId: surface.id, fix: texts.rules['spar-joint'].fix, basis: SPAR.fromJointMm.basis };
  const meeting = halvesMeet(context, resolved);
  if (meeting) {
    const at = pointAt(resolved, 0, meeting.chordShare[0]);
    return [
      result('spar-joint', { ...base, path: pathOf(meeting), at, level: 'watch', words: texts.words.sparHalves }),
    ];
  }
  const [worst] = freeEnds(resolved).sort((a, b) => a.fromJointMm - b.fromJointMm);
  if (!worst) return [];
  const limit = SPAR.fromJointMm.value;
  const kept = worst.fromJointMm >= limit;
  const values = { mm: mm(worst.fromJointMm), limit: mm(limit) };
  return [
    result('spar-joint', {
      ...base,
      path: pathOf(worst.spar),
      at: pointAt(resolved, worst.station, worst.share),
      level: kept ? 'ok' : 'watch',
      words: fill(kept ? texts.words.sparClear : texts.words.sparMeets, values),
      measured: { value: worst.fromJointMm, quantity: 'mm', least: limit },
    }),
  ];
}

/** Where the spars of wings and foreplanes end. */
export const sparRules = (context: Context): CheckResult[] =>
  context.resolved.surfaces
    .filter(({ surface }) => surface.role === 'wing' || surface.role === 'foreplane')
    .flatMap((resolved) => [...reach(resolved), ...joint(context, resolved)]);
