/** Names of the {placeholders} in a text; any name when the text is not a literal. */
export type Placeholders<T extends string> = string extends T
  ? string
  : T extends `${string}{${infer Name}}${infer Rest}`
    ? Name | Placeholders<Rest>
    : never;

/**
 * Puts values into a text's {placeholders}.
 * Numbers arrive as they are to be read: format them in lib/units first unless they are plain counts.
 * Throws RangeError when a placeholder has no value, so that no page ever shows a bare "{name}".
 */
export function fill<T extends string>(text: T, values: Readonly<Record<Placeholders<T>, string | number>>): string {
  const known = new Map<string, string | number>(Object.entries(values));
  return text.replaceAll(/\{([A-Za-z][A-Za-z0-9]*)\}/g, (_, name: string) => {
    const value = known.get(name);
    if (value === undefined) throw new RangeError(`no value for {${name}} in "${text}"`);
    return String(value);
  });
}
