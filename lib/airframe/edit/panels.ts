import { degFromRad, lerp3, radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { elementWithin } from '../names';
import type { ResolvedPanel, ResolvedSurface } from '../resolved';
import { MAX_SLENDERNESS } from '../rules/limits';
import { thicknessOf, thinnestSheet } from '../rules/surface';
import type { Airframe } from '../schema/airframe';
import { MAX_LENGTH_MM } from '../schema/limits';
import { AFT, type Grip, inPlan, OUT, UPRIGHT_COS, withPanels } from './grip';
import { withPanelLength } from './stations';

/** Shortest panel that a handle makes, mm: under it there is nothing to hold while it is glued. Common practice, no source. */
export const MIN_PANEL_MM = 10;
/** Sweep that a handle reaches either way, degrees: past it a panel is more tip than wing. Common practice, no source. */
export const MAX_SWEEP_DEG = 70;

const mm = (value: number) => trimmedDigits(value, 1);

/** The longest a surface may be for its thinnest sheet, and the words for it. */
function longest(airframe: Airframe, { surface, lengthMm }: ResolvedSurface): { max: number; words: string } {
  const sheet = thinnestSheet(airframe, surface) * MAX_SLENDERNESS;
  if (sheet >= MAX_LENGTH_MM) {
    return { max: Math.max(MAX_LENGTH_MM, lengthMm), words: fill(texts.stops.longest, { max: MAX_LENGTH_MM }) };
  }
  return {
    max: Math.max(sheet, lengthMm),
    words: fill(texts.stops.sheetCarries, { max: mm(sheet), ratio: MAX_SLENDERNESS }),
  };
}

interface Context {
  readonly airframe: Airframe;
  readonly surface: ResolvedSurface;
  readonly panel: ResolvedPanel;
  readonly base: { readonly elementId: string };
  readonly words: { readonly element: string; readonly panel: number };
}

/** What a number of a panel is called: a surface of one panel has no panels to speak of. */
const labelOf = ({ surface, words }: Context, alone: string, ofPanel: string): string =>
  fill(surface.panels.length === 1 ? alone : ofPanel, words);

/** A panel's length in the trade's words, when it is the whole surface: half the span, the height of what stands upright. */
function lengthWord({ surface, panel }: Context): string {
  if (Math.abs(Math.cos(radFromDeg(panel.rollDeg))) < UPRIGHT_COS) return texts.handles.height;
  return surface.surface.mirrored && surface.surface.role !== 'vtail' ? texts.handles.halfSpan : texts.handles.length;
}

const idOf = ({ surface, panel }: Context, what: string): string => `${surface.surface.id}/${panel.panel.id}/${what}`;

function lengthGrip(context: Context): Grip {
  const { airframe, surface, panel, base } = context;
  const cos = Math.cos(radFromDeg(panel.rollDeg));
  const upright = Math.abs(cos) < UPRIGHT_COS;
  const { max, words: atMax } = longest(airframe, surface);
  const value = panel.panel.lengthMm;
  return {
    handle: {
      ...base,
      id: idOf(context, 'length'),
      label: labelOf(context, lengthWord(context), texts.handles.panelLength),
      unit: 'mm',
      value,
      min: Math.min(MIN_PANEL_MM, value),
      max: max - (surface.lengthMm - value),
      step: 1,
      at: inPlan(lerp3(panel.tip.le, panel.tip.te, 0.25)),
      direction: upright ? AFT : [0, Math.sign(cos)],
      perMm: upright ? 1 : 1 / Math.abs(cos),
    },
    atMin: fill(texts.stops.shortest, { min: mm(Math.min(MIN_PANEL_MM, value)) }),
    atMax,
    set: (next) => withPanelLength(airframe, surface.surface.id, panel.index, next),
  };
}

function sweepGrip(context: Context): Grip {
  const { airframe, surface, panel, base } = context;
  const { sweepDeg, lengthMm } = panel.panel;
  const incidence = radFromDeg(surface.surface.incidenceDeg);
  const limit = Math.max(MAX_SWEEP_DEG, Math.abs(sweepDeg));
  const stop = fill(texts.stops.sweepLimit, { min: mm(-limit), max: mm(limit) });
  return {
    handle: {
      ...base,
      id: idOf(context, 'sweep'),
      label: labelOf(context, texts.handles.sweep, texts.handles.panelSweep),
      unit: 'deg',
      value: sweepDeg,
      min: -limit,
      max: limit,
      step: 0.5,
      at: inPlan(lerp3(panel.tip.le, panel.tip.te, 0.5)),
      direction: AFT,
      // x of the tip is length times tan(sweep) along the plate's chord; this is the slope of its inverse here.
      perMm: degFromRad(Math.cos(radFromDeg(sweepDeg)) ** 2 / lengthMm) / Math.cos(incidence),
    },
    atMin: stop,
    atMax: stop,
    set: (next) =>
      withPanels(airframe, surface.surface.id, (one, index) =>
        index === panel.index ? { ...one, sweepDeg: next } : one,
      ),
  };
}

/** The widest chord that a sheet of the panel's material holds in one piece, and the words for it. */
function widest(airframe: Airframe, materialId: string, value: number): { max: number; words: string } {
  const sheets = airframe.materials.find(({ id }) => id === materialId)?.sheets ?? [];
  const side = Math.min(MAX_LENGTH_MM, Math.max(0, ...sheets.flatMap(({ wMm, hMm }) => [wMm, hMm])));
  const words = fill(texts.stops.sheetSize, { material: materialId, max: mm(side) });
  return { max: Math.max(side, value), words };
}

/** Chord at one end of a panel. A neighbour that met it before meets it after: the edge stays whole. */
function chordGrip(context: Context, end: 'root' | 'tip'): Grip {
  const { airframe, surface, panel, base } = context;
  const field = end === 'root' ? 'rootChordMm' : 'tipChordMm';
  const neighbour = panel.index + (end === 'root' ? -1 : 1);
  const facing = end === 'root' ? 'tipChordMm' : 'rootChordMm';
  const value = panel.panel[field];
  const joined = surface.panels[neighbour]?.panel[facing] === value;
  const thickness = thicknessOf(airframe, panel.panel.materialId);
  const meets = joined ? thicknessOf(airframe, surface.panels[neighbour]?.panel.materialId) : 0;
  const section = panel[end];
  const most = widest(airframe, panel.panel.materialId, value);
  const cos = Math.cos(radFromDeg(section.incidenceDeg));
  const min = Math.min(Math.max(thickness, meets, 1), value);
  return {
    handle: {
      ...base,
      id: idOf(context, end === 'root' ? 'rootChord' : 'tipChord'),
      label:
        end === 'root'
          ? labelOf(context, texts.handles.rootChord, texts.handles.panelRootChord)
          : labelOf(context, texts.handles.tipChord, texts.handles.panelTipChord),
      unit: 'mm',
      value,
      min,
      max: most.max,
      step: 1,
      at: inPlan(section.te),
      direction: AFT,
      // The first root keeps its leading edge, every other section its quarter chord.
      perMm: end === 'root' && panel.index === 0 ? 1 / (0.25 + 0.75 * cos) : 1 / (0.75 * cos),
    },
    atMin: fill(texts.stops.sheetThickness, { min: mm(min) }),
    atMax: most.words,
    set: (next) =>
      withPanels(airframe, surface.surface.id, (one, index) => {
        if (index === panel.index) return { ...one, [field]: next };
        return joined && index === neighbour ? { ...one, [facing]: next } : one;
      }),
  };
}

/** Handles of one surface's panels: length, sweep, and the chord at each end that is not already another panel's. */
export function panelGrips(airframe: Airframe, surface: ResolvedSurface): Grip[] {
  const base = { elementId: surface.surface.id };
  const element = elementWithin(airframe, surface.surface.id);
  return surface.panels.flatMap((panel): Grip[] => {
    const words = { element, panel: panel.index + 1 };
    const context: Context = { airframe, surface, panel, base, words };
    const before = surface.panels[panel.index - 1];
    const ownRoot = before?.panel.tipChordMm !== panel.panel.rootChordMm;
    return [
      lengthGrip(context),
      ...(ownRoot ? [chordGrip(context, 'root')] : []),
      chordGrip(context, 'tip'),
      sweepGrip(context),
    ];
  });
}

/** Total span of a mirrored wing: it scales all panels' lengths in proportion, so joints and controls keep their shares. */
export function spanGrips(airframe: Airframe, surface: ResolvedSurface): Grip[] {
  const last = surface.panels.at(-1);
  if (surface.surface.role !== 'wing' || !surface.surface.mirrored || !last) return [];
  const grows = surface.panels.reduce(
    (sum, { panel, rollDeg }) => sum + panel.lengthMm * Math.cos(radFromDeg(rollDeg)),
    0,
  );
  if (grows < UPRIGHT_COS * surface.lengthMm) return [];
  const reach = Math.max(last.tip.le[1], last.tip.te[1]);
  const fixed = reach - grows;
  const spanAt = (factor: number) => 2 * (fixed + grows * factor);
  const { max, words } = longest(airframe, surface);
  const shortest = Math.min(...surface.panels.map(({ panel }) => panel.lengthMm));
  const least = Math.min(1, MIN_PANEL_MM / shortest);
  return [
    {
      handle: {
        id: `${surface.surface.id}/span`,
        elementId: surface.surface.id,
        label: fill(texts.handles.span, { element: elementWithin(airframe, surface.surface.id) }),
        unit: 'mm',
        value: 2 * reach,
        min: spanAt(least),
        max: spanAt(max / surface.lengthMm),
        step: 1,
        at: inPlan(last.tip.le),
        direction: OUT,
        perMm: 2,
      },
      atMin: fill(texts.stops.shortest, { min: mm(spanAt(least)) }),
      atMax: words,
      set: (next) => {
        const factor = (next / 2 - fixed) / grows;
        return withPanels(airframe, surface.surface.id, (one) => ({ ...one, lengthMm: one.lengthMm * factor }));
      },
    },
  ];
}
