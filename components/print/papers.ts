import { PAPERS } from '@/lib/plan/paper';
import { trimmedDigits } from '@/lib/units/number';
import type { PaperChoice } from './PrintDesk';

/** What stands in ordinary printers; plotters come with whole sheets. */
export const PRINTER_PAPERS: readonly PaperChoice[] = [PAPERS.a4, PAPERS.letter, PAPERS.a3].map(
  ({ id, name, wMm, hMm }) => ({
    id,
    name,
    size: `${trimmedDigits(wMm, 1)} × ${trimmedDigits(hMm, 1)} mm`,
  }),
);
