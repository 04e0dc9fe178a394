import { complex, inv, matrix, multiply, type Complex, type Matrix } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { eliminateComplex, eliminateReal, invertReal, packedLength, rowStart } from '#shared/numerics/packed';
import { seededRandom } from '../engine/random-lines';

const random = seededRandom(11);

/** A symmetric matrix with a strong diagonal, in both forms. */
function symmetric(n: number, entry: () => number): { packed: Float64Array; full: number[][] } {
  const packed = new Float64Array(packedLength(n));
  const full = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      const value = entry() + (i === j ? n : 0);
      packed[rowStart(i) + j] = value;
      for (const [r, c] of [
        [i, j],
        [j, i],
      ] as const) {
        const row = full[r];
        if (row) row[c] = value;
      }
    }
  }
  return { packed, full };
}

/** The Schur complement on the first rows is the inverse of the leading block of the inverse. */
function schur(full: Complex[][], keep: number): Complex[][] {
  const inverse = (inv(matrix(full)) as Matrix).toArray() as Complex[][];
  const block = inverse.slice(0, keep).map((row) => row.slice(0, keep));
  return (inv(matrix(block)) as Matrix).toArray() as Complex[][];
}

describe('packed triangles', () => {
  it('lay out row by row', () => {
    expect([0, 1, 2, 3].map(rowStart)).toEqual([0, 1, 3, 6]);
    expect(packedLength(26)).toBe(351);
  });

  it.each([1, 2, 5, 9, 14])('eliminate to the Schur complement, order %i', (n) => {
    const keep = Math.ceil(n / 3);
    const re = symmetric(n, random);
    const im = symmetric(n, random);
    const full = re.full.map((row, i) => row.map((r, j) => complex(r, im.full[i]?.[j] ?? NaN)));
    const wanted = schur(full, keep);
    expect(eliminateComplex(re.packed, im.packed, n, keep)).toBeLessThan(100);
    for (let i = 0; i < keep; i++) {
      for (let j = 0; j <= i; j++) {
        expect(re.packed[rowStart(i) + j]).toBeCloseTo(wanted[i]?.[j]?.re ?? NaN, 11);
        expect(im.packed[rowStart(i) + j]).toBeCloseTo(wanted[i]?.[j]?.im ?? NaN, 11);
      }
    }
  });

  it.each([1, 2, 6, 12])('invert, order %i', (n) => {
    const { packed, full } = symmetric(n, random);
    expect(invertReal(packed, n)).toBeGreaterThanOrEqual(1);
    const own = full.map((_, i) =>
      full.map((__, j) => packed[i >= j ? rowStart(i) + j : rowStart(j) + i] ?? NaN),
    );
    const unit = (multiply(matrix(full), matrix(own)) as Matrix).toArray() as number[][];
    unit.forEach((row, i) => row.forEach((v, j) => expect(v).toBeCloseTo(i === j ? 1 : 0, 12)));
  });

  it('real elimination is the complex one without imaginary parts', () => {
    const { packed } = symmetric(8, random);
    const re = packed.slice();
    eliminateReal(packed, 8, 3);
    eliminateComplex(re, new Float64Array(re.length), 8, 3);
    packed.forEach((v, e) => expect(v).toBeCloseTo(re[e] ?? NaN, 13));
  });

  it('refuse what is not positive definite', () => {
    expect(eliminateReal(Float64Array.from([1, 2, 1]), 2, 0)).toBe(Infinity);
    expect(invertReal(Float64Array.from([1, 2, 1]), 2)).toBe(Infinity);
  });

  it('touch nothing when there is nothing to eliminate', () => {
    const { packed } = symmetric(4, random);
    const before = packed.slice();
    expect(eliminateReal(packed, 4, 4)).toBe(1);
    expect(packed).toEqual(before);
  });
});
