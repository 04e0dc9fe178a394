import { describe, expect, it } from 'vitest';
import type { RevisionLine } from '#shared/contracts/api.generated';
import { sinceBefore } from '../../../../src/features/line-sheet/model/since-before';

const at = (parameter: string, declared: number | null, recomputed: number | null, circuit = 1) => ({
  circuit,
  parameter,
  declared,
  recomputed,
});

const line = (values: object[], previous: object[] | null) =>
  ({ values, previous }) as Pick<RevisionLine, 'values' | 'previous'>;

describe('since the revision before', () => {
  it('names each value that moved, and passes over the last bits of a double', () => {
    const now = [at('x1', 0.381, 0.38119900001), at('r1', 0.0404, 0.0403)];
    const before = [at('x1', 0.613, 0.38119900002), at('r1', 0.0404, 0.0404)];
    expect(sinceBefore(line(now, before), 1)).toEqual([
      { parameter: 'r1', what: 'recomputed', before: 0.0404, after: 0.0403 },
      { parameter: 'x1', what: 'declared', before: 0.613, after: 0.381 },
    ]);
  });

  it('sees a value that was not given before', () => {
    const moved = sinceBefore(line([at('x0', 1.27, 1.27)], [at('x0', null, 1.27)]), 1);
    expect(moved).toEqual([{ parameter: 'x0', what: 'declared', before: null, after: 1.27 }]);
  });

  it('has nothing to say of a first revision, nor of another circuit', () => {
    expect(sinceBefore(line([at('x1', 1, 1)], null), 1)).toEqual([]);
    expect(sinceBefore(line([at('x1', 1, 1, 2)], [at('x1', 2, 1, 2)]), 1)).toEqual([]);
  });
});
