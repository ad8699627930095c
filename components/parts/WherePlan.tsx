import { toDrawing } from '../thumbnail/frame';
import type { PlanSprite, Where } from './where';

const ALL = 'where-all';

/** The plan view in pieces, once on the page and out of sight: every small plan shows these. */
export function PlanPieces({ sprite }: { readonly sprite: PlanSprite }) {
  return (
    <svg aria-hidden="true" className="absolute size-0">
      <defs>
        {sprite.pieces.map(({ id, d }) => (
          <path key={id} id={id} d={d} vectorEffect="non-scaling-stroke" strokeLinejoin="round" />
        ))}
        <g id={ALL}>
          {sprite.pieces.map(({ id }) => (
            <use key={id} href={`#${id}`} />
          ))}
        </g>
      </defs>
    </svg>
  );
}

interface WherePlanProps {
  readonly sprite: PlanSprite;
  readonly label: string;
  readonly where: Where;
  readonly className: string;
}

/** A small plan view with what is meant filled, or its place marked. */
export function WherePlan({ sprite, label, where, className }: WherePlanProps) {
  const { widthMm, heightMm } = sprite.frame;
  const { pieces, at } = where;
  const place = at === null ? null : toDrawing(sprite.frame, at).map((mm) => Math.round(mm));
  return (
    <svg
      viewBox={`0 0 ${Math.round(widthMm)} ${Math.round(heightMm)}`}
      role="img"
      aria-label={label}
      className={`overflow-visible ${className}`}
    >
      <use href={`#${ALL}`} fill="none" stroke="var(--ink-soft)" strokeWidth="0.75" />
      {pieces.map((id) => (
        <use key={id} href={`#${id}`} fill="var(--ink)" fillOpacity="0.35" stroke="var(--ink)" strokeWidth="1.5" />
      ))}
      {place === null ? null : (
        <path
          d={`M${place.join(' ')}h0.01`}
          stroke="var(--ink)"
          strokeWidth="9"
          strokeLinecap="round"
          vectorEffect="non-scaling-stroke"
        />
      )}
    </svg>
  );
}
