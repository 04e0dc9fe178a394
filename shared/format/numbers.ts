/** Numbers as the product shows them: true minus sign, thin space before the unit, narrow no-break space between thousands. */

/** U+2212. */
export const MINUS = '\u2212';
/** U+2009, between a number and its unit. */
export const THIN_SPACE = '\u2009';
/** U+202F, between thousands. */
export const GROUP_SPACE = '\u202f';

/** What is shown where there is no number. */
export const NO_VALUE = '–';

const SUPERSCRIPT: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

/** Digits of a decimal text, grouped: `-6412.5` → `−6 412.5`. The decimals are not grouped. */
function grouped(text: string): string {
  const [whole = '', decimals] = text.replace('-', '').split('.');
  const groups = whole.replace(/\B(?=(\d{3})+$)/g, GROUP_SPACE);
  const sign = text.startsWith('-') && /[1-9]/.test(text) ? MINUS : '';
  return sign + groups + (decimals === undefined ? '' : `.${decimals}`);
}

/**
 * A number with a given count of significant digits, trailing zeros kept so that columns line up.
 * Whole digits are never rounded away (`6412.3` with 3 digits is `6 412`). Very large and very small numbers are
 * written with a power of ten.
 * @param value number in any unit
 * @param digits significant digits, 4 by default
 * @returns `0.3670`, `−12.40`, `6 412`, `1.234 × 10⁻⁶`; a dash where there is no finite number
 */
export function formatNumber(value: number | null | undefined, digits = 4): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NO_VALUE;
  const size = Math.abs(value);
  if (size === 0) return '0';
  if (size < 1e-4 || size >= 1e9) return powerOfTen(value, digits);
  const rounded = Number(value.toPrecision(digits));
  const wholeDigits = Math.floor(Math.log10(Math.abs(rounded))) + 1;
  return grouped(value.toFixed(Math.max(0, digits - wholeDigits)));
}

function powerOfTen(value: number, digits: number): string {
  const [mantissa = '', exponent = '0'] = value.toExponential(digits - 1).split('e');
  const raised = [...String(Number(exponent))].map((c) => SUPERSCRIPT[c] ?? c).join('');
  return `${grouped(mantissa)}${GROUP_SPACE}×${GROUP_SPACE}10${raised}`;
}

/** A number with a given count of decimals, grouped: `1 234.50`. A dash where there is no finite number. */
export function formatFixed(value: number | null | undefined, decimals: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NO_VALUE;
  return grouped(value.toFixed(decimals));
}

/** A whole number, grouped: `6 412`. A dash where there is no finite number. */
export function formatCount(value: number | null | undefined): string {
  return formatFixed(value, 0);
}

/** Digits as somebody wrote them, with the true minus sign and grouped thousands; nothing is rounded. */
export function formatWritten(digits: string): string {
  return /^-?\d+(\.\d+)?$/.test(digits) ? grouped(digits) : digits.replaceAll('-', MINUS);
}

/** A count with its noun: `1 line`, `6 412 rows`. */
export function formatCounted(count: number, one: string, many = `${one}s`): string {
  return `${formatCount(count)} ${count === 1 ? one : many}`;
}

/**
 * A number with its unit, a thin space between: `0.3670 Ω/km`.
 * @param value number in `unit`
 * @param unit as people write it, or a unit of the filing format
 * @param digits significant digits
 */
export function formatQuantity(value: number | null | undefined, unit: string, digits = 4): string {
  const number = formatNumber(value, digits);
  return number === NO_VALUE || unit === '' ? number : `${number}${THIN_SPACE}${unitForPeople(unit)}`;
}

/** A unit of the filing format as people write it: `ohm/km` → `Ω/km`, `uS/km` → `µS/km`. Others stay as they are. */
export function unitForPeople(unit: string): string {
  return unit.replace(/^ohm/, 'Ω').replace(/^u(?=[SF])/, 'µ');
}
