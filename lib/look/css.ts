import { dark, light, type Palette } from './tokens';

// The page's colours as CSS variables, written from the one table of tokens, and the fonts that come with the application.

const kebab = (name: string) => name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);

const variables = (palette: Palette): string =>
  Object.entries(palette)
    .map(([name, value]) => `--${kebab(name)}:${value}`)
    .join(';');

const face = (family: string, file: string, rest: string): string =>
  `@font-face{font-family:'${family}';src:url('/fonts/${file}') format('woff2');font-display:swap;font-style:normal;${rest}}`;

// The extended file is only fetched by a page that holds such a letter.
const LATIN =
  'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD';
const LATIN_EXTENDED =
  'U+0100-0130,U+0132-0151,U+0154-02BA,U+02BD-02C5,U+02C7-02D9,U+02DB,U+02DD-02FF,U+1E00-1E9F,U+1EF2-1EFF';
// A full stop as wide as a digit tears a number apart, so the stop and the comma are taken from the text face.
const FIGURES_RANGE = 'U+0020-002B,U+002D,U+002F-00FF,U+2000-206F,U+2212';

const faces = [
  face('Archivo', 'archivo.woff2', `font-weight:100 900;font-stretch:62% 125%;unicode-range:${LATIN}`),
  face('Archivo', 'archivo-ext.woff2', `font-weight:100 900;font-stretch:62% 125%;unicode-range:${LATIN_EXTENDED}`),
  face('B612 Mono', 'b612-mono-400.woff2', `font-weight:400;unicode-range:${FIGURES_RANGE}`),
  face('B612 Mono', 'b612-mono-700.woff2', `font-weight:700;unicode-range:${FIGURES_RANGE}`),
].join('');

/** The look a person chose for this browser, or what the device says. */
export const LOOKS = ['device', 'light', 'dark'] as const;
export type Look = (typeof LOOKS)[number];

/** Reads a stored choice; anything unknown is the device's own. */
export const lookFrom = (stored: string | undefined): Look => LOOKS.find((look) => look === stored) ?? 'device';

/** Style text for the head of every page: fonts, the light roles, and the dark ones by device or by choice. */
export const lookCss = (): string =>
  `${faces}:root{color-scheme:light;${variables(light)}}` +
  `@media (prefers-color-scheme:dark){:root:not([data-look='light']){color-scheme:dark;${variables(dark)}}}` +
  `:root[data-look='dark']{color-scheme:dark;${variables(dark)}}`;
