import { describe, expect, it } from 'vitest';
import { discrepancyLead, gradeLead, reviewLead } from '../../../../src/features/review/model/lead';

describe('what the heading says', () => {
  it('counts what must be answered and explained', () => {
    expect(gradeLead({ mustAnswer: 1, explain: 2, note: 1 })).toBe(
      'One finding must be answered, two want an explanation.',
    );
    expect(gradeLead({ mustAnswer: 0, explain: 1, note: 0 })).toBe('One finding wants an explanation.');
    expect(gradeLead({ mustAnswer: 0, explain: 0, note: 3 })).toBe(
      'Nothing has to be answered or explained.',
    );
    expect(gradeLead(null)).toBe('');
  });

  it('says whose turn it is', () => {
    expect(
      discrepancyLead([
        { number: 1, state: 'settled' },
        { number: 2, state: 'answered' },
        { number: 3, state: 'open' },
        { number: 4, state: 'open' },
      ]),
    ).toBe('D-2 is answered: your turn. D-3 and D-4 are open and would go with the letter.');
    expect(discrepancyLead([{ number: 2, state: 'answered' }], 'M. Thornholt')).toBe(
      'D-2 is answered: M. Thornholt settles or asks again.',
    );
    expect(discrepancyLead([])).toBe('');
  });

  it('follows a check that is under way, and says when it failed', () => {
    const base = { state: 'filed', grades: null, revision: 'A', reviewer: null } as const;
    const check = { run: 1, lineCount: 5, linesChecked: 2, startedAt: null, finishedAt: null };
    expect(reviewLead({ ...base, check: { ...check, state: 'running', failure: null } }, [])).toBe(
      'Revision A is being checked: 2 of 5 lines.',
    );
    expect(reviewLead({ ...base, check: { ...check, state: 'failed', failure: 'No rules.' } }, [])).toBe(
      'The check of revision A failed: No rules.',
    );
  });
});
