import { describe, expect, it } from 'vitest';
import { balanceEntry } from '../../../../src/components/charts/balance-entries';

const weighed = (deviation: number) => ({
  parameter: 'surgeImpedanceOhm',
  declared: 377 * (1 + deviation),
  recomputed: 377,
  range: null,
  deviation,
  tolerance: null,
  typical: null,
  outer: null,
  grade: null,
  follows: 'x1',
});

describe('a value derived from declared ones', () => {
  it('follows what is wrong with them, and is in balance where it is level itself', () => {
    const off = balanceEntry('surgeImpedanceOhm', weighed(0.27));
    expect([off.grade, off.remark]).toEqual([null, 'follows X1']);
    const level = balanceEntry('surgeImpedanceOhm', weighed(0.0003));
    expect([level.grade, level.remark]).toEqual(['in-balance', undefined]);
  });
});
