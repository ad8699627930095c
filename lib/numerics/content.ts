// Values compared by what they hold. A document that was read or copied anew is another object with the same content.

type PlainRecord = Readonly<Record<string, unknown>>;

const isRecord = (value: unknown): value is PlainRecord =>
  typeof value === 'object' && value !== null && Object.getPrototypeOf(value) === Object.prototype;

/**
 * True when two values of plain data (numbers, texts, lists, records) hold the same, to the bit. Anything else, a map or a function, is
 * only the same as itself.
 */
export function sameContent(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (Array.isArray(a)) return Array.isArray(b) && sameLists(a, b);
  return isRecord(a) && isRecord(b) && sameRecords(a, b);
}

function sameLists(a: readonly unknown[], b: readonly unknown[]): boolean {
  if (a.length !== b.length) return false;
  for (let i = 0; i < a.length; i++) if (!sameContent(a[i], b[i])) return false;
  return true;
}

function sameRecords(a: PlainRecord, b: PlainRecord): boolean {
  let left = 0;
  for (const key in b) if (b[key] !== undefined) left++;
  for (const key in a) {
    if (a[key] === undefined) continue;
    if (!sameContent(a[key], b[key])) return false;
    left--;
  }
  return left === 0;
}
