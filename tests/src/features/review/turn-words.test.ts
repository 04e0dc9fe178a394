import { describe, expect, it } from 'vitest';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { turnWords } from '../../../../src/features/review/model/turn-words';

const discrepancy = (state: Discrepancy['state'], entries: Partial<Discrepancy['entries'][number]>[] = []) =>
  ({ state, entries }) as Discrepancy;

describe('whose turn a discrepancy is', () => {
  it('follows the case', () => {
    expect(turnWords(discrepancy('open'), 'in-review', 'you')).toBe('goes with the letter');
    expect(turnWords(discrepancy('open'), 'returned', 'you')).toBe('with the applicant');
    expect(turnWords(discrepancy('answered'), 'in-review', 'you')).toBe('answered, your turn');
    expect(turnWords(discrepancy('answered'), 'in-review', 'M. Thornholt')).toBe(
      'answered, with M. Thornholt',
    );
  });

  it('names the revision that closed it last', () => {
    const entries = [
      { kind: 'settled', revision: 'B' },
      { kind: 'reopened', revision: 'B' },
      { kind: 'settled', revision: 'C' },
    ] as const;
    expect(turnWords(discrepancy('settled', [...entries]), 'in-review', 'you')).toBe('settled on revision C');
  });
});
