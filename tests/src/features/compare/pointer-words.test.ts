import { describe, expect, it } from 'vitest';
import { placeWords, valueWords } from '../../../../src/features/compare/model/pointer-words';

describe('a field that differs', () => {
  it('is named by its place', () => {
    expect(placeWords('/sections/0/positions/1/attachmentHeightM')).toBe(
      'Section 1, position 2, attachment height',
    );
    expect(placeWords('/declared/0/x1/value')).toBe('Declared circuit 1, X1');
    expect(placeWords('/nominalVoltageKv')).toBe('Nominal voltage');
    expect(placeWords('')).toBe('The whole line');
  });

  it('shows its value, or that there was none', () => {
    expect(valueWords(undefined)).toBe('not given');
    expect(valueWords(24)).toBe('24');
    expect(valueWords(0.613)).toBe('0.613');
    expect(valueWords(-6.5)).toBe('\u22126.5');
    expect(valueWords(true)).toBe('yes');
    expect(valueWords({ a: 1 })).toBe('{"a":1}');
  });
});
