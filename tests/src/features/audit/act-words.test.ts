import { describe, expect, it } from 'vitest';
import { actWords } from '../../../../src/features/audit/model/act-words';

describe('an act of the record', () => {
  it('is said in words', () => {
    expect(actWords('finding.set-aside')).toBe('set a finding aside');
    expect(actWords('check.done')).toBe('the check is done');
  });

  it('without words of its own reads as it is kept', () => {
    expect(actWords('mail.sent-again')).toBe('mail sent again');
  });
});
