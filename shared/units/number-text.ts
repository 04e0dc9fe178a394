/** Numbers as people write them: one strict grammar, so that nothing is guessed. */

/** The sign between the whole part and the decimals. */
export type DecimalSign = 'point' | 'comma';

/** A number that was read, or why it was not. */
export type NumberText =
  | { ok: true; value: number; /** the digits with a decimal point */ digits: string }
  | { ok: false; reason: 'empty' | 'grammar' | 'range' };

const GRAMMAR = /^-?\d+(?:\.\d+)?(?:[eE][+-]?\d{1,3})?$/;
const GRAMMAR_COMMA = /^-?\d+(?:,\d+)?(?:[eE][+-]?\d{1,3})?$/;

/** How a number is written, in words for a fault. */
export const NUMBER_GRAMMAR = 'a number such as 1234.5 or -1.2e-5, with no thousands sign';

/**
 * Reads a number: `-?digits[.digits][e±dd]` after trimming blanks, nothing else. No plus sign in front, no
 * thousands sign, no bare point, no other numerals.
 * @param text what was written
 * @param decimal the sign between whole part and decimals
 * @returns the value (never NaN, infinite or −0) with its digits; `range` when a double cannot hold it
 */
export function readNumber(text: string, decimal: DecimalSign = 'point'): NumberText {
  const trimmed = text.trim();
  if (trimmed === '') return { ok: false, reason: 'empty' };
  // A longer text is no number that anybody measured, and an endless one would be slow to read.
  if (trimmed.length > 60) return { ok: false, reason: 'grammar' };
  if (!(decimal === 'comma' ? GRAMMAR_COMMA : GRAMMAR).test(trimmed)) return { ok: false, reason: 'grammar' };
  const digits = trimmed.replace(',', '.');
  const value = Number(digits);
  const vanished = value === 0 && /[1-9]/.test(digits.replace(/e.*$/i, ''));
  if (!Number.isFinite(value) || vanished) return { ok: false, reason: 'range' };
  return { ok: true, value: value === 0 ? 0 : value, digits };
}

/**
 * Half a unit of the last digit as written: how far rounding alone may have moved the value.
 * @param digits digits with a decimal point, such as `0.40` (0.005) or `6.1e2` (5)
 * @returns half a unit, in the number's own unit; 0 for a text that is no number
 */
export function halfLastDigit(digits: string): number {
  const m = /^-?\d+(?:\.(\d+))?(?:[eE]([+-]?\d+))?$/.exec(digits.trim());
  if (!m) return 0;
  const exponent = Number(m[2] ?? 0) - (m[1]?.length ?? 0);
  // Dividing by a whole power of ten rounds once, multiplying by its inverse twice.
  return exponent < 0 ? 0.5 / 10 ** -exponent : 0.5 * 10 ** exponent;
}
