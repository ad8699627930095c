import type { Problem } from '@/lib/numerics/result';
import { length3, lerp3, sub3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { resolveControl } from '../resolve';
import type { ResolvedSurface } from '../resolved';
import type { Airframe } from '../schema/airframe';
import type { Control } from '../schema/surface';
import { panelAt } from '../section';
import { HINGE_BEND_DEG, HINGE_STRAIGHT_MM, MIN_CONTROL_MM } from './limits';
import { thicknessOf } from './surface';

const words = texts.problems;
const mm = (value: number) => trimmedDigits(value, 2);
const shareText = (value: number) => trimmedDigits(value, 4);

/** Length of a control along its surface between its end gaps, mm. */
export const controlLength = (surfaceLengthMm: number, { from, to, endGapMm }: Control): number =>
  (to - from) * surfaceLengthMm - 2 * endGapMm;

function checkWidths(surface: ResolvedSurface, control: Control, airframe: Airframe, path: string): Problem[] {
  const { inner, outer } = resolveControl(surface, control);
  const ends = [
    { end: 'inner', section: inner, share: control.chordShare[0], index: 0 },
    { end: 'outer', section: outer, share: control.chordShare[1], index: 1 },
  ];
  return ends.flatMap(({ end, section, share, index }): Problem[] => {
    const thickness = thicknessOf(airframe, panelAt(surface, section.station).panel.panel.materialId);
    const whole = control.kind === 'allMoving';
    const chord = section.chordMm * (whole ? 1 : share);
    const left = section.chordMm - chord;
    const values = { id: control.id, end, thickness: mm(thickness) };
    if (chord < thickness) {
      const message = fill(words.controlTooNarrow, { ...values, chord: mm(chord) });
      return [{ code: 'control-too-narrow', path: `${path}.chordShare.${index}`, message }];
    }
    if (!whole && left < thickness) {
      const message = fill(words.controlLeavesNothing, { ...values, left: mm(left) });
      return [{ code: 'control-leaves-nothing', path: `${path}.chordShare.${index}`, message }];
    }
    return [];
  });
}

/** A hinge is one straight line: where a control crosses a joint between panels, the joint must neither bend it nor kink it. */
function checkHinge(surface: ResolvedSurface, control: Control, path: string): Problem[] {
  if (control.kind === 'allMoving') return [];
  const { hingeInner, hingeOuter } = resolveControl(surface, control);
  return surface.panels.slice(0, -1).flatMap((inner, index): Problem[] => {
    const outer = surface.panels[index + 1];
    const station = inner.tip.station;
    if (!outer || station <= control.from + 1e-9 || station >= control.to - 1e-9) return [];
    const along = (station - control.from) / (control.to - control.from);
    const share = control.chordShare[0] + (control.chordShare[1] - control.chordShare[0]) * along;
    const line = lerp3(hingeInner, hingeOuter, along);
    const [a, b] = [inner.tip, outer.root].map(({ le, te }) => length3(sub3(lerp3(le, te, 1 - share), line)));
    const straight = Math.max(a ?? 0, b ?? 0) <= HINGE_STRAIGHT_MM;
    if (straight && Math.abs(outer.rollDeg - inner.rollDeg) <= HINGE_BEND_DEG) return [];
    const message = fill(words.hingeBends, { id: control.id, inner: inner.panel.id, outer: outer.panel.id });
    return [
      {
        code: 'hinge-bends',
        path: `${path}.to`,
        message,
        fix: fill(words.hingeBendsFix, { station: shareText(station) }),
      },
    ];
  });
}

function checkControl(surface: ResolvedSurface, control: Control, airframe: Airframe, path: string): Problem[] {
  const { id, from, to } = control;
  if (to <= from) {
    const message = fill(words.controlEndsFirst, { id, from: shareText(from), to: shareText(to) });
    return [{ code: 'control-ends-before-it-begins', path: `${path}.to`, message }];
  }
  const length = controlLength(surface.lengthMm, control);
  if (length < MIN_CONTROL_MM) {
    const message = fill(words.controlTooShort, { id, length: mm(length), min: MIN_CONTROL_MM });
    return [{ code: 'control-too-short', path: `${path}.to`, message }];
  }
  return [...checkWidths(surface, control, airframe, path), ...checkHinge(surface, control, path)];
}

function checkOverlaps({ surface, index }: ResolvedSurface): Problem[] {
  return surface.controls.flatMap((control, c) =>
    surface.controls.slice(0, c).flatMap((other): Problem[] => {
      const from = Math.max(control.from, other.from);
      const to = Math.min(control.to, other.to);
      if (to - from <= 1e-9) return [];
      const message = fill(words.controlsOverlap, {
        id: control.id,
        other: other.id,
        surface: surface.id,
        from: shareText(from),
        to: shareText(to),
      });
      return [{ code: 'controls-overlap', path: `surfaces.${index}.controls.${c}.from`, message }];
    }),
  );
}

/** What makes the controls of a surface impossible to cut or to hinge: problems at the field. */
export function checkControls(surface: ResolvedSurface, airframe: Airframe): Problem[] {
  const { index } = surface;
  return [
    ...surface.surface.controls.flatMap((control, c) =>
      checkControl(surface, control, airframe, `surfaces.${index}.controls.${c}`),
    ),
    ...checkOverlaps(surface),
  ];
}
