/** Lengths and areas as the form takes them: a number with an optional unit behind it. */
import { FACTORS } from './factors.generated';
import { readNumber } from './number-text';
import type { DecimalSign } from './number-text';

/** Units of length that are taken. */
export type LengthUnit = keyof typeof FACTORS.length;

/** Units of area that are taken. */
export type AreaUnit = keyof typeof FACTORS.area;

/** The units of length, in the order in which they are offered. */
export const LENGTH_UNITS = Object.keys(FACTORS.length) as readonly LengthUnit[];

/** The units of area, in the order in which they are offered. */
export const AREA_UNITS = Object.keys(FACTORS.area) as readonly AreaUnit[];

/** A quantity that was read: the number and unit as typed. */
export interface QuantityText<U extends string> {
  value: number;
  unit: U;
  /** The digits with a decimal point. */
  digits: string;
}

function split<U extends string>(
  text: string,
  units: readonly U[],
  fallback: U,
  decimal: DecimalSign,
): QuantityText<U> | null {
  const m = /^\s*(-?[\d.,]+(?:[eE][+-]?\d{1,3})?)\s*([A-Za-z%²/]*[0-9]?)\s*$/u.exec(text.slice(0, 80));
  if (!m) return null;
  const number = readNumber(m[1] ?? '', decimal);
  const unit = m[2] === '' ? fallback : units.find((u) => u === m[2]);
  return number.ok && unit ? { value: number.value, unit, digits: number.digits } : null;
}

/**
 * Reads a length such as `59 ft`.
 * @param text what was typed
 * @param fallback the unit that a bare number is in
 * @param decimal the sign between whole part and decimals
 * @returns number and unit as typed; null when the text is no length
 */
export function readLength(text: string, fallback: LengthUnit, decimal: DecimalSign = 'point') {
  return split(text, LENGTH_UNITS, fallback, decimal);
}

/** Reads an area such as `795 kcmil`; null when the text is no area. */
export function readArea(text: string, fallback: AreaUnit, decimal: DecimalSign = 'point') {
  return split(text, AREA_UNITS, fallback, decimal);
}

/**
 * A length in another unit.
 * @param value number in `from`
 * @param from unit that it is in
 * @param to unit that is wanted
 */
export function convertLength(value: number, from: LengthUnit, to: LengthUnit): number {
  // The same unit must give the same number, which a division by its own factor need not.
  return from === to ? value : (value * FACTORS.length[from]) / FACTORS.length[to];
}

/** An area in another unit. */
export function convertArea(value: number, from: AreaUnit, to: AreaUnit): number {
  return from === to ? value : (value * FACTORS.area[from]) / FACTORS.area[to];
}
