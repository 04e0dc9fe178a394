import { describe, expect, it } from 'vitest';
import { deviationWords, ratioText, unitForPeople } from '#shared/format/deviations';

describe('deviations in words', () => {
  it.each([
    [0.609, '61\u2009% above'],
    [-0.032, '3.2\u2009% below'],
    [0.0058, '0.58\u2009% above'],
    [-0.9999, '100\u2009% below'],
    [12, '1200\u2009% above'],
    [0, 'equal to'],
    [-0.00001, 'equal to'],
  ])('%d is %s', (deviation, words) => {
    expect(deviationWords(deviation)).toBe(words);
  });

  it('ratios for a dimension line', () => {
    expect(ratioText(0.6135, 0.381199)).toBe('×\u20091.61');
    expect(ratioText(1, 0)).toBe('');
  });

  it('units as people write them', () => {
    expect(['ohm/km', 'ohm', 'uS/mi', 'uF/km', 'mH/km', 'Mvar', '%'].map(unitForPeople)).toEqual([
      'Ω/km',
      'Ω',
      'µS/mi',
      'µF/km',
      'mH/km',
      'Mvar',
      '%',
    ]);
  });
});
