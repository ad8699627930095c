import type { Airframe } from '@/lib/airframe/schema/airframe';
import { elements as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';

export interface NamedElement {
  readonly id: string;
  readonly name: string;
}

const named = (id: string, own: string | undefined, what: string): NamedElement => ({ id, name: own ?? what });

/** Two servos or two fins read alike; their ids then tell them apart. */
function toldApart(list: readonly NamedElement[]): readonly NamedElement[] {
  const times = new Map<string, number>();
  for (const { name } of list) times.set(name, (times.get(name) ?? 0) + 1);
  return list.map(({ id, name }) => ({
    id,
    name: (times.get(name) ?? 0) > 1 ? fill(words.withId, { what: name, id }) : name,
  }));
}

/** Everything on the aircraft that a comment can be about, in building order, each with a name to read. */
export function elementList(airframe: Airframe): readonly NamedElement[] {
  const surfaces = airframe.surfaces.flatMap((surface) => {
    const own = named(surface.id, surface.name, words[surface.role]);
    const controls = surface.controls.map((control) => ({
      id: `${surface.id}/${control.id}`,
      name: fill(words.on, { what: words[control.kind], parent: own.name }),
    }));
    return [own, ...controls];
  });
  return toldApart([
    ...surfaces,
    ...airframe.bodies.map((body) => named(body.id, body.name, words[body.kind])),
    ...airframe.booms.map((boom) => named(boom.id, boom.name, words.boom)),
    ...airframe.drives.map((drive) => named(drive.id, drive.name, words[drive.kind])),
    ...airframe.items.map((item) => named(item.id, item.name, words[item.kind])),
    ...airframe.gear.map((gear) => named(gear.id, undefined, words[gear.kind])),
  ]);
}

/** The name of an element by its key; the key itself when nothing has it. */
export const elementName = (list: readonly NamedElement[], key: string): string =>
  list.find(({ id }) => id === key)?.name ?? key;
