import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import { QUANTITIES, type Quantity, type Shown, shown, UNIT_SYSTEMS, type UnitSystem } from '@/lib/units/quantity';

/** What a number needs to be shown: the unit that the document holds it in, and what that is. */
export interface Measure {
  readonly unit: string;
  readonly quantity: Quantity;
  readonly digits: number;
}

/**
 * A figure's value as it is read. Only a unit that the quantity stands for by itself switches: "mm" becomes inches, "g/°" stays.
 * Throws RangeError for a value that is not finite.
 */
export function measured(value: number, { unit, quantity, digits }: Measure, system: UnitSystem): Shown {
  const { metric, imperial } = QUANTITIES[quantity];
  const switches = system === 'imperial' && metric !== imperial && metric.symbol === unit;
  return switches ? shown(value, quantity, digits, system) : { number: fixedDigits(value, digits), unit };
}

// Where only a symbol is known, "g" stays as it is: it may be grams or a load factor.
const SAFE = Object.values(QUANTITIES).filter(({ metric, imperial }) => metric !== imperial && metric.symbol !== 'g');

interface Conversion {
  readonly unit: string;
  readonly factor: number;
}

/** How a number known only by its unit's symbol is shown in a system of units: the symbol, and what to divide by. */
export function conversionOf(unit: string, system: UnitSystem): Conversion {
  const found = system === 'metric' ? undefined : SAFE.find(({ metric }) => metric.symbol === unit);
  return found === undefined ? { unit, factor: 1 } : { unit: found.imperial.symbol, factor: found.imperial.factor };
}

/** A number known only by its unit's symbol, with at most `digits` decimals. */
export function shownBySymbol(value: number, unit: string, digits: number, system: UnitSystem): Shown {
  const conversion = conversionOf(unit, system);
  return { number: trimmedDigits(value / conversion.factor, digits), unit: conversion.unit };
}

/** Units that an address asks for; anything unknown is metric. */
export const systemFrom = (asked: string | readonly string[] | undefined): UnitSystem =>
  UNIT_SYSTEMS.find((system) => system === asked) ?? 'metric';
