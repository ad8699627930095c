import { plan } from '@/lib/text/en/plan';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet } from '../tiling/tileSheets';
import { heading } from './column';
import type { FrontPage } from './front';
import { type Frame, map } from './map';

/** Sheets on one page of maps. */
const MOST_SHEETS = 20;

/** The sheets and their pages, on pages of their own. */
export function mapPages(format: PageFormat, sheets: readonly TiledSheet[]): FrontPage[] {
  const [x0, y0, x1, y1] = format.clipMm;
  return Array.from({ length: Math.ceil(sheets.length / MOST_SHEETS) }, (_, i): FrontPage => {
    const some = sheets.slice(i * MOST_SHEETS, (i + 1) * MOST_SHEETS);
    return {
      kind: 'cover',
      name: plan.page.map,
      ink: (faces, { pageOf }) => {
        const head = heading(faces, plan.cover.map, { x: x0, widthMm: x1 - x0 }, y1 - 2);
        const frame: Frame = { x: x0, y: y0 + 2, w: x1 - x0, h: head.top - y0 - 2 };
        return [head.ink, map(faces, some, frame, pageOf)].join('\n');
      },
    };
  });
}
