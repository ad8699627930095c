import { elements } from '@/lib/text/en/elements';
import { fill } from '@/lib/text/fill';
import type { Airframe } from './schema/airframe';
import type { Control, Surface } from './schema/surface';

// What everything on an aircraft is called: by the name its maker gave it, else by its kind. Ids are for documents.

export type ElementKind = 'body' | 'surface' | 'boom' | 'drive' | 'item' | 'gear';

export interface NamedElement {
  readonly id: string;
  readonly kind: ElementKind;
  readonly name: string;
  /** The name inside a sentence: a kind's own word without its capital, a given name as it is. */
  readonly within: string;
}

interface Nameable {
  readonly id: string;
  readonly name?: string | undefined;
}

/** "Servo 1" becomes "servo 1"; "V-tail" keeps the letter that is its shape. */
const lowered = (word: string): string =>
  /^[A-Z][a-z]/.test(word) ? word.charAt(0).toLowerCase() + word.slice(1) : word;

/** The kind's word for each of a list, numbered when several share it. */
function plainNames<T extends Nameable>(list: readonly T[], plain: (element: T) => string): string[] {
  const words = list.map(plain);
  return words.map((name, index) => {
    const alike = words.filter((word) => word === name).length;
    const number = words.slice(0, index + 1).filter((word) => word === name).length;
    return alike > 1 ? fill(elements.numbered, { name, number }) : name;
  });
}

function named<T extends Nameable>(
  list: readonly T[],
  kind: ElementKind,
  plain: (element: T) => string,
): NamedElement[] {
  const words = plainNames(list, plain);
  return list.map(({ id, name }, index) => {
    const own = words[index] ?? id;
    return { id, kind, name: name ?? own, within: name === undefined || name === own ? lowered(own) : name };
  });
}

/** Everything that can be selected, in the order in which it is built: body, wing, booms, tail, power, then what goes in. */
export function namedElements(airframe: Airframe): readonly NamedElement[] {
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
  namedElements(airframe).find((element) => element.id === id)?.name ?? id;

/** As `elementName`, as it stands inside a sentence. */
export const elementWithin = (airframe: Airframe, id: string): string =>
  namedElements(airframe).find((element) => element.id === id)?.within ?? id;

/** A control as it stands inside a sentence: "aileron", or "flap 2" when its surface has several of the kind. */
export function controlWithin({ controls }: Pick<Surface, 'controls'>, control: Pick<Control, 'id'>): string {
  const words = plainNames(controls, ({ kind }) => elements.controls[kind]);
  return lowered(words[controls.findIndex(({ id }) => id === control.id)] ?? control.id);
}
