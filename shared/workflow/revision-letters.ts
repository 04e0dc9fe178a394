/** Revision letters as on drawings: A … Z, AA, AB …; each filing takes the next. */

const LETTERS = 26;
const FIRST = 'A'.charCodeAt(0);

/**
 * The letter of a revision.
 * @param ordinal 1 for the first filing
 * @returns A … Z, then AA … ZZ, then AAA …
 * @throws RangeError when the ordinal is not a whole number from 1
 * @example revisionLetter(2) // 'B'
 * @example revisionLetter(27) // 'AA'
 */
export function revisionLetter(ordinal: number): string {
  if (!Number.isInteger(ordinal) || ordinal < 1) {
    throw new RangeError(`a revision's ordinal is a whole number from 1, not ${ordinal}`);
  }
  let letter = '';
  // there is no zero among the digits A … Z, so one is taken off before each division
  for (let rest = ordinal; rest > 0; rest = Math.floor((rest - 1) / LETTERS)) {
    letter = String.fromCharCode(FIRST + ((rest - 1) % LETTERS)) + letter;
  }
  return letter;
}

/**
 * The ordinal of a revision letter, the reverse of {@link revisionLetter}.
 * @param letter one to three capitals
 * @returns its ordinal from 1, or undefined when it is no revision letter
 * @example revisionOrdinal('AA') // 27
 */
export function revisionOrdinal(letter: string): number | undefined {
  if (!/^[A-Z]{1,3}$/.test(letter)) return undefined;
  let ordinal = 0;
  for (const sign of letter) ordinal = ordinal * LETTERS + (sign.charCodeAt(0) - FIRST + 1);
  return ordinal;
}
