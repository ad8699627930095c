import type { ReactNode } from 'react';
import { parts as words } from '@/lib/text/en/partsPage';
import { fill } from '@/lib/text/fill';
import { Value } from '../ui/Value';
import type { PartDrawing } from './drawings';
import { FacePicture } from './FacePicture';
import { materialMark } from './materialFilter';
import { WherePlan } from './WherePlan';
import type { PlanSprite } from './where';

/** Parts longer than this over their height have their faces one above the other. */
const LONG = 3.5;

/** A part: both faces, what is done on each, and what it is. */
export function PartEntry({ part, sprite }: { readonly part: PartDrawing; readonly sprite: PlanSprite | null }) {
  const [own, other] = part.faces;
  const long = own.drawing.widthMm > LONG * own.drawing.heightMm;
  return (
    <article
      id={`part-${part.key}`}
      data-material={materialMark(part.material)}
      className="grid grid-cols-1 gap-3 border-t border-rule pt-4 pb-6"
    >
      <h4 className="text-base">{part.name}</h4>
      <div className="grid grid-cols-1 gap-x-8 gap-y-4 lg:grid-cols-[minmax(0,1fr)_280px]">
        <div className={`grid grid-cols-1 content-start gap-4 ${long ? '' : 'sm:grid-cols-2'}`}>
          <FacePicture view={own} />
          <FacePicture view={other} />
        </div>
        <div className="flex flex-wrap content-start items-start gap-x-8 gap-y-4">
          <Facts part={part} />
          {sprite === null ? null : (
            <figure className="grid content-start gap-1 text-sm">
              <WherePlan
                sprite={sprite}
                where={part.where}
                label={fill(words.whereDrawn, { part: part.name })}
                className="h-28 max-w-48"
              />
              <figcaption className="text-ink-soft">{words.where}</figcaption>
            </figure>
          )}
        </div>
      </div>
    </article>
  );
}

function Facts({ part }: { readonly part: PartDrawing }) {
  const [width, height] = part.size;
  return (
    <dl className="grid grid-cols-[auto_1fr] content-start gap-x-4 gap-y-1 text-sm">
      <Fact name={words.counted}>
        <span className="figure">{part.count}</span>
        {part.pair === null ? null : <span className="block text-ink-soft">{part.pair}</span>}
      </Fact>
      <Fact name={words.size}>
        <Value text={`${width.number} × ${height.number}`} unit={height.unit} />
      </Fact>
      <Fact name={words.cutFrom}>{part.sheet}</Fact>
      <Fact name={words.mass}>
        {part.mass === null ? words.massMissing : <Value text={part.mass.number} unit={part.mass.unit} />}
      </Fact>
      <Fact name={words.grain}>{part.grain}</Fact>
    </dl>
  );
}

function Fact({ name, children }: { readonly name: string; readonly children: ReactNode }) {
  return (
    <>
      <dt className="text-ink-soft">{name}</dt>
      <dd className="min-w-0">{children}</dd>
    </>
  );
}
