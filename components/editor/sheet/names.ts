import type { Airframe } from '@/lib/airframe/schema/airframe';
import { elements } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';

export type ElementKind = 'body' | 'surface' | 'boom' | 'drive' | 'item' | 'gear';

export interface BoardElement {
  readonly id: string;
  readonly kind: ElementKind;
  readonly name: string;
}

interface Named {
  readonly id: string;
  readonly name?: string;
}

/** Names for a list: the person's own, else the kind's, numbered when several share it. */
function named<T extends Named>(list: readonly T[], kind: ElementKind, plain: (element: T) => string): BoardElement[] {
  const count = new Map<string, number>();
  for (const element of list) count.set(plain(element), (count.get(plain(element)) ?? 0) + 1);
  const seen = new Map<string, number>();
  return list.map((element) => {
    const name = plain(element);
    const number = (seen.get(name) ?? 0) + 1;
    seen.set(name, number);
    const own = (count.get(name) ?? 0) > 1 ? fill(elements.numbered, { name, number }) : name;
    return { id: element.id, kind, name: element.name ?? own };
  });
}

/** Everything that can be selected, in the order in which it is built: body, wing, booms, tail, power, then what goes in. */
export function boardElements(airframe: Airframe): readonly BoardElement[] {
  const surfaces = named(airframe.surfaces, 'surface', ({ role }) => elements.roles[role]);
  const wingIds = new Set(airframe.surfaces.filter(({ role }) => role === 'wing').map(({ id }) => id));
  return [
    ...named(airframe.bodies, 'body', ({ kind }) => elements.bodies[kind]),
    ...surfaces.filter(({ id }) => wingIds.has(id)),
    ...named(airframe.booms, 'boom', () => elements.boom),
    ...surfaces.filter(({ id }) => !wingIds.has(id)),
    ...named(airframe.drives, 'drive', ({ kind }) => elements.drives[kind]),
    ...named(airframe.items, 'item', ({ kind }) => elements.items[kind]),
    ...named(airframe.gear, 'gear', ({ kind }) => elements.gear[kind]),
  ];
}

/** Name of one element; its id when the document holds no such element. */
export const elementName = (airframe: Airframe, id: string): string =>
  boardElements(airframe).find((element) => element.id === id)?.name ?? id;
