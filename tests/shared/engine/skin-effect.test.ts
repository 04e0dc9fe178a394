import { describe, expect, it } from 'vitest';
import { tubeImpedance } from '#shared/engine/conductor';
import { tubeSensitivity } from '#shared/engine/tube-sensitivity';
import table from '../../golden/engine/skin-effect.json';
import { expectComplex } from './tolerance';

const out = new Float64Array(2);

function impedance(dc: number, outerMm: number, coreMm: number, frequencyHz: number): [number, number] {
  tubeImpedance(dc, outerMm / 1000, coreMm / 1000, 2 * Math.PI * frequencyHz, out);
  return [out[0] ?? NaN, out[1] ?? NaN];
}

// skin-effect.json: Bessel functions at 34 digits (see the file's first line).
describe('internal impedance against the golden table', () => {
  it.each(table.rows)('$frequencyHz Hz, $outerRadiusMm / $coreRadiusMm mm', (row) => {
    const got = impedance(row.dcResistanceOhmPerKm, row.outerRadiusMm, row.coreRadiusMm, row.frequencyHz);
    expectComplex(got, row.internalImpedanceOhmPerKm, 1e-10);
  });
});

describe('internal impedance as published', () => {
  // facts.md section 2.3, columns of the classical table (NBS, Stevenson): tag C, equal to the published ones (M).
  const solid = [
    [0.5, 1.00032, 0.99984],
    [1, 1.00519, 0.99741],
    [2, 1.07816, 0.96114],
    [3, 1.3181, 0.84517],
    [5, 2.04273, 0.55597],
    [10, 3.79858, 0.28162],
  ] as const;

  it.each(solid)('solid wire, mr = %f', (mr, resistanceRatio, inductanceRatio) => {
    // mr = r√(ωμ/ρ) with ρ = R·πr², so R = 4·10⁻⁷·ω/mr² per metre.
    const omega = 2 * Math.PI * 60;
    const dc = (1000 * omega * 4e-7) / (mr * mr);
    const [r, x] = impedance(dc, 10, 0, 60);
    // Some columns of the old table are cut off instead of rounded: one unit of the last digit.
    expect(Math.abs(r / dc - resistanceRatio)).toBeLessThan(1e-5);
    // L/L₀ with L₀ = μ₀/8π.
    expect(x / ((1000 * omega * 4e-7) / 8)).toBeCloseTo(inductanceRatio, 4);
  });

  // Same section, annulus b/a and m·a (tag C).
  const tubes = [
    [0.25, 1, 1.003327],
    [0.25, 4, 1.544464],
    [0.5, 2, 1.015132],
    [0.5, 4, 1.214279],
    [0.75, 3, 1.006032],
    [0.75, 4, 1.018943],
  ] as const;

  it.each(tubes)('tube b/a = %f, ma = %f', (ratio, ma, resistanceRatio) => {
    const omega = 2 * Math.PI * 60;
    const dc = (1000 * omega * 4e-7) / (ma * ma * (1 - ratio * ratio));
    const [r] = impedance(dc, 10, 10 * ratio, 60);
    expect(Math.abs(r / dc - resistanceRatio)).toBeLessThan(1e-6);
  });
});

describe('internal impedance at its limits', () => {
  it.each([
    [10, 0],
    [10, 4],
    [10, 9.9],
  ])('is the d.c. resistance at low frequency: %f / %f mm', (outer, core) => {
    const [r, x] = impedance(0.1, outer, core, 0.1);
    expect(Math.abs(r / 0.1 - 1)).toBeLessThan(1e-7);
    expect(x).toBeGreaterThan(0);
    expect(x).toBeLessThan(1e-4);
  });

  it('does not overflow at 1 MHz and takes the skin depth’s impedance (1 + j)·ρ/(2πaδ)', () => {
    const [r, x] = impedance(0.02, 20, 8, 1e6);
    expect(Number.isFinite(r + x)).toBe(true);
    // A plane skin: R and X equal but for the curvature, δ/2a of R.
    expect(Math.abs(r / x - 1)).toBeLessThan(0.01);
  });

  it('a tube with a vanishing core is the solid wire', () => {
    for (const f of [50, 5e3, 1e6]) {
      expectComplex(impedance(0.05, 12, 1e-7, f), impedance(0.05, 12, 0, f), 1e-9, `${f} Hz`);
    }
  });

  it('a thin wall is a plane sheet with current on one side: R/R₀ = 1 + (4/45)(t/δ)⁴', () => {
    // First term of (t/δ)·(sinh 2t/δ + sin 2t/δ)/(cosh 2t/δ − cos 2t/δ), the sheet carrying its field on one side.
    const omega = 2 * Math.PI * 1000;
    const resistivity = 0.3e-3 * Math.PI * (0.01 ** 2 - 0.00995 ** 2);
    const depth = Math.sqrt((2 * resistivity) / (omega * 4e-7 * Math.PI));
    const excess = (4 / 45) * (0.05e-3 / depth) ** 4;
    const [r] = impedance(0.3, 10, 9.95, 1000);
    expect((r / 0.3 - 1) / excess).toBeCloseTo(1, 2);
  });
});

describe('slopes of the internal impedance', () => {
  it.each([
    [0.08, 14, 0, 60],
    [0.08, 14, 5, 60],
    [0.03, 18, 6, 5e4],
    [0.5, 5, 4.8, 400],
  ])('match differences: %f Ω/km, %f / %f mm, %f Hz', (dc, outer, core, f) => {
    const slope = tubeSensitivity(dc, outer / 1000, core / 1000, 2 * Math.PI * f);
    const h = 1e-4;
    const difference = (at: (k: number) => [number, number]): [number, number] => {
      const [a, b] = [at(Math.exp(h)), at(Math.exp(-h))];
      return [(a[0] - b[0]) / (2 * h), (a[1] - b[1]) / (2 * h)];
    };
    expectComplex(
      slope.byLogResistance,
      difference((k) => impedance(dc * k, outer, core, f)),
      1e-6,
      'R',
      1e-3,
    );
    expectComplex(
      slope.byLogRadius,
      difference((k) => impedance(dc, outer * k, core, f)),
      1e-6,
      'radius',
      1e-2,
    );
  });
});
