/**
 * Numbers as people read them: significant digits, a true minus sign (U+2212), a narrow no-break space (U+202F)
 * between thousands, a thin space (U+2009) before the unit.
 */

/** Thin space, before a unit. */
export const THIN_SPACE = '\u2009';

const MINUS = '\u2212';
const GROUP = '\u202f';
const MOST_PLACES = 12;

/**
 * Writes a figure with so many significant digits.
 * @param value any number
 * @param digits significant digits, 3 when absent
 * @returns text without a unit; "none" for what is no finite number
 * @example figure(0.38119) // '0.381'
 */
export function figure(value: number, digits = 3): string {
  if (!Number.isFinite(value)) return 'none';
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  const wild = size !== 0 && (size < 1e-5 || size >= 1e9);
  return minus(wild ? rounded.toExponential(digits - 1) : grouped(rounded.toFixed(placesFor(size, digits))));
}

/**
 * Writes a number with so many decimal places.
 * @param value any finite number
 * @param places decimal places
 * @returns text without a unit
 * @example fixed(-6412.5, 1) // '−6 412.5'
 */
export function fixed(value: number, places: number): string {
  const text = value.toFixed(places);
  return minus(grouped(Number(text) === 0 ? text.replace('-', '') : text));
}

/**
 * Writes a figure with its unit.
 * @param value any finite number
 * @param unit unit as printed, empty for a ratio
 * @param digits significant digits, 3 when absent
 * @returns figure, thin space, unit
 * @example quantity(0.38119, 'Ω/km') // '0.381 Ω/km'
 */
export function quantity(value: number, unit: string, digits = 3): string {
  return unit === '' ? figure(value, digits) : `${figure(value, digits)}${THIN_SPACE}${unit}`;
}

/**
 * Writes a share as per cent, one decimal place below 100 %, none above.
 * @param share 0.608 for 60.8 %
 * @returns text with the sign of a loss only
 */
export function percent(share: number): string {
  const value = share * 100;
  return `${fixed(value, Math.abs(value) < 99.95 ? 1 : 0)}${THIN_SPACE}%`;
}

/**
 * Writes a difference as per cent with its sign either way.
 * @param share 0.608 for a surplus of 60.8 %
 * @returns '+60.8 %', '−0.6 %', '0.0 %'
 */
export function signedPercent(share: number): string {
  const text = percent(share);
  return share > 0 && !text.startsWith('0.0') ? `+${text}` : text;
}

/**
 * Writes the two ends of a range in as few digits as tell them apart, both with the same places.
 * @param low lower end
 * @param high upper end
 * @param digits significant digits of the larger, 2 when absent
 * @returns both texts
 * @example rangeTexts(0.33, 0.4) // ['0.33', '0.40']
 */
export function rangeTexts(low: number, high: number, digits = 2): [string, string] {
  const places = Math.max(placesNeeded(low, digits), placesNeeded(high, digits));
  return [fixed(low, places), fixed(high, places)];
}

/** Places that show a number's significant digits, trailing zeros left off: 0.85 → 2, 1.2 → 1, 320 → 0. */
function placesNeeded(value: number, digits: number): number {
  const text = Number(value.toPrecision(Math.max(digits, 2))).toString();
  const at = text.indexOf('.');
  return at < 0 || text.includes('e') ? 0 : Math.min(text.length - at - 1, 4);
}

function placesFor(size: number, digits: number): number {
  const exponent = size === 0 ? 0 : Math.floor(Math.log10(size));
  return Math.min(MOST_PLACES, Math.max(0, digits - 1 - exponent));
}

function grouped(text: string): string {
  const [whole = '', fraction] = text.split('.');
  const parts = whole.replace(/\B(?=(\d{3})+(?!\d))/g, GROUP);
  return fraction === undefined ? parts : `${parts}.${fraction}`;
}

function minus(text: string): string {
  return text.replace('-', MINUS);
}
