import type { LineTypeKind } from '@/lib/look/lineTypes';
import { parts as words } from '@/lib/text/en/partsPage';
import type { FaceView } from './drawings';
import { strokeOf } from './faces';

/** Small parts are not blown up beyond this, px a mm. */
const MOST_PX_PER_MM = 2;

/** One face as it is seen when it lies up, with what is done on it. */
export function FacePicture({ view }: { readonly view: FaceView }) {
  const { drawing, label, caption, work } = view;
  const { widthMm, heightMm, edge, lines } = drawing;
  return (
    <figure className="grid min-w-0 content-start gap-2">
      <div className="film border border-rule p-3">
        <svg
          viewBox={`0 0 ${widthMm} ${heightMm}`}
          role="img"
          aria-label={label}
          className="mx-auto block max-h-72 w-full overflow-visible text-ink [&>path]:[vector-effect:non-scaling-stroke]"
          style={{ maxWidth: Math.round(widthMm * MOST_PX_PER_MM) }}
          fill="none"
          stroke="currentColor"
        >
          <path d={edge} fill="var(--paper)" fillRule="evenodd" {...strokeOf('cut')} />
          {lines.map(({ kind, d }) => (
            <path key={kind} d={d} {...strokeOf(kind)} />
          ))}
        </svg>
      </div>
      <figcaption className="grid gap-1 text-sm">
        <span className="font-[560]">{caption}</span>
        {work.length === 0 ? (
          <span className="text-ink-soft">{words.nothing}</span>
        ) : (
          <ul className="grid gap-0.5">
            {work.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        )}
      </figcaption>
    </figure>
  );
}

/** A piece of a line type, for the key. */
export function LineSample({ kind }: { readonly kind: LineTypeKind }) {
  const d = kind === 'register' ? 'M29 6h10M34 1v10' : 'M0 6h68';
  return (
    <svg viewBox="0 0 68 12" width="68" height="12" aria-hidden="true" className="shrink-0 text-ink">
      <path d={d} fill="none" stroke="currentColor" {...strokeOf(kind)} />
    </svg>
  );
}
