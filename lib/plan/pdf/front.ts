import type { Figures } from '@/lib/figures/types';
import { plan } from '@/lib/text/en/plan';
import type { BuildNotes } from '../buildNotes';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet } from '../tiling/tileSheets';
import { cover, mapPage, mapPages } from './cover';
import type { Typefaces } from './fonts';
import type { PlanNames } from './furniture';
import { notesPages } from './notes';

export interface FrontInput {
  readonly sheets: readonly TiledSheet[];
  readonly figures: Figures | null;
  readonly build: BuildNotes | null;
  /** What the airframe holds and the sheets do not show, in words. */
  readonly notDrawn: readonly string[];
  readonly overlapMm: number;
}

/** What is known once all pages are counted. */
export interface FrontContext {
  readonly names: PlanNames;
  /** Page number of a tile by its index. */
  readonly pageOf: (index: number) => number;
}

export interface FrontPage {
  readonly kind: 'cover' | 'legend';
  readonly name: string;
  readonly ink: (faces: Typefaces, context: FrontContext) => string;
}

/** The pages before the first tile: the first page, further maps where one has no room for all sheets, then lines, joining, checks and key. */
export function frontPages(format: PageFormat, input: FrontInput): FrontPage[] {
  const maps = Array.from(
    { length: mapPages(input.sheets.length) },
    (_, i): FrontPage => ({
      kind: 'cover',
      name: plan.page.map,
      ink: (faces, context) => mapPage(faces, format, input.sheets, context.pageOf, i),
    }),
  );
  const first: FrontPage = {
    kind: 'cover',
    name: plan.page.cover,
    ink: (faces, context) => cover(faces, format, input, context),
  };
  return [first, ...maps, ...notesPages(format, input)];
}
