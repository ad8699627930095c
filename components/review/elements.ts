import { controlWithin, namedElements } from '@/lib/airframe/names';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { controlOn } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';

export interface NamedElement {
  readonly id: string;
  readonly name: string;
}

/** Everything on the aircraft that a comment can be about, in building order, named as on the board; a control follows its surface. */
export function elementList(airframe: Airframe): readonly NamedElement[] {
  const surfaces = new Map(airframe.surfaces.map((surface) => [surface.id, surface]));
  return namedElements(airframe).flatMap(({ id, name, within }) => {
    const surface = surfaces.get(id);
    const controls = surface?.controls.map((control) => ({
      id: `${id}/${control.id}`,
      name: fill(controlOn, { what: controlWithin(surface, control), parent: within }),
    }));
    return [{ id, name }, ...(controls ?? [])];
  });
}

/** The name of an element by its key; the key itself when nothing has it. */
export const elementName = (list: readonly NamedElement[], key: string): string =>
  list.find(({ id }) => id === key)?.name ?? key;
