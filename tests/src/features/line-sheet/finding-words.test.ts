import { describe, expect, it } from 'vitest';
import type { Cause, Finding } from '#shared/contracts/api.generated';
import {
  causeLines,
  dispositionWords,
  settledRemark,
} from '../../../../src/features/line-sheet/model/finding-words';

const PER_MILE: Cause = {
  code: 'per-mile',
  in: 'declared',
  explains: ['x1', 'r1'],
  corrected: { x1: 0.381, r1: 0.0403 },
  residual: 0.001,
  sentence: 'Fits within 0.1 % if the value is per mile.',
};

const finding = (over: Partial<Finding>): Finding =>
  ({
    code: 'geometry.x1',
    family: 'geometry',
    grade: 'must-answer',
    parameter: 'x1',
    declared: 0.613,
    group: 1,
    causes: [],
    first: true,
    follows: null,
    stands: true,
    disposition: null,
    ...over,
  }) as Finding;

describe('what a finding says', () => {
  it('names its causes, and what else they explain', () => {
    expect(causeLines(finding({ causes: [PER_MILE] }), true)).toEqual([
      'Fits within 0.1 % if the value is per mile. It also explains R1.',
    ]);
  });

  it('says that another carries the cause, that it follows, or nothing', () => {
    expect(causeLines(finding({ causes: [PER_MILE], first: false }), false)).toEqual(['Same cause.']);
    expect(causeLines(finding({ follows: 'x1' }), false)).toEqual(['Same cause.']);
    expect(causeLines(finding({ parameter: 'waveSpeed', follows: 'x1' }), false)).toEqual(['Follows X1.']);
    expect(causeLines(finding({}), true)).toEqual([]);
    expect(causeLines(finding({ family: 'typical', grade: 'explain' }), false)).toEqual([]);
  });

  it('says what became of it', () => {
    const disposition = {
      kind: 'waived' as const,
      inForce: true,
      revision: 'B',
      reason: 'Measured on the line.',
      by: { id: '1', name: 'M. Thornholt' },
      at: '2027-03-04T12:00:00Z',
      countersignedBy: { id: '2', name: 'E. Larkspur' },
      carriedOver: false,
    };
    expect(dispositionWords(finding({ disposition }))).toBe(
      'Waived by M. Thornholt, countersigned by E. Larkspur on revision B, 4 Mar 2027: Measured on the line.',
    );
    const proposed = { ...disposition, inForce: false, countersignedBy: null };
    expect(dispositionWords(finding({ disposition: proposed }))).toContain(
      'a second reviewer has to countersign',
    );
    expect(dispositionWords(finding({}))).toBeNull();
    expect(settledRemark([finding({ stands: false, disposition })])).toBe('X1 waived');
    expect(settledRemark([finding({ stands: true })])).toBeUndefined();
  });
});
