import { resolveControl } from '@/lib/airframe/resolve';
import type { ResolvedSurface, Section } from '@/lib/airframe/resolved';
import type { Control } from '@/lib/airframe/schema/surface';
import { panelAt, sectionAt } from '@/lib/airframe/section';
import { cross3, dot3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { unit3 } from '@/lib/parts/shape/frame';
import type { PartFrame } from '@/lib/parts/types';
import { type AidSource, sheetMm } from './source';

// Where a throw gauge stands: beside an end of the control, square to its hinge.

export interface ThrowPlace {
  /** Origin on the hinge, x aft along the fixed surface, y up or to port. */
  readonly frame: PartFrame;
  /** Where fixed sheet with a trailing edge stands beside the control: its thickness, and how far its trailing edge is behind the hinge. mm. */
  readonly grip: { readonly thicknessMm: number; readonly edgeMm: number } | null;
}

/** Fixed sheet narrower than this beside a control holds no gauge, mm. */
const LEAST_GRIP_MM = 15;

/** Whether the surface beside an end of the control is fixed sheet for long enough: no tip shape, no body, no other control. */
function holds({ surface, lengthMm }: ResolvedSurface, control: Control, end: 'from' | 'to'): boolean {
  const others = surface.controls.filter(({ id }) => id !== control.id);
  const [a, b] =
    end === 'from'
      ? [control.from - LEAST_GRIP_MM / lengthMm, control.from]
      : [control.to, control.to + LEAST_GRIP_MM / lengthMm];
  // A body may cover as much of the root again.
  const free = end === 'from' ? a * lengthMm >= 4 * LEAST_GRIP_MM : b <= 1 && surface.tip.shape === 'square';
  return free && others.every(({ from, to }) => to <= a || from >= b);
}

/** Square to the hinge, like the millimetres of the set-up sheet. */
function frameAt({ le, te }: Section, hinge: Vec3, along: Vec3): PartFrame {
  const chord = sub3(te, le);
  const ex = unit3(sub3(chord, scale3(along, dot3(chord, along))));
  // Out of the upper face, and to port on an upright surface, whichever way that hangs.
  const out = cross3(ex, along);
  const turned = out[1] > Math.abs(out[2]);
  return { origin: hinge, ex, ey: turned ? scale3(out, -1) : out };
}

/** The place for one control's gauge. */
export function throwPlace(source: AidSource, surface: ResolvedSurface, control: Control): ThrowPlace {
  const ends = ['from', 'to'] as const;
  const { panel } = panelAt(surface, Math.min(1, Math.max(0, (control.from + control.to) / 2)));
  const sheet = panel.panel;
  const flat = sheet.section.kind === 'flat' && control.kind !== 'allMoving';
  const end = flat ? ends.find((one) => holds(surface, control, one)) : undefined;
  const at = end ?? 'to';
  const section = sectionAt(surface, control[at]);
  const { hingeInner, hingeOuter } = resolveControl(surface, control);
  const hinge = at === 'from' ? hingeInner : hingeOuter;
  const frame = frameAt(section, hinge, unit3(sub3(hingeOuter, hingeInner)));
  const edgeMm = dot3(sub3(section.te, hinge), frame.ex);
  return { frame, grip: end ? { thicknessMm: sheetMm(source.airframe, sheet.materialId), edgeMm } : null };
}
