import { describe, expect, it } from 'vitest';
import { ASYMPTOTIC_LIMIT, SERIES_LIMIT, struveKernel } from '#shared/numerics/struve';
import { struveKernelDerivative } from '#shared/numerics/struve-derivative';

type Pair = [number, number];
const out = new Float64Array(2);

function kernel(modulus: number, degrees: number): Pair {
  const angle = (degrees * Math.PI) / 180;
  struveKernel(modulus * Math.cos(angle), modulus * Math.sin(angle), out);
  return [out[0] ?? NaN, out[1] ?? NaN];
}

function derivative(modulus: number, degrees: number): Pair {
  const angle = (degrees * Math.PI) / 180;
  struveKernelDerivative(modulus * Math.cos(angle), modulus * Math.sin(angle), out);
  return [out[0] ?? NaN, out[1] ?? NaN];
}

/** ∫ e^(−ut)(√(1+t²) − t) dt along a ray t = s·e^(−jβ) that keeps Re(ut) positive, by the trapezoidal rule in ln s. */
function quadrature(modulus: number, degrees: number): Pair {
  const phi = (degrees * Math.PI) / 180;
  // The ray may turn until its cut at −j; stay in the middle of what both conditions allow.
  const beta = phi > Math.PI / 4 ? Math.min(phi / 2 + 0.15, 1.25) : 0;
  const decay = Math.cos(phi - beta) * modulus;
  const wave = Math.sin(phi - beta) * modulus;
  let re = 0;
  let im = 0;
  const step = 0.004;
  for (let y = Math.log(1e-13); y < Math.log(60 / decay); y += step) {
    const s = Math.exp(y);
    const [tr, ti] = [s * Math.cos(beta), -s * Math.sin(beta)];
    const [ar, ai] = [1 + tr * tr - ti * ti, 2 * tr * ti];
    const m = Math.hypot(ar, ai);
    const rr = Math.sqrt((m + Math.abs(ar)) / 2);
    const ri = Math.abs(ai) / (2 * rr);
    const root: Pair = ar >= 0 ? [rr, Math.sign(ai) * ri] : [ri, Math.sign(ai) * rr];
    const [dr, di] = [root[0] + tr, root[1] + ti];
    const below = dr * dr + di * di;
    const size = Math.exp(-decay * s) * s * step;
    const [cr, ci] = [size * Math.cos(wave * s + beta), -size * Math.sin(wave * s + beta)];
    re += (cr * dr + ci * di) / below;
    im += (ci * dr - cr * di) / below;
  }
  return [re, im];
}

function off(a: Pair, b: Pair): number {
  return Math.hypot(a[0] - b[0], a[1] - b[1]) / Math.hypot(b[0], b[1]);
}

describe('F(u) = (π/2u)[H₁(u) − Y₁(u)] − 1/u²', () => {
  // H₁(1) = 0.1984573362019444, Y₁(1) = −0.7812128213002887 (Abramowitz & Stegun tables 12.1 and 9.1, from memory).
  it('is made of the tabled functions at u = 1', () => {
    const wanted = (Math.PI / 2) * (0.1984573362019444 + 0.7812128213002887) - 1;
    expect(Math.abs((kernel(1, 0)[0] - wanted) / wanted)).toBeLessThan(1e-14);
  });

  const moduli = [0.01, 0.3, 2, 6, 9.9, 10.1, 14, 20, 37, 39, 60];
  const angles = [-45, -20, 0, 30, 45, 60, 80, 89, 91, 100, 115, 130];

  it.each(moduli)(
    'agrees with quadrature of its integral at |u| = %f, every angle of the range',
    (modulus) => {
      for (const degrees of angles) {
        expect(off(kernel(modulus, degrees), quadrature(modulus, degrees)), `${degrees}°`).toBeLessThan(
          1e-10,
        );
      }
    },
  );

  it.each([
    ['series', SERIES_LIMIT],
    ['asymptotic', ASYMPTOTIC_LIMIT],
  ])('is continuous over the border of the %s region', (_, border) => {
    for (let degrees = -45; degrees <= 135; degrees += 5) {
      const inside = kernel(border * (1 - 1e-13), degrees);
      const outside = kernel(border * (1 + 1e-13), degrees);
      expect(off(inside, outside), `${degrees}°`).toBeLessThan(1e-11);
    }
  });

  it('is continuous over the imaginary axis, where the middle region reflects', () => {
    for (const modulus of [11, 20, 30]) {
      expect(off(kernel(modulus, 90 - 1e-11), kernel(modulus, 90 + 1e-11))).toBeLessThan(1e-11);
    }
  });

  it('is real for real u and conjugate for conjugate u', () => {
    for (const modulus of [0.5, 15, 50]) {
      expect(Math.abs(kernel(modulus, 0)[1])).toBeLessThan(1e-16);
      const [re, im] = kernel(modulus, 40);
      expect(off(kernel(modulus, -40), [re, -im])).toBeLessThan(1e-14);
    }
  });
});

describe('F′(u)', () => {
  it.each([0.05, 1, 7, 9.9, 10.1, 20, 37, 39, 80])('is the limit of differences at |u| = %f', (modulus) => {
    for (const degrees of [-45, 0, 45, 75, 89, 91, 110, 130]) {
      const h = 1e-3 * modulus;
      const at = (k: number): Pair => kernel(modulus + k * h, degrees);
      const [a, b, c, d] = [at(-2), at(-1), at(1), at(2)];
      const angle = (-degrees * Math.PI) / 180;
      const dr = (a[0] - 8 * b[0] + 8 * c[0] - d[0]) / (12 * h);
      const di = (a[1] - 8 * b[1] + 8 * c[1] - d[1]) / (12 * h);
      const wanted: Pair = [
        dr * Math.cos(angle) - di * Math.sin(angle),
        dr * Math.sin(angle) + di * Math.cos(angle),
      ];
      expect(off(derivative(modulus, degrees), wanted), `${degrees}°`).toBeLessThan(1e-8);
    }
  });
});
