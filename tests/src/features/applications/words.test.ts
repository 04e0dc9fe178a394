import { describe, expect, it } from 'vitest';
import { discrepanciesWords } from '../../../../src/features/applications/model/words';

describe('discrepancies, counted', () => {
  it('says each state that one is in, open first', () => {
    const of = (...states: ('open' | 'answered' | 'settled' | 'waived')[]) =>
      states.map((state) => ({ state }));
    expect(discrepanciesWords(of('settled', 'answered'))).toBe('1 answered, 1 settled');
    expect(discrepanciesWords(of('waived', 'open', 'open'))).toBe('2 open, 1 waived');
  });
});
