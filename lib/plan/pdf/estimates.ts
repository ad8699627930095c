import type { Figures } from '@/lib/figures/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import type { Typefaces } from './fonts';
import { letter, shorten } from './ink';
import type { Frame } from './map';

const words = plan.cover;

interface Shown {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  readonly digits: number;
  readonly where?: string;
}

/** What a builder needs before anything is cut. The CG is given from a point that can be touched, never from the datum. */
const SHOWN: readonly Shown[] = [
  { id: 'allUpMassG', name: words.mass, unit: words.massUnit, digits: 0 },
  { id: 'cgFromBodySideMm', name: words.cg, unit: words.lengthUnit, digits: 0, where: words.cgWhere },
  { id: 'stallSpeedMs', name: words.stall, unit: words.speedUnit, digits: 1 },
];

/** The three figures side by side, each called an estimate, with its band where it has one. Top-down in the frame, 18 mm. */
export function estimates(faces: Typefaces, figures: Figures | null, frame: Frame): string {
  const w = frame.w / SHOWN.length;
  const top = frame.y + frame.h;
  return SHOWN.flatMap(({ id, name, unit, digits, where }, i) => {
    const x = frame.x + i * w;
    const figure = figures?.values[id];
    const known = figure && figure.value !== null;
    const value = known ? fixedDigits(figure.value ?? 0, digits) : words.notKnown;
    const band = figure?.band
      ? ` · ${fill(words.band, { low: fixedDigits(figure.band.low, digits), high: fixedDigits(figure.band.high, digits) })} ${unit}`
      : '';
    const big = { face: 'mono', capMm: known ? 4.6 : 2.4 } as const;
    const small = { face: 'text', capMm: 1.9 } as const;
    const width = faces.mono.width(value, big.capMm);
    return [
      letter(faces, name, [x, top - 2], small),
      letter(faces, value, [x, top - 8.6], big),
      known ? letter(faces, unit, [x + width + 1.4, top - 8.6], { face: 'text', capMm: 2.6 }) : '',
      known ? letter(faces, shorten(faces, `${words.estimate}${band}`, w - 3, small), [x, top - 12.4], small) : '',
      where && known ? letter(faces, shorten(faces, where, w - 3, small), [x, top - 16], small) : '',
    ];
  })
    .filter(Boolean)
    .join('\n');
}
