// What the document is called and how large its numbers may be, without the schema itself: the board reads these and must
// not carry the validator with it.

export const AIRFRAME_FORMAT = 'foldspar.airframe';
export const AIRFRAME_VERSION = 1;

/** The largest length the document holds, mm: ten metres of span is far past any sheet-foam aircraft. */
export const MAX_LENGTH_MM = 10_000;
