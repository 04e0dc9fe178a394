import { describe, expect, it } from 'vitest';
import { derive, perUnit } from '#shared/engine/index';
import { expectReal } from './tolerance';

describe('derived quantities', () => {
  const c = { r1: 0.05, x1: 0.488, b1: 3.371, r0: 0.3, x0: 1.4, b0: 2.1 };

  it('follow their definitions', () => {
    const d = derive(c, 60, 230);
    expectReal(d.surgeImpedanceOhm ?? NaN, Math.sqrt(0.488 / 3.371e-6), 1e-12);
    expectReal(d.waveSpeed ?? NaN, (120 * Math.PI) / Math.sqrt(0.488 * 3.371e-6) / 299_792.458, 1e-12);
    expectReal(d.surgeImpedanceLoadingMw ?? NaN, 230 ** 2 / (d.surgeImpedanceOhm ?? NaN), 1e-12);
    expectReal(d.chargingMvarPerKm ?? NaN, 230 ** 2 * 3.371e-6, 1e-12);
    expect([d.xOverR, d.x0OverX1, d.r0OverR1, d.b0OverB1]).toEqual([
      0.488 / 0.05,
      1.4 / 0.488,
      0.3 / 0.05,
      2.1 / 3.371,
    ]);
    expect(d.r0MinusR1).toBeCloseTo(0.25, 14);
  });

  it('attenuation is r/2Z to first order, 8.686 dB a neper', () => {
    const d = derive(c, 60);
    expectReal(d.attenuationNeperPerKm ?? NaN, 0.05 / (2 * (d.surgeImpedanceOhm ?? NaN)), 0.01);
    expectReal((d.attenuationDecibelPerKm ?? NaN) / (d.attenuationNeperPerKm ?? NaN), 8.685889638, 1e-9);
    expectReal(d.phaseRadPerKm ?? NaN, Math.sqrt(0.488 * 3.371e-6), 0.01);
  });

  it('are null where the constants leave them undefined, never NaN', () => {
    for (const holes of [
      {},
      { x1: 0.4 },
      { x1: -0.4, b1: 4 },
      { x1: 0.4, b1: 0, r1: 0 },
      { x1: NaN, b1: 4 },
      { r1: 1, r0: Infinity },
    ]) {
      for (const value of Object.values(derive(holes, 60, 230))) {
        expect(value === null || !Number.isNaN(value)).toBe(true);
      }
    }
    expect(derive({}, 60).surgeImpedanceOhm).toBeNull();
    expect(derive(c, 60).surgeImpedanceLoadingMw).toBeNull();
  });
});

describe('per unit', () => {
  it('Grainger & Stevenson, Example 4.5 (M + C): 0.365 Ω/km over 160 km on 100 MVA, 345 kV is 0.049', () => {
    const totals = { r: 6.4, x: 160 * 0.3647, b: 700, r0: 40, x0: 180, b0: 400 };
    const got = perUnit(totals, 100, 345);
    expect(got?.x).toBeCloseTo(0.049, 3);
    expectReal((got?.x ?? NaN) * (got?.b ?? NaN), totals.x * totals.b * 1e-6, 1e-12);
  });

  it('needs bases', () => {
    expect(perUnit({ r: 1, x: 1, b: 1, r0: 1, x0: 1, b0: 1 }, 0, 345)).toBeNull();
    expect(perUnit({ r: 1, x: 1, b: 1, r0: 1, x0: 1, b0: 1 }, 100, NaN)).toBeNull();
  });
});
