import type { Handle } from '@/lib/airframe/handles';
import { trimmedDigits } from '@/lib/units/number';
import { fromShown, QUANTITIES, type UnitSystem } from '@/lib/units/quantity';

// A handle's value as it is read and typed. Shares of a length or chord are read in per cent.

type Unit = Handle['unit'];
type Shown = 'mm' | 'deg' | 'percent';

const PER_CENT = 100;
const QUANTITY: Record<Unit, Shown> = { mm: 'mm', deg: 'deg', share: 'percent' };
/** A tenth of a millimetre, of a degree, of a per cent; a hundredth of an inch more than that can be cut. */
const DIGITS = 1;

const toShown = (value: number, unit: Unit): number => (unit === 'share' ? value * PER_CENT : value);

export const unitSymbol = (unit: Unit, system: UnitSystem): string => QUANTITIES[QUANTITY[unit]][system].symbol;

/** The number alone, for a field. */
export function valueNumber(value: number, unit: Unit, system: UnitSystem): string {
  const { factor, extraDigits } = QUANTITIES[QUANTITY[unit]][system];
  return trimmedDigits(toShown(value, unit) / factor, DIGITS + extraDigits);
}

/** Number and unit. */
export function valueText(value: number, unit: Unit, system: UnitSystem): string {
  const symbol = unitSymbol(unit, system);
  return `${valueNumber(value, unit, system)}${symbol === '°' ? '' : ' '}${symbol}`;
}

/** What a person typed, in the document's unit; null when it is no plain number. A decimal comma counts, a unit behind it too. */
export function typedValue(text: string, unit: Unit, system: UnitSystem): number | null {
  const symbol = unitSymbol(unit, system);
  const bare = text.trim().replace(/−/g, '-').replace(',', '.');
  const number = bare.endsWith(symbol) ? bare.slice(0, -symbol.length).trim() : bare;
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(number)) return null;
  const value = fromShown(Number(number), QUANTITY[unit], system);
  return unit === 'share' ? value / PER_CENT : value;
}
