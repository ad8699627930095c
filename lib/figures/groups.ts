import { balanceFigures } from './balance';
import type { FigureContext, FigureGroupResult } from './context';
import { controlFigures } from './controls';
import { handlingFigures } from './handling';
import { highestLevelSpeedMs, levelFlight } from './levelFlight';
import { performanceFigures } from './performance';
import { structureFigures } from './structure';
import { trimFigures } from './trim';

/** Every group of figures that an aircraft with wing, lift and mass has. */
export function fullGroups(context: FigureContext): FigureGroupResult {
  const flight = levelFlight(context);
  const results = [
    balanceFigures(context),
    handlingFigures(context),
    trimFigures(context),
    performanceFigures(context, flight),
    controlFigures(context, highestLevelSpeedMs(flight)),
    structureFigures(context),
  ];
  return {
    figures: Object.assign({}, ...results.map(({ figures }) => figures)),
    charts: results.flatMap(({ charts = [] }) => charts),
    problems: results.flatMap(({ problems = [] }) => problems),
  };
}
