// A page that goes onto one sheet of paper, A4 or Letter: black on white whatever the screen shows, without what only a screen needs.

const BLACK = 'ink ink-soft rule petrol tape air mass control good watch bad'.split(' ');
const WHITE = 'board paper on-petrol'.split(' ');

const roles = (names: readonly string[], value: string): string => names.map((name) => `--${name}:${value}`).join(';');

/** Style text for the page. The triple root outranks the look that the device or the person chose. */
export const PRINT_SHEET =
  '@page{margin:10mm}@media print{' +
  `:root:root:root{color-scheme:light;${roles(BLACK, 'black')};${roles(WHITE, 'white')}}` +
  'html{background:white;font-size:12px;line-height:16px}' +
  '[data-bench]>:not(main),main>header :is(nav,a,button),[data-screen]{display:none}' +
  '[data-bench] main{padding:0;gap:3mm;max-width:none}' +
  '[data-bench] h1{font-size:20px;line-height:24px}' +
  '[data-bench] main :is(p,li,td,th,label,span){font-size:12px;line-height:16px}' +
  '[data-bench] main :is(label,td,th){min-height:0;padding-block:0.5mm}' +
  '}';
