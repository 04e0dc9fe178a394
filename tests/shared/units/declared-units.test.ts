import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formOf, fromSi, isOnBase, toSi, unitsOf } from '#shared/units/declared-units';
import type { QuantityKind } from '#shared/units/declared-units';
import { FACTORS } from '#shared/units/factors.generated';

const at = (more: object = {}) => ({
  frequencyHz: 60,
  nominalVoltageKv: 345,
  baseMva: 100,
  baseKv: 345,
  ...more,
});
const KINDS: QuantityKind[] = ['resistance', 'reactance', 'susceptance'];

describe('the closed list', () => {
  it('is the one that the filing format names', () => {
    expect(unitsOf('resistance').sort()).toEqual(['%', 'ohm', 'ohm/kft', 'ohm/km', 'ohm/mi', 'pu']);
    expect(unitsOf('reactance').sort()).toEqual([
      '%',
      'mH/km',
      'mH/mi',
      'ohm',
      'ohm/kft',
      'ohm/km',
      'ohm/mi',
      'pu',
    ]);
    expect(unitsOf('susceptance').sort()).toEqual(
      ['%', 'Mvar', 'nF/km', 'nF/mi', 'pu', 'uF/km', 'uS', 'uS/km', 'uS/mi'].sort(),
    );
  });

  it('knows what is per length and what is on a base', () => {
    expect(formOf('reactance', 'mH/mi')).toBe('per-length');
    expect(formOf('susceptance', 'Mvar')).toBe('whole-line');
    expect(formOf('resistance', 'mH/km')).toBeNull();
    expect(KINDS.flatMap((k) => unitsOf(k).filter((u) => isOnBase(k, u)))).toEqual([
      'pu',
      '%',
      'pu',
      '%',
      'pu',
      '%',
    ]);
  });

  it('knows no name that an object inherits', () => {
    expect(toSi('resistance', 1, 'constructor', at())).toBeNull();
    expect(formOf('resistance', 'toString')).toBeNull();
    expect(fromSi('resistance', 1, '__proto__', at())).toBeNull();
  });
});

describe('factors', () => {
  it('are those of the international mile, foot and inch (1959 agreement: 1609.344 m, 0.3048 m, 0.0254 m)', () => {
    expect(FACTORS.length.mi).toBe(1609.344);
    expect(FACTORS.length.ft).toBe(0.3048);
    expect(FACTORS.length.in).toBe(0.0254);
    expect(FACTORS.perLengthImpedance['ohm/mi']).toBeCloseTo(1 / 1.609344, 14);
    expect(FACTORS.perLengthImpedance['ohm/kft']).toBeCloseTo(1 / 0.3048, 13);
    // A circular mil is the area of a circle of one thousandth of an inch: π/4 · 0.0254² mm².
    expect(FACTORS.area.kcmil).toBeCloseTo((Math.PI / 4) * 0.0254 ** 2 * 1000, 14);
  });
});

describe('conversions against published values', () => {
  /** Within half a unit of the last printed digit of both sides. */
  const near = (x: number | undefined, printed: number, relative: number) => {
    expect(Math.abs((x ?? NaN) / printed - 1)).toBeLessThan(relative);
  };

  it('Glover/Sarma/Overbye, examples 4.5 and 4.7 (M+C): 1.046 mH/km over 200 km is 78.8 Ω; 10.86 nF/km is 819 µS, 97.4 Mvar', () => {
    near(toSi('reactance', 1.046, 'mH/km', at())?.si, 78.8 / 200, 1.5e-3);
    near(toSi('susceptance', 10.86, 'nF/km', at())?.si, 819 / 200, 1e-3);
    near(toSi('susceptance', 97.4, 'Mvar', at())?.si, 819, 1.2e-3);
  });

  it('Grainger & Stevenson, example 4.5 (M+C): 0.365 Ω/km is 0.587 Ω/mile; 160 km are 0.049 pu on 100 MVA, 345 kV', () => {
    near(toSi('reactance', 0.587, 'ohm/mi', at())?.si, 0.365, 2e-3);
    near(toSi('reactance', 0.049, 'pu', at())?.si, 0.365 * 160, 1.1e-2);
  });

  it('by definition: pu of B is B·Z_b, % a hundredth of it, kft a thousand feet', () => {
    const base = (345 * 345) / 100;
    expect(toSi('susceptance', 1, 'pu', at())?.si).toBeCloseTo(1e6 / base, 9);
    expect(toSi('susceptance', 1, '%', at())?.si).toBeCloseTo(1e4 / base, 9);
    expect(toSi('resistance', 3, '%', at())?.si).toBeCloseTo(0.03 * base, 9);
    expect(toSi('resistance', 1, 'ohm/kft', at())?.si).toBeCloseTo(1 / 0.3048, 12);
  });

  it('at the line’s own frequency, voltage and base', () => {
    const ratio = (kind: QuantityKind, unit: string, more: object) =>
      (toSi(kind, 1, unit, at(more))?.si ?? NaN) / (toSi(kind, 1, unit, at())?.si ?? NaN);
    expect(ratio('reactance', 'mH/km', { frequencyHz: 50 })).toBeCloseTo(50 / 60, 12);
    expect(ratio('susceptance', 'nF/mi', { frequencyHz: 50 })).toBeCloseTo(50 / 60, 12);
    expect(ratio('reactance', 'pu', { baseMva: 1000 })).toBeCloseTo(0.1, 12);
    expect(ratio('susceptance', 'pu', { baseKv: 690 })).toBeCloseTo(0.25, 12);
    expect(ratio('susceptance', 'Mvar', { nominalVoltageKv: 690 })).toBeCloseTo(0.25, 12);
    expect(ratio('susceptance', 'Mvar', { baseKv: 690 })).toBe(1);
  });
});

describe('both ways', () => {
  it('every unit comes back to the value it came from', () => {
    const kindAndUnit = fc.constantFrom(...KINDS.flatMap((k) => unitsOf(k).map((u) => [k, u] as const)));
    const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(kindAndUnit, value, fc.constantFrom(50, 60), ([kind, unit], x, frequencyHz) => {
        const context = at({ frequencyHz });
        const si = toSi(kind, x, unit, context)?.si ?? NaN;
        const back = fromSi(kind, si, unit, context) ?? NaN;
        // Very small values round to the grid of denormals on the way.
        expect(Math.abs(back - x)).toBeLessThanOrEqual(Math.abs(x) * 1e-15 * 2 + 1e-300);
      }),
    );
  });
});
