import { describe, expect, it } from 'vitest';
import { checkDiscrepancyStep, DISCREPANCY_RULES } from '#shared/workflow/discrepancies';
import type { DiscrepancyStep } from '#shared/workflow/discrepancies';
import {
  carryOver,
  fingerprintText,
  needsCountersign,
  refuseCountersign,
  refuseDisposition,
  worstGrade,
  type FindingFigures,
} from '#shared/workflow/dispositions';

const finding: FindingFigures = {
  code: 'geometry.x1',
  circuit: 1,
  section: null,
  position: null,
  parameter: 'x1',
  declared: 0.6135,
  recomputed: 0.381199,
};

describe('fingerprints', () => {
  it('are equal for equal code, circuit and figures', () => {
    expect(fingerprintText('L1', { ...finding })).toBe(fingerprintText('L1', finding));
    expect(fingerprintText('L1', { ...finding, recomputed: 0.381199 * (1 + 1e-13) })).toBe(
      fingerprintText('L1', finding),
    );
  });

  it.each([
    ['code', { code: 'typical.x1' }],
    ['circuit', { circuit: 2 }],
    ['declared value', { declared: 0.6136 }],
    ['recomputed value', { recomputed: 0.3812 }],
    ['parameter', { parameter: 'x0' }],
    ['position', { position: 2 }],
    ['value that is gone', { recomputed: null }],
  ])('part with another %s', (_, change) => {
    expect(fingerprintText('L1', { ...finding, ...change })).not.toBe(fingerprintText('L1', finding));
  });

  it('part with another line', () => {
    expect(fingerprintText('L2', finding)).not.toBe(fingerprintText('L1', finding));
  });
});

describe('carrying over', () => {
  const before = [
    { lineKey: 'L1', fingerprint: 'aa', kind: 'waived' },
    { lineKey: 'L1', fingerprint: 'bb', kind: 'settled' },
    { lineKey: 'L2', fingerprint: 'aa', kind: 'set-aside' },
  ];
  it('keeps what is there again on the same line', () => {
    expect(
      carryOver(before, [
        { lineKey: 'L1', fingerprint: 'bb' },
        { lineKey: 'L2', fingerprint: 'cc' },
      ]),
    ).toEqual([before[1]]);
  });
  it('keeps nothing when nothing is found', () => {
    expect(carryOver(before, [])).toEqual([]);
  });
});

describe('what may be done with a finding', () => {
  it('a Must answer is never set aside', () => {
    expect(refuseDisposition('set-aside', 'must-answer', null)).toMatch(/Only a Note or an Explain/);
    expect(refuseDisposition('set-aside', 'explain', null)).toBeNull();
    expect(refuseDisposition('set-aside', 'note', null)).toBeNull();
    expect(refuseDisposition('waived', 'must-answer', null)).toBeNull();
  });
  it('nothing is done twice', () => {
    expect(refuseDisposition('waived', 'explain', 'set-aside')).toBe('It is set aside already.');
    expect(refuseDisposition('waived', 'explain', 'waived')).toBe('It is waived already.');
  });
  it('waiving a Must answer needs a second reviewer, who is another', () => {
    expect(needsCountersign('waived', 'must-answer')).toBe(true);
    expect(needsCountersign('waived', 'explain')).toBe(false);
    expect(needsCountersign('settled', 'must-answer')).toBe(false);
    expect(refuseCountersign('a', 'a')).toMatch(/second reviewer/);
    expect(refuseCountersign('a', 'b')).toBeNull();
  });
  it('the worst grade leads', () => {
    expect(worstGrade(['note', 'must-answer', 'explain'])).toBe('must-answer');
    expect(worstGrade(['note', 'explain'])).toBe('explain');
    expect(worstGrade([])).toBeNull();
  });
});

describe('discrepancies', () => {
  const states = ['open', 'answered', 'settled', 'waived'] as const;
  const table: Record<DiscrepancyStep, Partial<Record<(typeof states)[number], string>>> = {
    answer: { open: 'answered', answered: 'answered' },
    settle: { open: 'settled', answered: 'settled' },
    reopen: { answered: 'open', settled: 'open', waived: 'open' },
    waive: { open: 'waived', answered: 'waived' },
    remark: { open: 'open', answered: 'answered', settled: 'settled', waived: 'waived' },
  };
  for (const step of Object.keys(DISCREPANCY_RULES) as DiscrepancyStep[]) {
    const rule = DISCREPANCY_RULES[step];
    const role = rule.role === 'both' ? 'reviewer' : rule.role;
    for (const state of states) {
      const to = table[step][state];
      it(`${step} from ${state} ${to === undefined ? 'is refused' : `gives ${to}`}`, () => {
        const [round = 'draft'] = rule.rounds;
        const answer = checkDiscrepancyStep(step, { number: 2, state }, { state: round }, role);
        expect(answer.open ? answer.to : undefined).toBe(to);
        if (!answer.open) expect(answer.reason).toMatch(/^D-2 is .*\.$/);
      });
    }
    it(`${step} is closed to other roles and in other states of the case`, () => {
      const [round = 'draft'] = rule.rounds;
      const wrong =
        rule.role === 'applicant' ? 'reviewer' : rule.role === 'both' ? 'administrator' : 'applicant';
      expect(checkDiscrepancyStep(step, { number: 2, state: 'open' }, { state: round }, wrong)).toMatchObject(
        {
          refusal: 'role',
        },
      );
      expect(
        checkDiscrepancyStep(step, { number: 2, state: 'answered' }, { state: 'filed' }, role),
      ).toMatchObject({
        refusal: 'state',
      });
    });
  }
});
