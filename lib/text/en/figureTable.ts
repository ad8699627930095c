// What each figure is called, what it means, how it is worked out, where that comes from and when not to trust it: one file a group.

import { balanceFigures } from './figureTable/balance';
import { controlsFigures } from './figureTable/controls';
import { handlingFigures } from './figureTable/handling';
import { performanceFigures } from './figureTable/performance';
import { shapeFigures } from './figureTable/shape';
import { stabilityFigures } from './figureTable/stability';
import { structureFigures } from './figureTable/structure';
import { trimFigures } from './figureTable/trim';

export const figureTexts = {
  ...shapeFigures,
  ...balanceFigures,
  ...stabilityFigures,
  ...handlingFigures,
  ...performanceFigures,
  ...trimFigures,
  ...controlsFigures,
  ...structureFigures,
} as const;
