import { describe, expect, it } from 'vitest';
import { figure, fixed, percent, quantity, rangeTexts, signedPercent } from '#shared/format/numbers';

describe('numbers', () => {
  it('keep significant digits', () => {
    expect(figure(0.38119)).toBe('0.381');
    expect(figure(0.0401, 3)).toBe('0.0401');
    expect(figure(296.12, 3)).toBe('296');
    expect(figure(1.2, 3)).toBe('1.20');
    expect(figure(9.9996, 3)).toBe('10.0');
    expect(figure(0)).toBe('0.00');
  });

  it('group thousands, carry a true minus and thin spaces', () => {
    expect(figure(6412, 4)).toBe('6\u202f412');
    expect(figure(-0.5, 2)).toBe('\u22120.50');
    expect(fixed(-6412.5, 1)).toBe('\u22126\u202f412.5');
    expect(fixed(-0.0001, 2)).toBe('0.00');
    expect(quantity(0.367, 'Ω/km')).toBe('0.367\u2009Ω/km');
    expect(quantity(12.5, '')).toBe('12.5');
  });

  it('write what cannot be written plainly with an exponent, and no number as none', () => {
    expect(figure(1.23e-7)).toBe('1.23e\u22127');
    expect(figure(Number.NaN)).toBe('none');
    expect(figure(Infinity)).toBe('none');
  });

  it('sign a difference', () => {
    expect(signedPercent(0.608)).toBe('+60.8\u2009%');
    expect(signedPercent(-0.0058)).toBe('\u22120.6\u2009%');
    expect(signedPercent(0.0001)).toBe('0.0\u2009%');
    expect(percent(9.7)).toBe('970\u2009%');
  });

  it('write both ends of a range alike', () => {
    expect(rangeTexts(0.33, 0.4)).toEqual(['0.33', '0.40']);
    expect(rangeTexts(255, 425)).toEqual(['255', '425']);
    expect(rangeTexts(0.025, 0.055)).toEqual(['0.025', '0.055']);
    expect(rangeTexts(0.965, 0.983, 3)).toEqual(['0.965', '0.983']);
  });
});
