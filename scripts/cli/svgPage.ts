import { createSVGWindow } from 'svgdom';
import type { SvgPage } from '@/lib/plan/svg/writeSvg';

/** A blank SVG page outside a browser. The DOM library reads font files from disk for text metrics, which is why it stays out of lib. */
export function svgPage(): SvgPage {
  const window = createSVGWindow();
  return { window, root: window.document.documentElement };
}
