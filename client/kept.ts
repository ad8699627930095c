// What this browser keeps for a person: changes that the server has not got, and the aircraft of a visitor without an account.
// Only text goes in and out; whoever reads it checks it like any other foreign document.

export interface KeptDraft {
  /** Version of the draft that the changes build on. */
  readonly version: number;
  /** The page that keeps them; another page of the same browser does not throw them away. */
  readonly holder: string;
  readonly airframe: unknown;
}

const draftKey = (designId: string) => `foldspar.draft.${designId}`;
const TRY_KEY = 'foldspar.try';

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;

const isKept = (value: unknown): value is KeptDraft =>
  isRecord(value) && typeof value.version === 'number' && typeof value.holder === 'string' && isRecord(value.airframe);

/** Runs an act on the browser's store; answers false where there is no room or no store. */
function withStore(act: (store: Storage) => void): boolean {
  try {
    act(window.localStorage);
    return true;
  } catch (error) {
    if (error instanceof DOMException) return false;
    throw error;
  }
}

function read(key: string): unknown {
  let text: string | null = null;
  withStore((store) => {
    text = store.getItem(key);
  });
  if (text === null) return null;
  try {
    const value: unknown = JSON.parse(text);
    return value;
  } catch (error) {
    // Not ours, or cut off while it was written: there is nothing to give back.
    if (error instanceof SyntaxError) return null;
    throw error;
  }
}

/** Keeps changes; false when the browser has no room for them. */
export const keepDraft = (designId: string, kept: KeptDraft): boolean =>
  withStore((store) => store.setItem(draftKey(designId), JSON.stringify(kept)));

export function keptDraft(designId: string): KeptDraft | null {
  const value = read(draftKey(designId));
  return isKept(value) ? value : null;
}

/** Drops what this page kept; what another page keeps stays. */
export function dropDraft(designId: string, holder: string): void {
  if (keptDraft(designId)?.holder === holder) withStore((store) => store.removeItem(draftKey(designId)));
}

export const keepTry = (airframe: unknown): boolean =>
  withStore((store) => store.setItem(TRY_KEY, JSON.stringify(airframe)));
/** The visitor's aircraft as it was written, unchecked; null when there is none. */
export const keptTry = (): unknown => read(TRY_KEY);
export const dropTry = (): boolean => withStore((store) => store.removeItem(TRY_KEY));
