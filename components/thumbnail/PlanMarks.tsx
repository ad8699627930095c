import type { FigureMarks } from '@/lib/figures/types';
import { sheet } from '@/lib/text/en/review';
import { type Frame, percentAt, toDrawing } from './frame';
import { CgSign, NpSign } from './signs';

/** MAC, CG range, neutral point and CG over the plan. The signs keep their size whatever the drawing's scale. */
export function PlanMarks({ frame, marks }: { readonly frame: Frame; readonly marks: FigureMarks }) {
  const { mac, neutralPointXMm, cgRangeXMm, cg } = marks;
  const line = (x0: number, x1: number, y: number) => {
    const [ax, ay] = toDrawing(frame, [x0, y]);
    return { x1: ax, y1: ay, x2: ax + (x1 - x0), y2: ay };
  };
  return (
    <>
      <svg
        viewBox={`0 0 ${frame.widthMm} ${frame.heightMm}`}
        preserveAspectRatio="none"
        aria-hidden="true"
        className="pointer-events-none absolute inset-0 size-full text-air"
        stroke="currentColor"
      >
        {mac === null ? null : (
          <line
            {...line(mac.leXMm, mac.leXMm + mac.lengthMm, mac.yMm)}
            strokeWidth="2"
            vectorEffect="non-scaling-stroke"
          />
        )}
        {cgRangeXMm === null ? null : (
          <line
            {...line(cgRangeXMm[0], cgRangeXMm[1], 0)}
            strokeWidth="9"
            strokeOpacity="0.35"
            vectorEffect="non-scaling-stroke"
          />
        )}
      </svg>
      {mac === null ? null : (
        <Label
          place={percentAt(frame, [mac.leXMm + mac.lengthMm / 2, mac.yMm])}
          className="-translate-y-full text-air"
          text={sheet.mac}
        />
      )}
      {neutralPointXMm === null ? null : (
        <Sign place={percentAt(frame, [neutralPointXMm, 0])} className="text-air" text={sheet.np} below>
          <NpSign />
        </Sign>
      )}
      {cg === null ? null : (
        <Sign place={percentAt(frame, [cg[0], cg[1]])} className="text-mass" text={sheet.cg}>
          <CgSign />
        </Sign>
      )}
    </>
  );
}

interface Placed {
  readonly place: { readonly left: string; readonly top: string };
  readonly className: string;
  readonly text: string;
}

function Label({ place, className, text }: Placed) {
  return (
    <span
      aria-hidden="true"
      style={place}
      className={`figure pointer-events-none absolute -translate-x-1/2 rounded-cut bg-paper/80 px-1 text-xs ${className}`}
    >
      {text}
    </span>
  );
}

function Sign({
  place,
  className,
  text,
  below = false,
  children,
}: Placed & { readonly below?: boolean; readonly children: React.ReactNode }) {
  return (
    <span aria-hidden="true" style={place} className={`pointer-events-none absolute size-0 ${className}`}>
      <span className="absolute -top-2 -left-2 size-4">{children}</span>
      <span
        className={`figure absolute -translate-x-1/2 rounded-cut bg-paper/80 px-1 text-xs ${below ? 'top-2.5' : 'bottom-2.5'}`}
      >
        {text}
      </span>
    </span>
  );
}
