import { describe, expect, it } from 'vitest';
import type { CaseFacts } from '#shared/workflow/case-facts';
import { isOpen, STATES, type State } from '#shared/workflow/states';
import { checkStep, STEP_RULES, STEPS, type Role, type Step } from '#shared/workflow/steps';

const ME = 'user-1';
const facts = (change: Partial<CaseFacts> = {}): CaseFacts => ({
  state: 'in-review',
  isRoundOpen: true,
  hasAcceptedRecord: false,
  reviewerId: ME,
  reviewerName: 'M. Thornholt',
  draft: { lineCount: 2, faultyLines: [], unchanged: false },
  run: { state: 'done', linesChecked: 2, lineCount: 2 },
  discrepancies: [],
  openMustAnswers: [],
  pendingCountersigns: [],
  ...change,
});
const open = (number: number) => ({ number, state: 'open' as const, answeredBy: null });
const answered = (number: number, by: 'change' | 'explanation' = 'explanation') => ({
  number,
  state: 'answered' as const,
  answeredBy: by,
});
const ask = (step: Step, change: Partial<CaseFacts> = {}, userId = ME) =>
  checkStep(step, facts(change), { role: STEP_RULES[step].role, userId });
const reason = (step: Step, change: Partial<CaseFacts> = {}, userId = ME) => {
  const answer = ask(step, change, userId);
  return answer.open ? 'open' : answer.reason;
};

/** workflow.md's table: from → to. */
const TABLE: Record<Step, Partial<Record<State, State>>> = {
  file: { draft: 'filed', returned: 'in-review' },
  take: { filed: 'in-review' },
  'hand-over': { 'in-review': 'in-review' },
  'put-back': { 'in-review': 'filed' },
  return: { 'in-review': 'returned' },
  raise: { 'in-review': 'in-review' },
  settle: { 'in-review': 'in-review' },
  waive: { 'in-review': 'in-review' },
  accept: { 'in-review': 'accepted' },
  decline: { 'in-review': 'declined' },
  withdraw: { draft: 'withdrawn', filed: 'withdrawn', 'in-review': 'withdrawn', returned: 'withdrawn' },
  amend: { accepted: 'draft' },
};

/** Facts under which a step's needs are met, so that only role and state decide. */
const met = (step: Step, state: State): Partial<CaseFacts> => ({
  state,
  isRoundOpen: isOpen(state),
  hasAcceptedRecord: state === 'accepted',
  reviewerId: step === 'take' ? null : ME,
  discrepancies: step === 'return' ? [open(1)] : [],
});

describe('the table of steps', () => {
  for (const step of STEPS) {
    for (const state of STATES) {
      const to = TABLE[step][state];
      it(`${step} from ${state} ${to === undefined ? 'is closed' : `leads to ${to}`}`, () => {
        const answer = ask(step, met(step, state));
        expect(answer.open ? answer.transition.to : undefined).toBe(to);
        if (!answer.open) expect(answer.reason).toMatch(/^[A-Z].*\.$/);
      });
    }
    it(`${step} is for one role`, () => {
      const state = STATES.find((s) => TABLE[step][s] !== undefined) ?? 'draft';
      for (const role of ['applicant', 'reviewer', 'administrator'] satisfies Role[]) {
        const answer = checkStep(step, facts(met(step, state)), { role, userId: ME });
        expect(answer.open).toBe(role === STEP_RULES[step].role);
        if (!answer.open) expect(answer.refusal).toBe('role');
      }
    });
  }

  it('each step out of a state closes that state’s window', () => {
    const windowOf: Partial<Record<State, string>> = {
      filed: 'take-up',
      'in-review': 'review',
      returned: 'cure',
    };
    for (const step of STEPS) {
      for (const { from, to, closes, opens } of STEP_RULES[step].transitions) {
        if (from === to) continue;
        expect(closes).toEqual(windowOf[from] === undefined ? [] : [windowOf[from]]);
        expect(opens).toBe(windowOf[to] ?? null);
      }
    }
  });
});

describe('refusals say what opens the step', () => {
  it('file needs a line, no faults and every answer', () => {
    const draft = { lineCount: 2, faultyLines: [], unchanged: false };
    expect(reason('file', { state: 'draft', draft: { ...draft, lineCount: 0 } })).toBe(
      'File opens once the draft has a line.',
    );
    expect(
      reason('file', { state: 'draft', draft: { ...draft, faultyLines: ['L1', 'L2', 'L4', 'L5', 'L9'] } }),
    ).toBe('File opens once L1, L2, L4 and 2 more are complete.');
    expect(reason('file', { state: 'draft', draft: { ...draft, faultyLines: ['L3'] } })).toBe(
      'File opens once L3 is complete.',
    );
    expect(reason('file', { state: 'returned', discrepancies: [open(2), open(3), answered(4)] })).toBe(
      'File opens once D-2 and D-3 are answered.',
    );
    expect(
      reason('file', {
        state: 'returned',
        discrepancies: [answered(1, 'change')],
        draft: { ...draft, unchanged: true },
      }),
    ).toBe('File opens once the draft has the change that answers D-1.');
    expect(reason('file', { state: 'returned', discrepancies: [answered(1, 'change')] })).toBe('open');
    expect(
      reason('file', {
        state: 'returned',
        discrepancies: [answered(1)],
        draft: { ...draft, unchanged: true },
      }),
    ).toBe('open');
  });

  it('take waits for the run and goes to one', () => {
    expect(ask('take', { state: 'filed', reviewerId: null, run: null })).toMatchObject({
      refusal: 'check-running',
    });
    expect(
      ask('take', {
        state: 'filed',
        reviewerId: null,
        run: { state: 'running', linesChecked: 3, lineCount: 5 },
      }),
    ).toEqual({
      open: false,
      refusal: 'check-running',
      reason: 'Take opens once the check is done: 3 of 5 lines so far.',
    });
    expect(
      reason('take', {
        state: 'filed',
        reviewerId: null,
        run: { state: 'failed', linesChecked: 0, lineCount: 5 },
      }),
    ).toBe('Take opens once the check, which failed, has been made again.');
    expect(ask('take', { state: 'in-review', reviewerId: 'other' })).toEqual({
      open: false,
      refusal: 'taken',
      reason: 'M. Thornholt has it already.',
    });
  });

  it('the review is its reviewer’s', () => {
    for (const step of [
      'hand-over',
      'put-back',
      'return',
      'raise',
      'settle',
      'waive',
      'accept',
      'decline',
    ] as const) {
      expect(reason(step, { discrepancies: step === 'return' ? [open(1)] : [] }, 'another')).toBe(
        `${STEP_RULES[step].words} is for the case’s reviewer, M. Thornholt.`,
      );
    }
  });

  it('any reviewer passes a case on whose reviewer is gone, and does nothing else with it', () => {
    const others = STEPS.filter((step) => ask(step, { isReviewerGone: true }, 'another').open);
    expect(others.filter((step) => STEP_RULES[step].role === 'reviewer')).toEqual(['hand-over', 'put-back']);
  });

  it('return needs an open discrepancy', () => {
    expect(reason('return', { discrepancies: [answered(1)] })).toBe(
      'Return opens once a discrepancy is open.',
    );
  });

  it('accept needs every discrepancy and every Must answer done', () => {
    expect(reason('accept', { discrepancies: [open(2)] })).toBe('Accept opens once D-2 is settled.');
    expect(reason('accept', { discrepancies: [open(1), answered(2), open(5)] })).toBe(
      'Accept opens once D-1, D-2 and D-5 are settled.',
    );
    expect(reason('accept', { openMustAnswers: ['X1 of L1'] })).toBe(
      'Accept opens once X1 of L1 is settled or waived.',
    );
    expect(reason('accept', { openMustAnswers: ['a', 'b', 'c', 'd', 'e'] })).toBe(
      'Accept opens once a, b, c and 2 more are settled or waived.',
    );
    expect(
      reason('accept', {
        discrepancies: [
          { number: 1, state: 'settled', answeredBy: 'change' },
          { number: 2, state: 'waived', answeredBy: null },
        ],
      }),
    ).toBe('open');
  });

  it('a proposal holds decisions up', () => {
    expect(reason('accept', { pendingCountersigns: [{ subject: 'waive' }] })).toBe(
      'Accept opens once a second reviewer has decided on the proposed waiver.',
    );
    expect(reason('decline', { pendingCountersigns: [{ subject: 'decline' }] })).toBe(
      'Decline opens once a second reviewer has decided on the proposal to decline.',
    );
  });

  it('decline is countersigned, and so marked', () => {
    expect(STEPS.filter((s) => STEP_RULES[s].countersigned)).toEqual(['decline']);
    expect(STEPS.filter((s) => STEP_RULES[s].reason)).toEqual([
      'hand-over',
      'put-back',
      'waive',
      'decline',
      'amend',
    ]);
  });

  it('amend opens again after an amendment that came to nothing', () => {
    for (const state of ['declined', 'withdrawn'] as const) {
      const answer = ask('amend', { state, isRoundOpen: false, hasAcceptedRecord: true });
      expect(answer.open && answer.transition.to).toBe('draft');
      expect(ask('amend', { state, isRoundOpen: false }).open).toBe(false);
    }
    expect(ask('amend', { state: 'draft', hasAcceptedRecord: true }).open).toBe(false);
  });
});
