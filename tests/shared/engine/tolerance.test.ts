import { describe, expect, it } from 'vitest';
import { deviation, expectComplex, expectPrinted, expectReal } from './tolerance';

/** A tolerance helper that accepts anything makes every test above it worthless: ours is shown to refuse near misses. */
describe('tolerance helpers', () => {
  it('measure against the modulus, or the floor where that is larger', () => {
    expect(deviation([3, 4.0005], [3, 4])).toBeCloseTo(1e-4, 10);
    expect(deviation([1e-6], [0], 1e-3)).toBeCloseTo(1e-3, 12);
  });

  it('accept what is inside and refuse what is just outside', () => {
    expectComplex([1 + 0.9e-9, 0], [1, 0], 1e-9);
    expect(() => expectComplex([1 + 1.1e-9, 0], [1, 0], 1e-9)).toThrow();
    expect(() => expectComplex([1, 1.1e-9], [1, 0], 1e-9)).toThrow();
    expectReal(100.0999, 100, 1e-3);
    expect(() => expectReal(100.11, 100, 1e-3)).toThrow();
    expect(() => expectReal(-100, 100, 1e-3)).toThrow();
  });

  it('refuse NaN, infinity and what is missing', () => {
    for (const bad of [[NaN, 0], [0, NaN], [Infinity, 0], []])
      expect(() => expectComplex(bad, [1, 0], 1)).toThrow();
    expect(() => expectReal(NaN, 1, 1e9)).toThrow();
    expect(() => expectPrinted(NaN, 1, 1)).toThrow();
  });

  it('take a printed value for what rounding says: half of its last digit', () => {
    expectPrinted(0.30606, 0.3061, 1e-4);
    expect(() => expectPrinted(0.30616, 0.3061, 1e-4)).toThrow();
    expect(() => expectPrinted(0.30604, 0.3061, 1e-4)).toThrow();
  });
});
