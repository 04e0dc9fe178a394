import { describe, expect, it } from 'vitest';
import { createIntention } from '../../../../src/lib/api/intention';
import { ApiProblem, ConnectionLost } from '../../../../src/lib/api/problem';

function numbered() {
  let n = 0;
  return createIntention(() => `key-${++n}`);
}

describe('an intention', () => {
  it('keeps its key while the same thing is sent again after a lost connection', () => {
    const intention = numbered();
    const first = intention.keyFor({ reason: 'a' });
    intention.ended(new ConnectionLost('gone'));
    expect(intention.keyFor({ reason: 'a' })).toBe(first);
  });

  it('is another one once the words differ', () => {
    const intention = numbered();
    const first = intention.keyFor({ reason: 'a' });
    intention.ended(new ConnectionLost('gone'));
    expect(intention.keyFor({ reason: 'b' })).not.toBe(first);
  });

  it.each([
    ['an answer', null],
    ['a refusal', new ApiProblem({ type: '/problems/stale', title: 'Stale', status: 409 })],
  ])('ends with %s', (_what, error) => {
    const intention = numbered();
    const first = intention.keyFor({ reason: 'a' });
    intention.ended(error);
    expect(intention.keyFor({ reason: 'a' })).not.toBe(first);
  });
});
