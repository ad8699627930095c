import type { Figures, FigureValue } from '@/lib/figures/types';
import { texts as stability } from '@/lib/text/en/figures/stability';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';

// The figures of the builder's card: what it weighs, how it balances and where to mark the CG. Places are given from points that a hand
// can find, never from the origin of the drawing.

const words = plan.cover;

export interface CardFigure {
  readonly name: string;
  /** Null when it could not be worked out; the notes then say why, where that is known. */
  readonly value: string | null;
  readonly unit: string;
  /** Under the number; the first line has the band. */
  readonly notes: readonly string[];
  /** Width on the page against its neighbours. */
  readonly share: number;
}

interface Shown {
  readonly name: string;
  readonly unit: string;
  readonly digits: number;
  readonly share?: number;
  readonly where?: string;
}

function shown(figure: FigureValue | undefined, { name, unit, digits, share = 1, where }: Shown): CardFigure {
  if (!figure || figure.value === null) {
    return { name, value: null, unit, notes: figure?.problem ? [figure.problem.message] : [], share };
  }
  const { value, band } = figure;
  const [low, high] = [band?.low ?? value, band?.high ?? value].map((end) => fixedDigits(end, digits));
  const spread = band ? ` · ${fill(words.band, { low: low ?? '', high: high ?? '' })} ${unit}` : '';
  const notes = [`${words.estimate}${spread}`, ...(where ? [where] : [])];
  return { name, value: fixedDigits(value, digits), unit, notes, share };
}

/** "foam 265 g, tubes 14 g": what the all-up mass was added up from. */
function countedWords({ inputs = [] }: FigureValue): string | undefined {
  if (inputs.length === 0) return undefined;
  const list = inputs.map(({ name, value, unit }) =>
    fill(words.countedItem, { name, value: fixedDigits(value, 0), unit }),
  );
  return fill(words.counted, { list: list.join(', ') });
}

/** Nearer than this two places are one: less than anyone can mark or balance to, mm. */
const SAME_MM = 1;

/** Which CG the static margin is for: that of the drawing is seldom where the first flight wants it. */
function marginWords({ values, marks: { firstFlightCgXMm } }: Figures): string | undefined {
  const drawn = values.cgXMm?.value ?? null;
  if (drawn === null || firstFlightCgXMm === null) return undefined;
  const behindMm = drawn - firstFlightCgXMm;
  if (Math.abs(behindMm) < SAME_MM) return words.marginDrawn;
  const mm = fixedDigits(Math.abs(behindMm), 0);
  return fill(behindMm > 0 ? words.marginBehind : words.marginAhead, { mm });
}

/** All-up mass with what was counted, static margin and stall speed, each with its band. */
export function estimateFigures(figures: Figures | null): CardFigure[] {
  const { allUpMassG, staticMarginPct, stallSpeedMs } = figures?.values ?? {};
  return [
    shown(allUpMassG, {
      name: words.mass,
      unit: words.massUnit,
      digits: 0,
      share: 1.4,
      where: allUpMassG && countedWords(allUpMassG),
    }),
    shown(staticMarginPct, {
      name: words.margin,
      unit: words.marginUnit,
      digits: 1,
      where: figures ? marginWords(figures) : undefined,
    }),
    shown(stallSpeedMs, { name: words.stall, unit: words.speedUnit, digits: 1 }),
  ];
}

const NOSES: Readonly<Record<string, string>> = {
  [stability.inputs.noseBody]: words.noses.body,
  [stability.inputs.noseBoom]: words.noses.boom,
  [stability.inputs.noseDrive]: words.noses.drive,
  [stability.inputs.noseSurface]: words.noses.surface,
};

/** How far from the centre line a figure is measured; earlier engines did not say. */
const outMm = (figure: FigureValue | undefined): number | null => figure?.inputs?.[0]?.value ?? null;

/** Where the CG range lies from the same place as a figure of the first-flight CG. */
function rangeWords(value: number, { marks: { cgRangeXMm, firstFlightCgXMm } }: Figures): string | null {
  if (!cgRangeXMm || firstFlightCgXMm === null) return null;
  const [low, high] = cgRangeXMm.map((x) => fixedDigits(value + x - firstFlightCgXMm, 0));
  return fill(words.range, { low: low ?? '', high: high ?? '', unit: words.lengthUnit });
}

interface Place {
  readonly name: string;
  readonly where: readonly string[];
}

const outWords = (y: number): string => fill(words.out, { y: fixedDigits(y, 0) });

function bodySidePlace(figure: FigureValue | undefined): Place {
  const y = outMm(figure);
  if (y === null) return { name: words.bodySide, where: [words.aftOfEdge] };
  if (y < SAME_MM) return { name: words.centre, where: [words.aftOfEdge] };
  return { name: words.bodySide, where: [words.aftOfEdge, outWords(y)] };
}

const stationPlace = (figure: FigureValue): Place => ({
  name: words.station,
  where: [words.aftOfEdge, outWords(outMm(figure) ?? 0)],
});

const nosePlace = ({ inputs }: FigureValue): Place => ({
  name: words.fromNose,
  where: [fill(words.fromNoseWhere, { nose: NOSES[inputs?.[0]?.name ?? ''] ?? words.noses.plain })],
});

/** The CG of the first flight from the body's side, from where fingers lift the wing, and from the nose. Earlier engines gave the first. */
export function cgFigures(figures: Figures | null): CardFigure[] {
  const { cgFromBodySideMm, firstFlightAtStationMm, firstFlightFromNoseMm } = figures?.values ?? {};
  const card = (figure: FigureValue | undefined, { name, where }: Place): CardFigure => {
    const plain = shown(figure, { name, unit: words.lengthUnit, digits: 0 });
    const value = figure?.value ?? null;
    if (!figures || value === null) return plain;
    const range = rangeWords(value, figures);
    return { ...plain, notes: [...where, range === null ? words.estimate : `${words.estimate} · ${range}`] };
  };
  return [
    card(cgFromBodySideMm, bodySidePlace(cgFromBodySideMm)),
    ...(firstFlightAtStationMm ? [card(firstFlightAtStationMm, stationPlace(firstFlightAtStationMm))] : []),
    ...(firstFlightFromNoseMm ? [card(firstFlightFromNoseMm, nosePlace(firstFlightFromNoseMm))] : []),
  ];
}
