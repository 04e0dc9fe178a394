import { describe, expect, it } from 'vitest';
import { drawApplicationNumber, isApplicationNumber } from '#shared/workflow/application-number';
import { revisionLetter, revisionOrdinal } from '#shared/workflow/revision-letters';

describe('revision letters', () => {
  it.each([
    [1, 'A'],
    [26, 'Z'],
    [27, 'AA'],
    [52, 'AZ'],
    [53, 'BA'],
    [702, 'ZZ'],
    [703, 'AAA'],
  ])('%i is %s', (ordinal, letter) => {
    expect(revisionLetter(ordinal)).toBe(letter);
    expect(revisionOrdinal(letter)).toBe(ordinal);
  });

  it('go there and back for all of three letters', () => {
    const seen = new Set<string>();
    for (let n = 1; n <= 18_278; n++) {
      const letter = revisionLetter(n);
      expect(revisionOrdinal(letter)).toBe(n);
      seen.add(letter);
    }
    expect(seen.size).toBe(18_278);
  });

  it.each([0, -1, 1.5, Number.NaN])('there is none for %d', (n) => {
    expect(() => revisionLetter(n)).toThrow(RangeError);
  });

  it.each(['', 'a', 'A1', 'AAAA', ' A'])('%j is none', (text) => {
    expect(revisionOrdinal(text)).toBeUndefined();
  });
});

describe('application numbers', () => {
  it('have the year and four digits', () => {
    expect(drawApplicationNumber(2027, () => 0.04185)).toBe('27-0418');
    expect(drawApplicationNumber(2027, () => 0.99999)).toBe('27-9999');
    expect(drawApplicationNumber(2101, () => 0)).toBe('01-0000');
  });

  it('are told from UUIDs', () => {
    expect(isApplicationNumber('27-0418')).toBe(true);
    expect(isApplicationNumber('27-04181')).toBe(false);
    expect(isApplicationNumber('b52f6b0e-0000-4000-8000-000000000000')).toBe(false);
  });
});
