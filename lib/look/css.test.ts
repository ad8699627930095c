import { describe, expect, it } from 'vitest';
import { LOOKS, lookCss, lookFrom } from './css';
import { dark, light, type Palette } from './tokens';

/** WCAG 2.2, "relative luminance" and "contrast ratio". */
const luminance = (hex: string): number => {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((value) => (value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
};
const contrast = (a: string, b: string): number => {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
};

const TEXT: readonly (keyof Palette)[] = ['ink', 'inkSoft', 'petrol', 'air', 'mass', 'control', 'good', 'watch', 'bad'];

describe.each([
  ['light', light],
  ['dark', dark],
])('%s palette', (_name, palette) => {
  it.each(TEXT)('%s reads on board and paper (WCAG AA, 4.5 to 1)', (token) => {
    expect(contrast(palette[token], palette.board)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(palette[token], palette.paper)).toBeGreaterThanOrEqual(4.5);
  });
  it('button text reads on petrol', () => {
    expect(contrast(palette.onPetrol, palette.petrol)).toBeGreaterThanOrEqual(4.5);
  });
  it('the mark of what is selected stands out from the board (WCAG 1.4.11, 3 to 1)', () => {
    expect(contrast(palette.tape, palette.board)).toBeGreaterThanOrEqual(3);
  });
});

describe('lookCss', () => {
  it('gives every role in both palettes the same variable names', () => {
    const names = (text: string) => new Set(text.match(/--[a-z-]+(?=:)/g));
    const [before = '', after = ''] = lookCss().split('@media');
    expect(names(after)).toEqual(names(before));
    expect(names(before).size).toBe(Object.keys(light).length);
    expect(before).toContain('--ink-soft:#51605A');
  });
  it('lets a choice of light win over a dark device', () => {
    expect(lookCss()).toContain(":root:not([data-look='light'])");
  });
});

describe('lookFrom', () => {
  it.each(LOOKS)('keeps %s', (look) => expect(lookFrom(look)).toBe(look));
  it.each([undefined, '', 'Dark', '<script>'])('takes %s for the device', (value) =>
    expect(lookFrom(value)).toBe('device'),
  );
});
