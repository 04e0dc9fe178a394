import { PARAMETER_WORDS } from './parameters';
import type { FindingParameter } from './parameters';

const THIN = '\u2009';
const MINUS = '\u2212';
const GROUP = '\u202f';

/**
 * A figure as sentences print it: significant digits, a true minus sign, a narrow space between thousands.
 *
 * @param value any finite number
 * @param digits significant digits, 3 when absent
 * @returns text without a unit
 * @example figure(0.38119, 3) // "0.381"
 */
export function figure(value: number, digits = 3): string {
  if (!Number.isFinite(value)) return 'not a number';
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  const text =
    size !== 0 && (size < 1e-4 || size >= 1e9) ? rounded.toExponential(digits - 1) : plain(rounded, digits);
  return text.replace('-', MINUS);
}

function plain(rounded: number, digits: number): string {
  const size = Math.abs(rounded);
  const whole = size < 1 ? 1 : Math.floor(Math.log10(size)) + 1;
  const places =
    size < 1 ? Math.min(8, digits - 1 - Math.floor(Math.log10(size || 1))) : Math.max(0, digits - whole);
  const [integer = '', fraction] = rounded.toFixed(Math.min(places, 12)).split('.');
  const grouped = integer.replace(/\B(?=(\d{3})+(?!\d))/g, GROUP);
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}

/** A figure with its unit behind a thin space; a ratio stands alone. */
export function withUnit(value: number, unit: string, digits = 3): string {
  return unit === '' ? figure(value, digits) : `${figure(value, digits)}${THIN}${unit}`;
}

/**
 * Significant digits, from three on, at which two different figures do not print alike.
 *
 * @example digitsApart(10.96, 11) // 4
 */
export function digitsApart(one: number, other: number): number {
  return [3, 4, 5].find((digits) => figure(one, digits) !== figure(other, digits)) ?? 6;
}

/** A value of a parameter with the parameter's unit. */
export function quantity(parameter: FindingParameter, value: number, digits = 3): string {
  return withUnit(value, PARAMETER_WORDS[parameter].unit, digits);
}

/** A share as per cent: two significant digits under 10 %, whole per cent above. */
export function percent(share: number): string {
  const value = Math.abs(share) * 100;
  if (value === 0) return `0${THIN}%`;
  const text = value < 10 ? figure(value, 2) : figure(value, Math.max(2, Math.ceil(Math.log10(value + 0.5))));
  return `${text}${THIN}%`;
}

/** The name of a parameter as sentences use it. */
export function label(parameter: FindingParameter): string {
  return PARAMETER_WORDS[parameter].label;
}

/**
 * "X1 is 61 % above what the geometry gives", or times as much where per cent stop being readable.
 *
 * @param parameter what is weighed
 * @param ratio declared ÷ recomputed
 * @param against the other side, "what the geometry gives" when absent
 */
export function partsBy(
  parameter: FindingParameter,
  ratio: number,
  against = 'what the geometry gives',
): string {
  const name = label(parameter);
  if (ratio < 0) return `${name} has the opposite sign of ${against}`;
  if (ratio >= 3) return `${name} is ${figure(ratio, 3)} times ${against}`;
  if (ratio > 1e-6 && ratio <= 0.1) return `${name} is 1/${figure(1 / ratio, 3)} of ${against}`;
  return `${name} is ${percent(ratio - 1)} ${ratio >= 1 ? 'above' : 'below'} ${against}`;
}

/** "a, b and c". */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`;
}
