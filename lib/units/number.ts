// The only place that turns a number into text for a person. Writers of files have a printer of their own.

const refuseUnprintable = (value: number, digits: number): void => {
  if (!Number.isFinite(value)) throw new RangeError(`cannot show ${value} as a number`);
  if (!Number.isInteger(digits) || digits < 0 || digits > 12)
    throw new RangeError(`digits must be 0 to 12, got ${digits}`);
};

/** A number with exactly `digits` decimals; never "-0". Throws RangeError for a number that is not finite. */
export function fixedDigits(value: number, digits: number): string {
  refuseUnprintable(value, digits);
  const text = value.toFixed(digits);
  return Number(text) === 0 ? text.replace('-', '') : text;
}

/** A number with at most `digits` decimals and no trailing zeros: for messages and typed fields; never "-0". */
export function trimmedDigits(value: number, digits: number): string {
  const text = fixedDigits(value, digits);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}
