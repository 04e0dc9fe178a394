import { describe, expect, it } from 'vitest';
import { splitMessage } from '../../../../src/components/charts/finding-says';

describe('what a finding says', () => {
  it('is parted from its figures', () => {
    expect(splitMessage('X1 is 61 % above what the geometry gives: 0.613 Ω/km declared.')).toEqual({
      says: 'X1 is 61 % above what the geometry gives.',
      detail: '0.613 Ω/km declared.',
    });
    expect(splitMessage('R0 is missing. It is owed.')).toEqual({
      says: 'R0 is missing.',
      detail: 'It is owed.',
    });
    expect(splitMessage('One sentence of 0.5 m.')).toEqual({ says: 'One sentence of 0.5 m.', detail: null });
  });
});
