import { parts as words } from '@/lib/text/en/partsPage';
import { plan } from '@/lib/text/en/plan';
import { ScoreLine } from '../ui/ScoreLine';
import type { PartGroup, PartPictures } from './drawings';
import { groupAnchor } from './elements';
import { LineSample } from './FacePicture';
import { boxId, filterStyle, materialMark } from './materialFilter';
import { PartEntry } from './PartEntry';
import type { PlanSprite } from './where';

const TARGET = 'inline-flex min-h-9 items-center bench:min-h-11 pointer-coarse:min-h-11';

const marks = (materials: readonly number[]): string => materials.map(materialMark).join(' ');

interface PartsViewProps {
  readonly pictures: PartPictures;
  readonly sprite: PlanSprite | null;
}

/** Every part, under what it belongs to, in building order. */
export function PartsView({ pictures, sprite }: PartsViewProps) {
  const { groups, materials } = pictures;
  return (
    <div data-parts="" className="grid grid-cols-1 gap-8">
      <div className="grid gap-2">
        <JumpLinks groups={groups} />
        {materials.length < 2 ? null : <MaterialFilter materials={materials} />}
        <LineKey kinds={pictures.kinds} />
      </div>
      {groups.map(({ id, name, drawings, materials: used }) => (
        <section
          key={id}
          id={groupAnchor(id)}
          aria-labelledby={`${groupAnchor(id)}-title`}
          data-materials={marks(used)}
          className="grid scroll-mt-4 grid-cols-1 gap-2"
        >
          <ScoreLine />
          <h3 id={`${groupAnchor(id)}-title`} className="pb-2 text-base">
            {name}
          </h3>
          {drawings.map((part) => (
            <PartEntry key={part.key} part={part} sprite={sprite} />
          ))}
        </section>
      ))}
    </div>
  );
}

function JumpLinks({ groups }: { readonly groups: readonly PartGroup[] }) {
  if (groups.length < 2) return null;
  return (
    <nav aria-label={words.jump}>
      <ul className="flex flex-wrap gap-x-5 text-sm">
        {groups.map(({ id, name, materials }) => (
          <li key={id} data-materials={marks(materials)}>
            <a href={`#${groupAnchor(id)}`} className={`${TARGET} text-petrol`}>
              {name}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function MaterialFilter({ materials }: { readonly materials: readonly string[] }) {
  const boxes = [{ id: 'material-all', text: words.all }, ...materials.map((text, i) => ({ id: boxId(i), text }))];
  return (
    <fieldset className="text-sm">
      <style>{filterStyle(materials.length)}</style>
      <legend className="text-ink-soft">{words.filter}</legend>
      <div className="flex flex-wrap gap-x-6">
        {boxes.map(({ id, text }, index) => (
          <label key={id} className={`${TARGET} gap-2`}>
            <input id={id} type="radio" name="material" defaultChecked={index === 0} className="size-4 shrink-0" />
            {text}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

function LineKey({ kinds }: { readonly kinds: PartPictures['kinds'] }) {
  return (
    <div className="grid gap-1 pt-2">
      <p className="text-sm text-ink-soft">{words.key}</p>
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,300px),1fr))] gap-x-8 gap-y-1 text-sm">
        {kinds.map((kind) => (
          <li key={kind} className="flex items-center gap-3">
            <LineSample kind={kind} />
            {plan.lines[kind]}
          </li>
        ))}
      </ul>
    </div>
  );
}
