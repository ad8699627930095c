import { namedElements } from '@/lib/airframe/names';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Part } from '@/lib/parts/types';
import { parts as words } from '@/lib/text/en/partsPage';

// What a part belongs to, in the order in which an aircraft is built.

export interface Owner {
  readonly id: string;
  readonly name: string;
}

export interface OwnedParts extends Owner {
  readonly parts: readonly Part[];
}

/** No element's id: those begin with a letter. */
const OTHER = '-';

/** The element that can be selected on the board: a former belongs to its body, a control to its surface. */
function ownerId({ key, elementId }: Pick<Part, 'key' | 'elementId'>, known: ReadonlySet<string>): string {
  const [first = ''] = key.split('/');
  return [elementId, first].find((id) => known.has(id)) ?? OTHER;
}

/** Parts under what they belong to, in building order; within it as they were developed. What belongs to nothing that is known comes last. */
export function partsByOwner(parts: readonly Part[], airframe: Airframe): OwnedParts[] {
  const owners: Owner[] = namedElements(airframe).map(({ id, name }) => ({ id, name }));
  const known = new Set(owners.map(({ id }) => id));
  const owned = new Map<string, Part[]>();
  for (const part of parts) {
    const id = ownerId(part, known);
    owned.set(id, [...(owned.get(id) ?? []), part]);
  }
  return [...owners, { id: OTHER, name: words.other }].flatMap(({ id, name }) => {
    const own = owned.get(id);
    return own === undefined ? [] : [{ id, name, parts: own }];
  });
}

/** A part with those that are its mirror image; one whose fellow is not there stands for itself. */
export interface Fellows {
  readonly part: Part;
  readonly mirrored: readonly Part[];
}

/** Each drawing with the parts that are cut from it, in the order of the parts. */
export function withFellows(parts: readonly Part[]): Fellows[] {
  const keys = new Set(parts.map(({ key }) => key));
  return parts
    .filter(({ mirrorOf }) => mirrorOf === undefined || !keys.has(mirrorOf))
    .map((part) => ({ part, mirrored: parts.filter(({ mirrorOf }) => mirrorOf === part.key) }));
}

/** Where the parts of an element begin on the page. */
export const groupAnchor = (ownerIdText: string): string => `parts-${ownerIdText}`;
