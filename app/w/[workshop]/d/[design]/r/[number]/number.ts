import { notFound } from 'next/navigation';

/** The revision's number as the address writes it; anything else is no revision. */
export function revisionNumber(text: string): number {
  if (!/^[1-9]\d{0,6}$/.test(text)) notFound();
  return Number(text);
}
