import {
  DM2_PER_FT2,
  DM2_PER_IN2,
  G_PER_OZ,
  GDM2_PER_OZFT2,
  KGM3_PER_OZFT3,
  MM_PER_FT,
  MM_PER_IN,
  MS_PER_MPH,
  N_PER_LBF,
} from './factors';
import { fixedDigits } from './number';

export const UNIT_SYSTEMS = ['metric', 'imperial'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

interface DisplayUnit {
  readonly symbol: string;
  /** How many of the document's unit make one of this. */
  readonly factor: number;
  /** Decimals beyond those asked for, where one unit is much larger than the document's. */
  readonly extraDigits: number;
}

const same = (symbol: string): Record<UnitSystem, DisplayUnit> => {
  const unit = { symbol, factor: 1, extraDigits: 0 };
  return { metric: unit, imperial: unit };
};
const pair = (
  metric: string,
  imperial: string,
  factor: number,
  extraDigits: number,
): Record<UnitSystem, DisplayUnit> => ({
  metric: { symbol: metric, factor: 1, extraDigits: 0 },
  imperial: { symbol: imperial, factor, extraDigits },
});

/** Quantities by the unit that the document and the figures hold them in. Units without an everyday imperial twin stay as they are. */
export const QUANTITIES = {
  mm: pair('mm', 'in', MM_PER_IN, 2),
  m: pair('m', 'ft', MM_PER_FT / 1000, 0),
  g: pair('g', 'oz', G_PER_OZ, 2),
  dm2: pair('dm²', 'ft²', DM2_PER_FT2, 2),
  cm2: pair('cm²', 'in²', DM2_PER_IN2 * 100, 1),
  ms: pair('m/s', 'mph', MS_PER_MPH, 0),
  gdm2: pair('g/dm²', 'oz/ft²', GDM2_PER_OZFT2, 0),
  kgm3: pair('kg/m³', 'oz/ft³', KGM3_PER_OZFT3, 0),
  n: pair('N', 'lbf', N_PER_LBF, 1),
  gm2: same('g/m²'),
  deg: same('°'),
  percent: same('%'),
  share: same(''),
  perRad: same('/rad'),
  perDeg: same('/°'),
  degPerS: same('°/s'),
  kgm2: same('kg m²'),
  v: same('V'),
  a: same('A'),
  w: same('W'),
  rpm: same('rpm'),
  s: same('s'),
  mpa: same('MPa'),
  none: same(''),
} as const;
export type Quantity = keyof typeof QUANTITIES;

export interface Shown {
  readonly number: string;
  readonly unit: string;
}

/** A value in the document's unit as number and unit for the eye, `digits` decimals in the metric unit. Throws RangeError when it is not finite. */
export function shown(value: number, quantity: Quantity, digits: number, system: UnitSystem = 'metric'): Shown {
  const unit = QUANTITIES[quantity][system];
  return { number: fixedDigits(value / unit.factor, digits + unit.extraDigits), unit: unit.symbol };
}

/** The same as one string: "620 mm", "2.5°", "11 %". */
export function shownText(value: number, quantity: Quantity, digits: number, system: UnitSystem = 'metric'): string {
  const { number, unit } = shown(value, quantity, digits, system);
  if (unit === '') return number;
  return unit === '°' || unit.startsWith('/') || unit.startsWith('°') ? `${number}${unit}` : `${number} ${unit}`;
}

/** A number typed in the shown unit, in the document's unit. */
export function fromShown(value: number, quantity: Quantity, system: UnitSystem): number {
  return value * QUANTITIES[quantity][system].factor;
}
