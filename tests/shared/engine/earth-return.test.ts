import { describe, expect, it } from 'vitest';
import { earthMean, earthScale } from '#shared/engine/earth-return';
import table from '../../golden/engine/earth-return.json';
import { seededRandom } from './random-lines';
import { earthByQuadrature } from './reference';
import { deviation, expectComplex } from './tolerance';

const out = new Float64Array(2);

/** ½[F(u₊) + F(u₋)] from metres. */
function mean(heightSumM: number, offsetM: number, omega: number, rho: number): [number, number] {
  const scale = earthScale(omega, rho);
  const logD = Math.log(scale * Math.hypot(heightSumM, offsetM));
  earthMean(scale * heightSumM, scale * offsetM, logD, out);
  return [out[0] ?? NaN, out[1] ?? NaN];
}

// earth-return.json: closed form at 34 digits, checked by quadrature when the table was made (see its first line).
// It holds P + jQ-like pairs: the integral as mean of F, and jωμ₀/π times it in Ω/km.
describe('Carson’s earth return against the golden table', () => {
  it.each(table.rows)(
    '$frequencyHz Hz, ρ $earthResistivityOhmM, H $heightSumM, x $horizontalDistanceM',
    (row) => {
      const omega = 2 * Math.PI * row.frequencyHz;
      const got = mean(row.heightSumM, row.horizontalDistanceM, omega, row.earthResistivityOhmM);
      expectComplex(got, row.integral, 1e-10, 'integral');
      const factor = 4e-4 * omega;
      expectComplex([-factor * got[1], factor * got[0]], row.impedanceOhmPerKm, 1e-10, 'impedance');
    },
  );
});

describe('earth return against numerical quadrature', () => {
  const random = seededRandom(7);
  const cases = Array.from({ length: 120 }, () => ({
    frequencyHz: 0.1 * 10 ** (7 * random()),
    rho: 10 ** (4 * random()),
    h: 10 + 290 * random() ** 2,
    x: 100 * random() ** 2,
  }));

  it('agrees to 1e-10 over the whole range', () => {
    for (const c of cases) {
      const omega = 2 * Math.PI * c.frequencyHz;
      const [re, im] = earthByQuadrature(c.h, c.x, omega, c.rho);
      expectComplex(mean(c.h, c.x, omega, c.rho), [re / 2, im / 2], 1e-10, JSON.stringify(c));
    }
  });

  it('agrees where the offset exceeds the heights and u passes beyond 90°', () => {
    for (const scale of [0.05, 0.5, 2, 5, 7.5, 9.5, 15, 25, 36, 45]) {
      for (const [h, x] of [
        [10, 40],
        [10, 100],
        [12, 13],
        [20, 90],
      ] as const) {
        const rho = 100;
        const omega = ((scale / Math.hypot(h, x)) ** 2 * rho) / (4e-7 * Math.PI);
        const [re, im] = earthByQuadrature(h, x, omega, rho);
        expectComplex(mean(h, x, omega, rho), [re / 2, im / 2], 1e-10, `|u| ${scale}, ${h}/${x} m`);
      }
    }
  });
});

describe('earth return at its limits', () => {
  it('starts as π/8 and ½(½ − γ + ln 2 − ln k) for small k (Carson 1926)', () => {
    const k = 1e-6;
    earthMean(k, 0, Math.log(k), out);
    // In this form the integral is Q − jP of the table of terms.
    expect(out[1]).toBeCloseTo(-Math.PI / 8, 6);
    expect(out[0]).toBeCloseTo(0.5 * (0.5 - 0.5772156649 + Math.LN2 - Math.log(k)), 6);
  });

  it('vanishes for a perfect earth like 1/u − 1/u²', () => {
    const k = 1e5;
    earthMean(k, 0, Math.log(k), out);
    expectComplex([out[0] ?? NaN, out[1] ?? NaN], [Math.SQRT1_2 / k, -Math.SQRT1_2 / k], 2e-5);
  });

  it('is even in the offset', () => {
    expect(mean(20, 15, 377, 100)).toEqual(mean(20, -15, 377, 100));
    expect(mean(20, 15, 6e6, 100)).toEqual(mean(20, -15, 6e6, 100));
  });

  it('reads Carson’s table as published (P, Q at k = 1, θ = 0 and 45°)', () => {
    // facts.md section 2.1: Carson's P and Q, computed there from his series and closed form (tag C).
    earthMean(1, 0, 0, out);
    expect(deviation([out[0] ?? NaN, out[1] ?? NaN], [0.5052400891, -0.2563654868])).toBeLessThan(2e-10);
    earthMean(Math.SQRT1_2, Math.SQRT1_2, 0, out);
    expect(deviation([out[0] ?? NaN, out[1] ?? NaN], [0.4684775273, -0.2657745939])).toBeLessThan(2e-10);
  });
});
