import { sameContent } from './content';

// Results kept from one call to the next. The memory belongs to the caller, who passes it in; without one everything is worked out anew,
// and comes to the same.

/** Results of the last call by name, each with what it was worked out from, and what all of them rested on. */
export interface Kept<Value> {
  common: unknown;
  last: ReadonlyMap<string, { readonly from: unknown; readonly value: Value }>;
}

/** A memory with nothing in it. */
export const nothingKept = <Value>(): Kept<Value> => ({ common: undefined, last: new Map() });

interface Task<Item, Value> {
  /** Tells the items of one call apart. */
  readonly nameOf: (item: Item, index: number) => string;
  /** Everything that `work` reads of one item, as plain data. */
  readonly from: (item: Item, index: number) => unknown;
  readonly work: (item: Item, index: number) => Value;
}

/**
 * Works out each item, or answers what it came to in the last call when all that it depends on has the same content.
 * @param memory holds the results of this call afterwards, and no others
 * @param common what `work` reads for every item alike, as plain data
 */
export function eachKept<Item, Value>(
  memory: Kept<Value> | undefined,
  common: unknown,
  items: readonly Item[],
  { nameOf, from, work }: Task<Item, Value>,
): Value[] {
  if (!memory) return items.map(work);
  const before = sameContent(memory.common, common) ? memory.last : undefined;
  const now = new Map<string, { readonly from: unknown; readonly value: Value }>();
  const values = items.map((item, index) => {
    const [name, source] = [nameOf(item, index), from(item, index)];
    const kept = before?.get(name);
    const entry = kept && sameContent(kept.from, source) ? kept : { from: source, value: work(item, index) };
    now.set(name, entry);
    return entry.value;
  });
  memory.common = common;
  memory.last = now;
  return values;
}
