/** Numbers of applications: YY-NNNN, drawn at random so that they tell rivals nothing about how many there are. */

const PER_YEAR = 10_000;
const PATTERN = /^\d{2}-\d{4}$/;

/**
 * Draws a number.
 * @param year calendar year of the creation, in the owner's zone
 * @param random source of numbers from 0 (included) to 1 (excluded); an unpredictable one on the server
 * @returns a number such as 27-0418; whether it is free is for the caller to find out
 */
export function drawApplicationNumber(year: number, random: () => number): string {
  const serial = Math.floor(random() * PER_YEAR);
  return `${String(year % 100).padStart(2, '0')}-${String(serial).padStart(4, '0')}`;
}

/**
 * Tells an application's number from its UUID, since addresses take either.
 * @param text part of an address
 * @returns true for YY-NNNN
 */
export function isApplicationNumber(text: string): boolean {
  return PATTERN.test(text);
}
