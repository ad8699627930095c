import { elementWithin } from '@/lib/airframe/names';
import type { ResolvedSurface } from '@/lib/airframe/resolved';
import { pointAt, sectionAt } from '@/lib/airframe/section';
import { length3, sub3 } from '@/lib/numerics/vec';
import { barSection } from '@/lib/structure/barSection';
import { ellipticMoment, endDeflection, uniformMoment } from '@/lib/structure/beam';
import { beamOf, sparsAt } from '@/lib/structure/halfWing';
import { BAR, SPAR_SAFETY, type Stiffness } from '@/lib/structure/moduli';
import { texts } from '@/lib/text/en/figures/structure';
import { fill } from '@/lib/text/fill';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { trimmedDigits } from '@/lib/units/number';
import type { FigureGroupResult } from './context';
import { type FlexedOf, flexedWings } from './flexedWings';
import { LOAD_FACTOR } from './structureBands';
import { type StructureContext, twistFigures } from './twist';
import type { FigureValue } from './types';
import { doesNotApply, known } from './value';

/** Strength and stiffness: spar stress, tip deflection, and what twist does to the controls. */
export function structureFigures(context: StructureContext): FigureGroupResult {
  const flexed = flexedWings(context.airframe);
  const twist = twistFigures(context, flexed);
  return {
    figures: {
      sparStressMpa: sparStress(context, flexed),
      tipDeflection1gMm: tipDeflection(context, flexed),
      ...twist.figures,
    },
    problems: twist.problems,
  };
}

/** Mirrored wings, each with the weight that half of it carries at 1 g, N: by the areas. */
function loadedWings({ resolved, areas, balance }: StructureContext): { wing: ResolvedSurface; halfLoadN: number }[] {
  const areaOf = (id: string) => areas.surfaces.find(({ surface }) => surface.id === id)?.areaMm2 ?? 0;
  const wings = resolved.surfaces.filter(({ surface }) => surface.role === 'wing' && surface.mirrored);
  const whole = wings.reduce((sum, { surface }) => sum + areaOf(surface.id), 0);
  const weightN = (balance.massG / 1000) * STANDARD_GRAVITY;
  return wings.map((wing) => ({ wing, halfLoadN: ((weightN / 2) * areaOf(wing.surface.id)) / whole }));
}

interface Stressed {
  readonly stressMpa: number;
  readonly lowMpa: number;
  readonly highMpa: number;
  readonly strengthMpa: number;
  readonly momentNmm: number;
  readonly halfMm: number;
}

/** The spar that comes nearest to its strength, of all wings. */
function sparStress(context: StructureContext, flexed: FlexedOf): FigureValue {
  const { airframe, balance } = context;
  const loadFactor = airframe.flight.loadFactor ?? LOAD_FACTOR.value;
  const stressed = loadedWings(context).flatMap(({ wing, halfLoadN }) =>
    wing.surface.spars.flatMap((_, index) => sparOf(context, wing, halfLoadN * loadFactor, index, flexed)),
  );
  const worst = stressed.reduce<Stressed | null>(
    (most, next) => (most && most.stressMpa / most.strengthMpa >= next.stressMpa / next.strengthMpa ? most : next),
    null,
  );
  if (!worst) return doesNotApply(texts.problems.noSpar);
  return known(worst.stressMpa, {
    band: { low: worst.lowMpa, high: worst.highMpa, cause: texts.causes.spar },
    verdict: sparVerdict(worst, loadFactor),
    inputs: [
      { name: texts.inputs.loadFactor, value: loadFactor, unit: 'g' },
      { name: texts.inputs.mass, value: balance.massG, unit: 'g' },
      { name: texts.inputs.moment, value: worst.momentNmm / 1000, unit: 'N m' },
      { name: texts.inputs.strength, value: worst.strengthMpa, unit: 'MPa' },
      { name: texts.inputs.halfSpan, value: worst.halfMm, unit: 'mm' },
    ],
  });
}

function sparVerdict({ stressMpa, strengthMpa }: Stressed, loadFactor: number): NonNullable<FigureValue['verdict']> {
  if (stressMpa > strengthMpa)
    return { level: 'bad', words: fill(texts.verdicts.sparBad, { load: trimmedDigits(loadFactor, 1) }) };
  if (stressMpa * SPAR_SAFETY.value > strengthMpa)
    return { level: 'watch', words: fill(texts.verdicts.sparLow, { factor: SPAR_SAFETY.value }) };
  return { level: 'good', words: texts.verdicts.sparGood };
}

/** One spar at its inner end, with what runs beside it; spars share the moment by their bending stiffness. */
function sparOf(
  { airframe }: StructureContext,
  wing: ResolvedSurface,
  halfLoadN: number,
  index: number,
  flexed: FlexedOf,
): Stressed[] {
  const spar = wing.surface.spars[index];
  if (!spar || !(spar.to > spar.from)) return [];
  const beside = (stiffness: Stiffness) => sparsAt(airframe, wing, spar.from, stiffness);
  const own = beside('likely').find((bar) => bar.index === index);
  if (!own) return [];
  const inner = pointAt(wing, spar.from, spar.chordShare[0]);
  const outer = pointAt(wing, spar.to, spar.chordShare[1]);
  // The beam is as long as the spar's own line would be to the tip.
  const lean = length3(sub3(outer, inner)) / ((spar.to - spar.from) * wing.lengthMm);
  const [rootY, tipY] = [sectionAt(wing, 0).le[1], sectionAt(wing, 1).le[1]];
  // From the centre plane, so that what the body covers counts; a wing that stands upright has only its own length.
  const reach = Math.max(wing.lengthMm, tipY > rootY ? rootY + wing.lengthMm : 0);
  const halfMm = reach * lean;
  const atMm = (reach - wing.lengthMm * (1 - spar.from)) * lean;
  const { modulusMm3 } = barSection(own.tube);
  const stress = (momentNmm: number, wholeNmm2: number) => (momentNmm * own.bendingNmm2) / wholeNmm2 / modulusMm3;
  const bars = beside('likely').reduce((sum, bar) => sum + bar.bendingNmm2, 0);
  const withSheet = nearest(flexed(wing, 'high').strips, spar.from).bendingNmm2;
  const momentNmm = ellipticMoment(halfLoadN, halfMm, atMm);
  return [
    {
      stressMpa: stress(momentNmm, bars),
      lowMpa: stress(momentNmm, Math.max(withSheet, bars)),
      highMpa: stress(uniformMoment(halfLoadN, halfMm, atMm), bars),
      strengthMpa: own.tube.strengthMpa ?? BAR.strengthMpa.value,
      momentNmm,
      halfMm,
    },
  ];
}

function nearest<T extends { readonly station: number }>(strips: readonly T[], station: number): T {
  const found = strips.find((strip) => strip.station >= station) ?? strips.at(-1);
  if (!found) throw new RangeError('a wing without strips');
  return found;
}

/** How far the tip of the longest wing rises in level flight. */
function tipDeflection(context: StructureContext, flexed: FlexedOf): FigureValue {
  const loaded = loadedWings(context).sort((a, b) => b.wing.lengthMm - a.wing.lengthMm)[0];
  if (!loaded) return doesNotApply(texts.problems.noSpar);
  const { wing, halfLoadN } = loaded;
  const at = (stiffness: Stiffness) => {
    const beam = beamOf(flexed(wing, stiffness).strips);
    const lengthMm = beam.at(-1)?.toMm ?? 0;
    return endDeflection(beam, (s) => ellipticMoment(halfLoadN, lengthMm, Math.min(s, lengthMm)));
  };
  return known(at('likely'), {
    band: { low: at('high'), high: at('low'), cause: texts.causes.stiffness },
    inputs: [
      {
        name: fill(texts.inputs.wing, { surface: elementWithin(context.airframe, wing.surface.id) }),
        value: (2 * halfLoadN * 1000) / STANDARD_GRAVITY,
        unit: 'g',
      },
    ],
  });
}
