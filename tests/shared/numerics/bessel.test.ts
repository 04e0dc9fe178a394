import { describe, expect, it } from 'vitest';
import { createModifiedBessel, modifiedBessel } from '#shared/numerics/bessel';

const value = createModifiedBessel();

describe('modified Bessel functions, scaled', () => {
  // Abramowitz & Stegun tables 9.8 (from memory): I₀(1), I₁(1), K₀(1), K₁(1).
  it('hold the tabled values at z = 1', () => {
    modifiedBessel(1, 0, value);
    expect(value.i0[0] * Math.E).toBeCloseTo(1.2660658777520084, 13);
    expect(value.i1[0] * Math.E).toBeCloseTo(0.565159103992485, 13);
    expect(value.k0[0] / Math.E).toBeCloseTo(0.42102443824070834, 13);
    expect(value.k1[0] / Math.E).toBeCloseTo(0.6019072301972346, 13);
  });

  // The Wronskian I₀K₁ + I₁K₀ = 1/z (DLMF 10.28.2) ties all four together; the scaling cancels in it.
  it.each([1e-4, 0.3, 1.99, 2.01, 5, 12, 19.9, 20.1, 60, 900, 1e5])(
    'satisfy the Wronskian at |z| = %f',
    (modulus) => {
      for (const degrees of [0, 20, 45]) {
        const zr = modulus * Math.cos((degrees * Math.PI) / 180);
        const zi = modulus * Math.sin((degrees * Math.PI) / 180);
        modifiedBessel(zr, zi, value);
        const { i0, i1, k0, k1 } = value;
        const re = i0[0] * k1[0] - i0[1] * k1[1] + i1[0] * k0[0] - i1[1] * k0[1];
        const im = i0[0] * k1[1] + i0[1] * k1[0] + i1[0] * k0[1] + i1[1] * k0[0];
        const error = Math.hypot(re * zr - im * zi - 1, re * zi + im * zr);
        expect(error, `${degrees}°`).toBeLessThan(2e-12);
      }
    },
  );
});
