import type { ViewOutline } from '@/lib/airframe/outlines';

/** Size of a picture in the strip, px. */
const BOX = { w: 44, h: 26 } as const;

const COLOURS: Record<ViewOutline['kind'], string> = {
  surface: 'var(--ink)',
  control: 'var(--control)',
  body: 'var(--ink)',
  boom: 'var(--ink)',
  drive: 'var(--ink)',
  item: 'var(--mass)',
  gear: 'var(--ink)',
};

/** One part, drawn small, nose left. A part without lines in this view is an empty box. */
export function PartPicture({ lines }: { readonly lines: readonly ViewOutline[] }) {
  const points = lines.flatMap((line) => line.points);
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  if (points.length === 0) return <svg width={BOX.w} height={BOX.h} aria-hidden="true" />;
  const [left, right, low, high] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const scale = Math.min((BOX.w - 4) / Math.max(right - left, 1), (BOX.h - 4) / Math.max(high - low, 1));
  const place = ([x, y]: readonly [number, number]) =>
    `${(BOX.w / 2 + (x - (left + right) / 2) * scale).toFixed(1)} ${(BOX.h / 2 - (y - (low + high) / 2) * scale).toFixed(1)}`;
  return (
    <svg
      viewBox={`0 0 ${BOX.w} ${BOX.h}`}
      width={BOX.w}
      height={BOX.h}
      fill="none"
      strokeWidth="1.2"
      aria-hidden="true"
    >
      {lines.map((line) => (
        <path
          key={`${line.key} ${line.side}`}
          d={`M${line.points.map(place).join('L')}${line.closed ? 'Z' : ''}`}
          stroke={COLOURS[line.kind]}
        />
      ))}
    </svg>
  );
}
