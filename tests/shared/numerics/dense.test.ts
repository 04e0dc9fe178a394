import { describe, expect, it } from 'vitest';
import {
  denseAdd,
  denseExpm1,
  denseFrom,
  denseMultiply,
  denseNorm,
  denseScale,
  denseSolve,
  type DenseMatrix,
} from '#shared/numerics/dense';
import { seededRandom } from '../engine/random-lines';

const random = seededRandom(3);

function any(n: number): DenseMatrix {
  return denseFrom(n, () => [random() - 0.5, random() - 0.5]);
}

const unit = (n: number): DenseMatrix => denseFrom(n, (i, j) => [i === j ? 1 : 0, 0]);

describe('dense complex matrices', () => {
  it.each([1, 3, 7, 12])('solve A·X = B, order %i', (n) => {
    const [a, b] = [any(n), any(n)];
    const x = denseSolve(a, b);
    if (!x) throw new Error('singular');
    expect(denseNorm(denseAdd(denseMultiply(a, x), b, -1))).toBeLessThan(1e-11);
  });

  it('pivot: a zero on the diagonal is no obstacle, a singular matrix is', () => {
    const swap = denseFrom(2, (i, j) => [i === j ? 0 : 1, 0]);
    const x = denseSolve(swap, unit(2));
    if (!x) throw new Error('singular');
    expect(denseNorm(denseAdd(x, swap, -1))).toBe(0);
    expect(
      denseSolve(
        denseFrom(2, () => [1, 1]),
        unit(2),
      ),
    ).toBeNull();
  });

  it('exp − 1 of a diagonal matrix, small and large, digit by digit', () => {
    const values = [1e-9, -0.3, 2, -4];
    const e = denseExpm1(denseFrom(4, (i, j) => [i === j ? (values[i] ?? 0) : 0, 0]));
    values.forEach((v, i) => expect(Math.abs((e.re[i * 5] ?? NaN) / Math.expm1(v) - 1)).toBeLessThan(1e-13));
  });

  it('exp of a rotation’s generator is the rotation', () => {
    const e = denseExpm1(denseFrom(2, (i, j) => [i === j ? 0 : i < j ? -1.2 : 1.2, 0]));
    expect(e.re[0]).toBeCloseTo(Math.cos(1.2) - 1, 14);
    expect(e.re[2]).toBeCloseTo(Math.sin(1.2), 14);
  });

  it('exp(M)·exp(−M) = 1', () => {
    const m = denseScale(any(6), 3);
    const [p, q] = [denseExpm1(m), denseExpm1(denseScale(m, -1))];
    const product = denseAdd(denseAdd(p, q), denseMultiply(p, q));
    expect(denseNorm(product)).toBeLessThan(1e-10);
  });
});
