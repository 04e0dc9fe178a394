import { describe, expect, it } from 'vitest';
import { handCheck, impliedGeometry, type HandCheck, type OverheadSection } from '#shared/engine/index';
import { bundleProduct } from '#shared/engine/hand-check';
import { goldenLines } from './golden-lines';
import { expectPrinted, expectReal } from './tolerance';

const FOOT = 0.3048;
const MILE_KM = 1.609344;

interface Flat {
  spacingsM: [number, number];
  heightM?: number;
  gmrM: number;
  diameterM?: number;
  bundleCount?: number;
  bundleSpacingM?: number;
}

/** A flat line as the textbooks draw it. */
function flat(f: Flat): OverheadSection {
  const conductor = {
    model: 'handbook' as const,
    diameterMm: 1000 * (f.diameterM ?? f.gmrM * 2.45),
    gmrMm: 1000 * f.gmrM,
    acResistanceOhmPerKm: 0.06,
  };
  const xs = [0, f.spacingsM[0], f.spacingsM[0] + f.spacingsM[1]];
  return {
    kind: 'overhead',
    lengthKm: 1,
    earthResistivityOhmM: 100,
    groundWireBonding: 'continuous',
    positions: xs.map((horizontalM, i) => ({
      kind: 'phase' as const,
      circuit: 1,
      phase: (['a', 'b', 'c'] as const)[i] ?? 'a',
      conductor,
      horizontalM,
      attachmentHeightM: f.heightM ?? 20,
      sagM: 0,
      bundleCount: f.bundleCount ?? 1,
      bundleSpacingM: f.bundleSpacingM ?? 0,
    })),
  };
}

function check(s: OverheadSection, frequencyHz = 60, circuit = 1): HandCheck {
  const result = handCheck(s, frequencyHz, circuit);
  if (!result.ok) throw new Error(result.detail);
  return result.value;
}

describe('shortcut of the textbooks', () => {
  it('Glover/Sarma/Overbye, Problem 4.18 (T): Deq 10.079 m, L 1.342 µH/m, X 0.5059 Ω/km', () => {
    const h = check(flat({ spacingsM: [8, 8], gmrM: 0.0403 * FOOT }));
    expectPrinted(h.gmdM, 10.079, 1e-3, 1);
    expectPrinted(h.inductanceMilliHenryPerKm, 1.342, 1e-3);
    expectPrinted(h.x1.shortcut, 0.5059, 1e-4, 1);
  });

  it('same, Example 4.4 (M + C): L 1.335 µH/m, X 101 Ω for 200 km', () => {
    const h = check(flat({ spacingsM: [10, 10], gmrM: 0.052 * FOOT }));
    expectPrinted(h.inductanceMilliHenryPerKm, 1.335, 1e-3, 1);
    expectPrinted(200 * h.x1.shortcut, 101, 1);
  });

  it('same, Examples 4.5 and 4.7 (M + C): twin bundle, DSL 0.0676 m, X 78.8 Ω, DSC 0.0750 m, C 10.86 nF/km', () => {
    const twin = { bundleCount: 2, bundleSpacingM: 0.4 };
    const h = check(flat({ spacingsM: [10, 10], gmrM: 0.0375 * FOOT, diameterM: 1.108 * 0.0254, ...twin }));
    expectPrinted(h.bundleGmrM, 0.0676, 1e-4, 1);
    expectPrinted(200 * h.x1.shortcut, 78.8, 0.1, 1.5);
    expectPrinted(h.bundleRadiusM, 0.075, 1e-4);
    expectPrinted(h.capacitanceNanofaradPerKm, 10.86, 0.01, 1);
    // Y of 200 km: j8.19e−4 S.
    expectPrinted(200 * h.b1.shortcut, 819, 1);
  });

  it('Grainger & Stevenson, Examples 4.4 and 5.2 (M + C): Drake 20/20/38 ft', () => {
    // The triangle 20, 20, 38 ft: b hangs above the middle of ac.
    const rise = Math.sqrt(20 * 20 - 19 * 19) * FOOT;
    const base = flat({ spacingsM: [19 * FOOT, 19 * FOOT], gmrM: 0.0373 * FOOT, diameterM: 1.108 * 0.0254 });
    const positions = base.positions.map((p, i) =>
      i === 1 ? { ...p, attachmentHeightM: p.attachmentHeightM + rise } : p,
    );
    const h = check({ ...base, positions });
    expectPrinted(h.gmdM / FOOT, 24.77, 0.01, 1);
    expectPrinted(h.inductanceMilliHenryPerKm, 1.3, 0.001, 1);
    expectPrinted(h.x1.shortcut * MILE_KM, 0.788, 0.001, 1);
    // The book's ε₀ is 8.85e−12 F/m.
    expectReal(h.capacitanceNanofaradPerKm, 8.847, 1e-3);
    expectReal(1 / (h.b1.shortcut / MILE_KM) / MILE_KM ** 2, 0.1863, 1e-3);
  });

  it('same, Examples 4.5 and 5.3 (M + C): Pheasant twin, X 0.365 Ω/km, Xc 0.2257 MΩ·km', () => {
    const twin = { bundleCount: 2, bundleSpacingM: 0.45 };
    const h = check(flat({ spacingsM: [8, 8], gmrM: 0.0466 * FOOT, diameterM: 1.382 * 0.0254, ...twin }));
    expectPrinted(h.gmdM, 10.08, 0.01);
    expectPrinted(h.bundleGmrM, 0.0799, 1e-4, 1);
    expectPrinted(h.x1.shortcut, 0.365, 1e-3);
    expectPrinted(h.bundleRadiusM, 0.0889, 1e-4, 1);
    expectReal(1 / h.b1.shortcut, 0.2257, 1e-3);
  });

  it('bundle products: d, d², √2·d³ (hence the textbooks’ 1.09·⁴√(GMR·d³))', () => {
    expectReal(bundleProduct(1, 0), 1, 0);
    expectReal(bundleProduct(2, 0.4), 0.4, 1e-14);
    expectReal(bundleProduct(3, 0.4), 0.16, 1e-14);
    expectReal(bundleProduct(4, 0.4), Math.SQRT2 * 0.064, 1e-14);
    expectPrinted(bundleProduct(4, 1) ** 0.25, 1.09, 0.01);
  });
});

describe('bundle factors of common practice (no source; figures of facts.md section 10, C)', () => {
  const falcon = { gmrM: 0.01589, diameterM: 1.544 * 0.0254 };
  const drake = { gmrM: 0.01142, diameterM: 1.107 * 0.0254 };
  const hawk = { gmrM: 0.00884, diameterM: 0.858 * 0.0254 };
  const side = 0.4572;

  function ratios(f: Flat, single: Flat): [number, number] {
    const [a, b] = [check(flat(f)), check(flat(single))];
    return [a.x1.shortcut / b.x1.shortcut, a.b1.shortcut / b.b1.shortcut];
  }

  it('about 0.8/1.25 for two and 0.7/1.4 for three hold when the bundle replaces one conductor of equal total area', () => {
    const spacingsM: [number, number] = [11, 11];
    const [l2, c2] = ratios(
      { spacingsM, ...drake, bundleCount: 2, bundleSpacingM: side },
      { spacingsM, ...falcon },
    );
    const [l3, c3] = ratios(
      { spacingsM, ...hawk, bundleCount: 3, bundleSpacingM: side },
      { spacingsM, ...falcon },
    );
    expect(Math.abs(l2 - 0.8)).toBeLessThan(0.035);
    expect(Math.abs(c2 - 1.25)).toBeLessThan(0.035);
    expect(Math.abs(l3 - 0.7)).toBeLessThan(0.035);
    expect(Math.abs(c3 - 1.4)).toBeLessThan(0.035);
    for (const [got, wanted] of [
      [l2, 0.777],
      [c2, 1.273],
      [l3, 0.699],
      [c3, 1.409],
    ] as const) {
      expect(Math.abs(got - wanted)).toBeLessThan(0.002);
    }
  });

  it('with the same subconductor, as when a bundle was forgotten, they are 0.71–0.75 and 1.33–1.39', () => {
    const spacingsM: [number, number] = [8, 8];
    const [l2, c2] = ratios(
      { spacingsM, ...drake, bundleCount: 2, bundleSpacingM: side },
      { spacingsM, ...drake },
    );
    const [l3, c3] = ratios(
      { spacingsM, ...drake, bundleCount: 3, bundleSpacingM: side },
      { spacingsM, ...drake },
    );
    for (const [got, wanted] of [
      [l2, 0.728],
      [c2, 1.36],
      [l3, 0.637],
      [c3, 1.546],
    ] as const) {
      expect(Math.abs(got - wanted)).toBeLessThan(0.002);
    }
  });
});

describe('shortcut against the full method', () => {
  it.each(goldenLines)(
    '$name: the causes add up to the difference, which stays below 3 % in X1 and 8 % in B1',
    (line) => {
      line.answers[0]?.circuits.forEach((answer, c) => {
        const h = check(line.section, line.frequencyHz, c + 1);
        for (const value of [h.r1, h.x1, h.b1]) {
          const sum = value.causes.reduce((total, cause) => total + cause.difference, 0);
          expect(Math.abs(sum - value.difference)).toBeLessThan(1e-12);
          expectReal(value.shortcut + value.difference, value.full, 1e-12);
        }
        expectReal(h.x1.full, answer.z1OhmPerKm[1] ?? NaN, 1e-8);
        expect(Math.abs(h.x1.difference / h.x1.full)).toBeLessThan(0.03);
        expect(Math.abs(h.b1.difference / h.b1.full)).toBeLessThan(0.08);
      });
    },
  );

  it('a single circuit of single wires high above the earth has no cause left but its asymmetry', () => {
    const h = check(flat({ spacingsM: [8, 8], gmrM: 0.012, heightM: 5000 }));
    expect(Math.abs(h.x1.difference)).toBeLessThan(1e-6);
    expect(Math.abs(h.x1.causes.find((k) => k.cause === 'ground-wires')?.difference ?? 1)).toBe(0);
  });
});

describe('implied geometry', () => {
  it.each(goldenLines.slice(0, 8))('gives the drawn one back for the recomputed values: $name', (line) => {
    const h = check(line.section, line.frequencyHz);
    const implied = impliedGeometry({
      x1: h.x1.full,
      b1: h.b1.full,
      frequencyHz: line.frequencyHz,
      diameterMm: 2000 * h.radiusM,
      bundleCount: h.bundleCount,
      bundleSpacingM: h.bundleSpacingM,
      reference: h,
    });
    expectReal(implied?.meanSpacingM ?? NaN, h.gmdM, 1e-9);
    expectReal(implied?.gmrMm ?? NaN, 1000 * h.gmrM, 1e-8);
  });

  it('shows that X per mile for per km needs a conductor that no one makes', () => {
    const h = check(
      flat({ spacingsM: [9, 9], gmrM: 0.01137, diameterM: 0.02814, bundleCount: 2, bundleSpacingM: 0.4572 }),
    );
    const input = {
      frequencyHz: 60,
      diameterMm: 28.14,
      bundleCount: 2,
      bundleSpacingM: 0.4572,
      reference: h,
    };
    const implied = impliedGeometry({ ...input, x1: h.x1.full * MILE_KM, b1: h.b1.full });
    expect(implied?.gmrOverRadius).toBeLessThan(0.01);
    const other = impliedGeometry({ ...input, x1: h.x1.full / MILE_KM, b1: h.b1.full });
    expect(other?.gmrOverRadius).toBeGreaterThan(1);
  });
});
