import { describe, expect, it } from 'vitest';
import { checkDiscrepancyStep, DISCREPANCY_RULES } from '#shared/workflow/discrepancies';
import type { DiscrepancyStep } from '#shared/workflow/discrepancies';
import {
  carryOver,
  fingerprintText,
  needsCountersign,
  outgrown,
  refuseCountersign,
  refuseDisposition,
  worstGrade,
  type FindingFigures,
  type Grade,
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
    { lineKey: 'L1', fingerprint: 'aa', kind: 'waived', countersignId: 'c' },
    { lineKey: 'L1', fingerprint: 'bb', kind: 'settled', countersignId: null },
    { lineKey: 'L2', fingerprint: 'aa', kind: 'set-aside', countersignId: null },
    { lineKey: 'L3', fingerprint: 'aa', kind: 'waived', countersignId: null },
  ] as const;
  const found = (lineKey: string, fingerprint: string, grade: Grade) => ({ lineKey, fingerprint, grade });
  it('keeps what is there again on the same line', () => {
    const findings = [found('L1', 'bb', 'must-answer'), found('L2', 'cc', 'note')];
    expect(carryOver(before, findings)).toEqual([before[1]]);
  });
  it('keeps nothing when nothing is found', () => {
    expect(carryOver(before, [])).toEqual([]);
  });
  it('takes neither setting aside nor one reviewer’s waiver for an answer once it must be answered', () => {
    const graver = [
      found('L1', 'aa', 'must-answer'),
      found('L2', 'aa', 'must-answer'),
      found('L3', 'aa', 'must-answer'),
    ];
    expect(carryOver(before, graver)).toEqual([before[0]]);
    expect(outgrown(before, graver)).toEqual([before[2], before[3]]);
    const lighter = graver.map((f) => ({ ...f, grade: 'explain' as const }));
    expect(carryOver(before, lighter)).toEqual([before[0], before[2], before[3]]);
    expect(outgrown(before, lighter)).toEqual([]);
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
