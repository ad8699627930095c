/** What a form shows after it was sent: what was typed (never a password), what is wrong where, and how it went as a whole. */
export interface FormState {
  readonly values: Readonly<Record<string, string>>;
  readonly fields: Readonly<Record<string, string>>;
  readonly message?: { readonly tone: 'good' | 'bad'; readonly text: string };
}

export const BLANK: FormState = { values: {}, fields: {} };

export type FormAction = (state: FormState, data: FormData) => Promise<FormState>;

/** A text field of a sent form; files and missing fields are empty. */
export function textOf(data: FormData, name: string): string {
  const value = data.get(name);
  return typeof value === 'string' ? value : '';
}
