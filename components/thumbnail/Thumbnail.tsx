import type { Vec2 } from '@/lib/numerics/vec';
import { frameAround, pathData } from './frame';

/**
 * A design's own picture, drawn from its outlines; nothing but lines, so that it prints and darkens with the page.
 * An empty label says that the words beside it say the same.
 */
export function Thumbnail({
  outlines,
  label,
}: {
  readonly outlines: readonly (readonly Vec2[])[];
  readonly label: string;
}) {
  const frame = frameAround(outlines, 0.06);
  if (frame === null) return <div className="film aspect-4/3 w-full border border-rule" />;
  return (
    <div className="film aspect-4/3 w-full border border-rule p-2">
      <svg
        viewBox={`0 0 ${frame.widthMm} ${frame.heightMm}`}
        className="size-full text-ink"
        role="img"
        aria-label={label}
        aria-hidden={label === ''}
      >
        {outlines.map((points, index) => (
          <path
            // The list never changes order: it is drawn once from a frozen summary.
            // biome-ignore lint/suspicious/noArrayIndexKey: outlines of a summary carry no id
            key={index}
            d={pathData(frame, points, true)}
            fill="var(--paper)"
            fillOpacity="0.6"
            stroke="currentColor"
            strokeWidth="1.25"
            strokeLinejoin="round"
            vectorEffect="non-scaling-stroke"
          />
        ))}
      </svg>
    </div>
  );
}
