import type { Figures } from '@/lib/figures/types';
import { plan } from '@/lib/text/en/plan';
import type { BuildNotes } from '../buildNotes';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet } from '../tiling/tileSheets';
import { cover } from './cover';
import type { Typefaces } from './fonts';
import type { PlanNames } from './furniture';
import { notesPages } from './notes';
import { setUpPages } from './setUpPage';

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

/** The pages before the first tile: the builder's card; scale, joining, checks, key and map; the set-up sheet, where the figures hold one. */
export function frontPages(format: PageFormat, input: FrontInput): FrontPage[] {
  const { setUp } = input.figures ?? {};
  const first: FrontPage = {
    kind: 'cover',
    name: plan.page.cover,
    ink: (faces, context) => cover(faces, format, input, context),
  };
  return [first, ...notesPages(format, input), ...(setUp ? setUpPages(format, setUp) : [])];
}
