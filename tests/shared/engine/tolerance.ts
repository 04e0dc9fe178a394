import { expect } from 'vitest';

/** Distance of two complex numbers relative to the modulus wanted, with an absolute floor on that modulus. */
export function deviation(actual: readonly number[], wanted: readonly number[], floor = 0): number {
  const [ar = NaN, ai = 0] = actual;
  const [wr = NaN, wi = 0] = wanted;
  return Math.hypot(ar - wr, ai - wi) / Math.max(Math.hypot(wr, wi), floor);
}

/** Asserts agreement to `relative` of the modulus; NaN fails. */
export function expectComplex(
  actual: readonly number[],
  wanted: readonly number[],
  relative: number,
  what = '',
  floor = 0,
): void {
  const seen = deviation(actual, wanted, floor);
  expect(seen <= relative, `${what}: ${actual.join(' ')} against ${wanted.join(' ')}, off by ${seen}`).toBe(
    true,
  );
}

/** Asserts agreement of reals to `relative`. */
export function expectReal(actual: number, wanted: number, relative: number, what = '', floor = 0): void {
  expectComplex([actual], [wanted], relative, what, floor);
}

/** Asserts that a value printed with a last digit of `unit` is reproduced within `units` of it (half: plain rounding). */
export function expectPrinted(
  actual: number,
  printed: number,
  unit: number,
  units = 0.5001,
  what = '',
): void {
  const seen = Math.abs(actual - printed) / unit;
  expect(
    seen <= units,
    `${what}: ${actual} against ${printed} printed, off by ${seen} of its last digit`,
  ).toBe(true);
}
