import { describe, expect, it } from 'vitest';
import { nextStepSentence } from '../../../../src/features/applications/model/next-step';
import { aDiscrepancy, aDraft, aDraftLine, aWindow, anApplication } from './case';

const check = (state: 'queued' | 'running' | 'done' | 'failed') => ({
  run: 1,
  state,
  lineCount: 2,
  linesChecked: 0,
  startedAt: null,
  finishedAt: null,
  failure: null,
});

describe('the sentence on what is next', () => {
  it('of a draft says what it lacks, or that it can be filed', () => {
    const draft = anApplication();
    expect(nextStepSentence(draft, aDraft(), [])).toMatch(/^Add the lines/);
    expect(nextStepSentence(draft, aDraft(aDraftLine('L1', false), aDraftLine('L2', true)), [])).toBe(
      '1 line still lacks something before you can file.',
    );
    expect(nextStepSentence(draft, aDraft(aDraftLine('L1', false), aDraftLine('L2', false)), [])).toBe(
      '2 lines still lack something before you can file.',
    );
    expect(nextStepSentence(draft, aDraft(aDraftLine('L1', true)), [])).toMatch(/^Everything is there/);
  });

  it('of a filed one follows its check', () => {
    const filed = anApplication({ state: 'filed', revision: 'A' });
    expect(nextStepSentence({ ...filed, check: check('running') }, null, [])).toMatch(/check is under way/);
    expect(nextStepSentence({ ...filed, check: check('failed') }, null, [])).toMatch(/could not be made/);
    expect(nextStepSentence({ ...filed, check: check('done') }, null, [])).toMatch(
      /Northmoor Grid takes it up/,
    );
  });

  it('of a returned one counts what is asked and what is left to answer', () => {
    const returned = anApplication({
      state: 'returned',
      revision: 'B',
      nextRevision: 'C',
      window: aWindow('cure', '2027-03-09T10:00:00Z', null),
    });
    const head = 'Northmoor Grid returned revision B on 9 Mar 2027 with 2 discrepancies.';
    const sentence = (...states: ('open' | 'answered' | 'settled')[]) =>
      nextStepSentence(
        returned,
        aDraft(),
        states.map((s, i) => aDiscrepancy(i + 1, s)),
      );
    expect(sentence('settled', 'open', 'open')).toBe(`${head} Answer both, then file revision C.`);
    expect(sentence('answered', 'open')).toBe(`${head} One is left to answer, then file revision C.`);
    expect(sentence('answered', 'answered')).toBe(`${head} All are answered: file revision C.`);
    expect(sentence('open')).toBe(
      'Northmoor Grid returned revision B on 9 Mar 2027 with 1 discrepancy. Answer it, then file revision C.',
    );
  });

  it('of a decided one names the revision that it was made on', () => {
    const accepted = anApplication({ state: 'accepted', revision: 'B' });
    expect(nextStepSentence(accepted, null, [])).toMatch(/^Revision B is accepted/);
    expect(nextStepSentence(anApplication({ state: 'withdrawn' }), null, [])).toBe(
      'You withdrew this application.',
    );
  });

  it('of an amendment that ended says that the accepted record stands', () => {
    const withdrawn = anApplication({ state: 'withdrawn', revision: 'C', acceptedRevision: 'B' });
    expect(nextStepSentence(withdrawn, null, [])).toBe(
      'You withdrew the amendment. Revision B stands as accepted.',
    );
  });
});
