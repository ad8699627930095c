import { Svg, withWindow } from '@svgdotjs/svg.js';
import { LINE_TYPE_KINDS } from '@/lib/look/lineTypes';
import type { Drawing, DrawnText } from '../drawing';
import { fixed } from '../fixed';

// One sheet as SVG: user units are millimetres, one group an operation, every stroke in one colour.

/** A blank SVG page to draw on: in a browser its own window, elsewhere one that the caller makes. A new one for each sheet. */
export interface SvgPage {
  readonly window: Window;
  readonly root: SVGSVGElement;
}

/** Characters that XML 1.0 cannot hold even escaped. */
const plainText = (text: string): string => text.replaceAll(/[\p{Cc}\p{Cs}\uFFFE\uFFFF]/gu, ' ');

const anchor = (align: DrawnText['align']): string => {
  switch (align) {
    case 'left':
      return 'start';
    case 'centre':
      return 'middle';
    case 'right':
      return 'end';
  }
};

function addTexts(svg: Svg, drawing: Drawing): void {
  const [, h] = drawing.sheetMm;
  const names = svg.group().id('names').attr({ fill: '#000000', stroke: 'none' });
  for (const { at, text, heightMm, angleDeg, font, align } of drawing.texts) {
    const [x, y] = [fixed(at[0]), fixed(h - at[1])];
    names.plain(plainText(text)).attr({
      x,
      y,
      'font-family': font === 'mono' ? 'B612 Mono, monospace' : 'Archivo, sans-serif',
      // A capital is about 0.7 of the font size in both faces.
      'font-size': fixed(heightMm / 0.7),
      'text-anchor': anchor(align),
      'dominant-baseline': 'central',
      transform: `rotate(${fixed(-angleDeg)} ${x} ${y})`,
    });
  }
}

/** The drawing as SVG text, y downwards as the format has it. Texts are escaped by the writer; the same input gives the same text. */
export function writeSvg(drawing: Drawing, page: SvgPage): string {
  return withWindow(page.window, () => {
    const svg = new Svg(page.root);
    const [w, h] = drawing.sheetMm;
    svg.attr({ width: `${fixed(w)}mm`, height: `${fixed(h)}mm`, viewBox: `0 0 ${fixed(w)} ${fixed(h)}` });
    svg.element('title').words(plainText(`${drawing.name} · ${drawing.material}`));
    const key = drawing.key.map(({ mark, text }) => (mark === null ? text : `${mark} = ${text}`));
    if (key.length > 0) svg.element('desc').words(plainText(key.join('; ')));
    for (const kind of LINE_TYPE_KINDS) {
      const lines = drawing.lines.filter(({ type }) => type === kind);
      if (lines.length === 0) continue;
      const operation = svg.group().id(kind);
      operation.attr({ fill: 'none', stroke: '#000000', 'stroke-width': fixed(drawing.strokeMm) });
      for (const { points, closed } of lines) {
        const steps = points.map(([x, y], i) => `${i === 0 ? 'M' : 'L'}${fixed(x)} ${fixed(h - y)}`);
        operation.path(`${steps.join('')}${closed ? 'Z' : ''}`);
      }
    }
    addTexts(svg, drawing);
    return `<?xml version="1.0" encoding="UTF-8"?>\n${svg.svg()}\n`;
  });
}
