import { radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { controlWithin, elementWithin } from '../names';
import type { ResolvedControl, ResolvedSurface } from '../resolved';
import { MIN_CONTROL_MM } from '../rules/limits';
import { thicknessOf } from '../rules/surface';
import type { Airframe } from '../schema/airframe';
import type { Control } from '../schema/surface';
import { panelAt } from '../section';
import { AFT, FORE, type Grip, inPlan, UPRIGHT_COS, withSurface } from './grip';

/** Least and largest share of the chord that the document holds for a control. */
const CHORD_SHARE: readonly [number, number] = [0.02, 1];

interface Context {
  readonly airframe: Airframe;
  readonly surface: ResolvedSurface;
  readonly placed: ResolvedControl;
}

const setControl = ({ airframe, surface, placed }: Context, change: (control: Control) => Control): Airframe =>
  withSurface(airframe, surface.surface.id, (one) => ({
    ...one,
    controls: one.controls.map((control) => (control.id === placed.control.id ? change(control) : control)),
  }));

const labelWords = ({ airframe, surface, placed }: Context) => ({
  control: controlWithin(surface.surface, placed.control),
  element: elementWithin(airframe, surface.surface.id),
});

/** How the ends run in plan: outward, or along x where the surface stands too steep to be dragged sideways. */
function endDirection(surface: ResolvedSurface, station: number) {
  const cos = Math.cos(radFromDeg(panelAt(surface, station).panel.rollDeg));
  if (Math.abs(cos) < UPRIGHT_COS) return { direction: AFT, perMm: 1 / surface.lengthMm };
  return { direction: [0, Math.sign(cos)] as const, perMm: 1 / (surface.lengthMm * Math.abs(cos)) };
}

function endGrip(context: Context, end: 'from' | 'to'): Grip {
  const { surface, placed } = context;
  const { control } = placed;
  const others = surface.surface.controls.filter(({ id }) => id !== control.id);
  const inside = others
    .filter(({ to }) => to <= control.from + 1e-9)
    .reduce<Control | null>((a, b) => (a && a.to > b.to ? a : b), null);
  const outside = others
    .filter(({ from }) => from >= control.to - 1e-9)
    .reduce<Control | null>((a, b) => (a && a.from < b.from ? a : b), null);
  const least = (MIN_CONTROL_MM + 2 * control.endGapMm) / surface.lengthMm;
  const value = control[end];
  const low = end === 'from' ? (inside?.to ?? 0) : control.from + least;
  const high = end === 'from' ? control.to - least : (outside?.from ?? 1);
  const rootWords = inside
    ? fill(texts.stops.controlInside, { other: controlWithin(surface.surface, inside) })
    : texts.stops.surfaceRoot;
  const tipWords = outside
    ? fill(texts.stops.controlOutside, { other: controlWithin(surface.surface, outside) })
    : texts.stops.surfaceTip;
  const words = labelWords(context);
  return {
    handle: {
      id: `${surface.surface.id}/${control.id}/${end}`,
      elementId: surface.surface.id,
      label: fill(end === 'from' ? texts.handles.controlFrom : texts.handles.controlTo, words),
      unit: 'share',
      value,
      min: Math.min(low, value),
      max: Math.max(high, value),
      step: 0.01,
      at: inPlan(end === 'from' ? placed.inner.te : placed.outer.te),
      ...endDirection(surface, value),
    },
    atMin: end === 'from' ? rootWords : texts.stops.controlInnerEnd,
    atMax: end === 'from' ? texts.stops.controlOuterEnd : tipWords,
    set: (next) => setControl(context, (one) => ({ ...one, [end]: next })),
  };
}

function chordGrip(context: Context, end: 'inner' | 'outer'): Grip {
  const { airframe, surface, placed } = context;
  const { control } = placed;
  const index = end === 'inner' ? 0 : 1;
  const section = placed[end];
  const sheet = thicknessOf(airframe, panelAt(surface, section.station).panel.panel.materialId) / section.chordMm;
  const value = control.chordShare[index];
  const min = Math.min(Math.max(CHORD_SHARE[0], sheet), value);
  const max = Math.max(Math.min(CHORD_SHARE[1], 1 - sheet), value);
  const stop = fill(texts.stops.chordShareLimit, { min: trimmedDigits(min, 3), max: trimmedDigits(max, 3) });
  return {
    handle: {
      id: `${surface.surface.id}/${control.id}/${end === 'inner' ? 'chordInner' : 'chordOuter'}`,
      elementId: surface.surface.id,
      label: fill(
        end === 'inner' ? texts.handles.controlChordInner : texts.handles.controlChordOuter,
        labelWords(context),
      ),
      unit: 'share',
      value,
      min,
      max,
      step: 0.01,
      at: inPlan(end === 'inner' ? placed.hingeInner : placed.hingeOuter),
      direction: FORE,
      perMm: 1 / section.chordMm,
    },
    atMin: stop,
    atMax: stop,
    set: (next) =>
      setControl(context, (one) => ({
        ...one,
        chordShare: index === 0 ? [next, one.chordShare[1]] : [one.chordShare[0], next],
      })),
  };
}

/** Handles of one surface's controls: both ends along it, and the chord at each end unless the whole surface moves. */
export function controlGrips(
  airframe: Airframe,
  surface: ResolvedSurface,
  controls: readonly ResolvedControl[],
): Grip[] {
  return controls
    .filter(({ surfaceId }) => surfaceId === surface.surface.id)
    .flatMap((placed): Grip[] => {
      const context: Context = { airframe, surface, placed };
      const ends = [endGrip(context, 'from'), endGrip(context, 'to')];
      if (placed.control.kind === 'allMoving') return ends;
      return [...ends, chordGrip(context, 'inner'), chordGrip(context, 'outer')];
    });
}
