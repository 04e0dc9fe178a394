import { describe, expect, it } from 'vitest';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { turnWords } from '../../../../src/features/review/model/turn-words';

const discrepancy = (state: Discrepancy['state'], entries: Partial<Discrepancy['entries'][number]>[] = []) =>
  ({ state, entries }) as Discrepancy;

describe('whose turn a discrepancy is', () => {
  it('follows the case', () => {
    expect(turnWords(discrepancy('open'), 'in-review')).toBe('goes with the letter');
    expect(turnWords(discrepancy('open'), 'returned')).toBe('with the applicant');
    expect(turnWords(discrepancy('answered'), 'in-review')).toBe('answered, your turn');
  });

  it('names the revision that closed it last', () => {
    const entries = [
      { kind: 'settled', revision: 'B' },
      { kind: 'reopened', revision: 'B' },
      { kind: 'settled', revision: 'C' },
    ] as const;
    expect(turnWords(discrepancy('settled', [...entries]), 'in-review')).toBe('settled on revision C');
  });
});
