import type { LineLook, Shape } from './lines';

const SHAPES: Readonly<Record<Shape, string>> = {
  disc: 'M-3.5 0a3.5 3.5 0 1 0 7 0a3.5 3.5 0 1 0-7 0z',
  square: 'M-3.25-3.25h6.5v6.5h-6.5z',
  triangle: 'M0-4.25 4.25 3.25h-8.5z',
  diamond: 'M0-4.5 4.5 0 0 4.5-4.5 0z',
};

/** The shape that stands at a line's end, around 0, 0. */
export const EndShape = ({ look }: { readonly look: LineLook }) => (
  <path d={SHAPES[look.shape]} fill="var(--paper)" stroke={look.stroke} strokeWidth="1.5" />
);

/** A piece of a line with its shape, for the key. */
export const LineSample = ({ look }: { readonly look: LineLook }) => (
  <svg width="44" height="16" viewBox="0 -8 44 16" aria-hidden="true" className="shrink-0">
    <line x2="38" stroke={look.stroke} strokeWidth={look.widthPx} strokeDasharray={look.dash} />
    <g transform="translate(38 0)">
      <EndShape look={look} />
    </g>
  </svg>
);
