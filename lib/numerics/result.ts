// Errors as values. A fault of the program is thrown; anything a person can mend is a Problem.

/** Something the person can mend: where it is, what was expected, what to do. */
export interface Problem {
  /** Stable code, kebab-case, e.g. "not-built-yet", "control-ends-before-it-begins". */
  readonly code: string;
  /** Path in the document with dots, e.g. "surfaces.0.panels.1.rootChordMm"; "" for the whole document. */
  readonly path: string;
  /** What is wrong and what was expected, one sentence a builder understands. */
  readonly message: string;
  /** What to do about it, where that is not plain from the message. */
  readonly fix?: string;
}

export type Result<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** A successful result. */
export const ok = <T>(value: T): Result<T> => ({ ok: true, value });

/** A refused input, with every problem found. */
export const refuse = (...problems: readonly Problem[]): Result<never> => ({ ok: false, problems });

/** The schema accepts more than the chain can compute yet; this names the part that is missing. */
export const notBuiltYet = (path: string, what: string): Problem => ({
  code: 'not-built-yet',
  path,
  message: `not built yet: ${path} (${what})`,
});
