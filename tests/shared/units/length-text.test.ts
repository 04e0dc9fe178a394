import { describe, expect, it } from 'vitest';
import { convertArea, convertLength, LENGTH_UNITS, readArea, readLength } from '#shared/units/length-text';

describe('lengths as typed', () => {
  it('carry their unit, or the field’s', () => {
    expect(readLength('59 ft', 'm')).toEqual({ value: 59, unit: 'ft', digits: '59' });
    expect(readLength('18.0', 'm')).toEqual({ value: 18, unit: 'm', digits: '18.0' });
    expect(readLength(' 26.4mi ', 'km')).toEqual({ value: 26.4, unit: 'mi', digits: '26.4' });
    expect(readLength('42,5 km', 'km', 'comma')).toEqual({ value: 42.5, unit: 'km', digits: '42.5' });
    expect(readArea('795 kcmil', 'mm2')).toEqual({ value: 795, unit: 'kcmil', digits: '795' });
  });

  it.each(['', 'ft', '12 miles', '1,000 m', '5 m2', '1 m 20 cm', '3 FT', '١ m', 'NaN m'])(
    'are not read from %j',
    (text) => {
      expect(readLength(text, 'm')).toBeNull();
    },
  );

  it('convert by definition', () => {
    expect(convertLength(59, 'ft', 'm')).toBeCloseTo(17.9832, 12);
    expect(convertLength(18, 'in', 'm')).toBeCloseTo(0.4572, 12);
    expect(convertLength(1, 'mi', 'km')).toBe(1.609344);
    // Drake, 795 kcmil: 402.8 mm² of aluminium (ASTM B232 size).
    expect(convertArea(795, 'kcmil', 'mm2')).toBeCloseTo(402.8, 1);
  });

  it('keep a number that stays in its unit', () => {
    for (const unit of LENGTH_UNITS) expect(convertLength(0.1 + 0.2, unit, unit)).toBe(0.1 + 0.2);
    expect(convertArea(0.1, 'kcmil', 'kcmil')).toBe(0.1);
  });
});
