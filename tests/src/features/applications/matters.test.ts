import { describe, expect, it } from 'vitest';
import { mattersOf } from '../../../../src/features/applications/model/matters';
import { aFinding } from './case';

const cause = {
  code: 'per-mile',
  in: 'declared' as const,
  explains: ['x1'],
  corrected: { x1: 0.38 },
  residual: 0.0003,
  sentence: 's',
};

describe('findings by matter', () => {
  it('shows a cause once, over all findings of its group, and leaves out what follows', () => {
    const matters = mattersOf([
      aFinding({ fingerprint: '1', parameter: 'r0', group: 2 }),
      aFinding({ fingerprint: '2', parameter: 'b1', group: 1, first: false }),
      aFinding({ fingerprint: '3', parameter: 'x1', group: 1, causes: [cause] }),
      aFinding({ fingerprint: '4', parameter: 'waveSpeed', group: 1, follows: 'x1' }),
    ]);
    expect(
      matters.map((m) => [m.first.parameter, m.others.map((o) => o.parameter), m.causes.length]),
    ).toEqual([
      ['x1', ['b1'], 1],
      ['r0', [], 0],
    ]);
  });

  it('keeps groups of different lines apart, and findings without a group by themselves', () => {
    const matters = mattersOf([
      aFinding({ fingerprint: '1', lineKey: 'L1', group: 1 }),
      aFinding({ fingerprint: '2', lineKey: 'L2', group: 1 }),
      aFinding({ fingerprint: '3', group: null }),
      aFinding({ fingerprint: '4', group: null }),
    ]);
    expect(matters).toHaveLength(4);
  });
});
