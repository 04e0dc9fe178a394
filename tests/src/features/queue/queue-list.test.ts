import { describe, expect, it } from 'vitest';
import type { ApplicationSummary } from '#shared/contracts/api.generated';
import {
  QUEUE_LIST,
  queueLead,
  reviewersOf,
  voltagesOf,
  whoseOf,
  withWhose,
} from '../../../../src/features/queue/model/queue-list';
import { listQueryOf, readListView } from '../../../../src/lib/list-view';

const view = (query: string) => readListView(QUEUE_LIST, new URLSearchParams(query));
const left = (...days: number[]) => days.map((d) => ({ window: { left: d } }) as ApplicationSummary);

describe('the queue in its address', () => {
  it('knows whose cases a view shows', () => {
    expect(whoseOf(view(''))).toBe('everyone');
    expect(whoseOf(view('reviewer=me'))).toBe('mine');
    expect(whoseOf(view('reviewer=nobody'))).toBe('nobody');
    expect(whoseOf(view('reviewer=1b2c'))).toBeNull();
  });

  it('keeps the other filters and goes to the first page when whose changes', () => {
    const next = withWhose(view('state=filed&cursor=abc&sort=-grade'), 'mine');
    expect(listQueryOf(next)).toEqual({ sort: '-grade', 'filter[state]': 'filed', 'filter[reviewer]': 'me' });
  });

  it('offers the voltages and reviewers that occur', () => {
    const items = [
      { voltagesKv: [345, 230], reviewer: { id: '2', name: 'T. Varley' } },
      { voltagesKv: [230], reviewer: null },
      { voltagesKv: [138], reviewer: { id: '1', name: 'E. Larkspur' } },
    ] as ApplicationSummary[];
    expect(voltagesOf(items)).toEqual([345, 230, 138]);
    expect(reviewersOf(items).map((r) => r.name)).toEqual(['E. Larkspur', 'T. Varley']);
  });

  it('says what is due', () => {
    expect(queueLead(0, [])).toBe('No application waits for the grid owner.');
    expect(queueLead(1, left(4))).toBe('One open application.');
    expect(queueLead(4, left(-2, 0, 1, 1))).toBe(
      '4 open applications. One is 2 working days overdue, one is due today, 2 are due on the next working day.',
    );
    expect(queueLead(2, left(-2, -5))).toBe('2 open applications. 2 are overdue, one by 5 working days.');
  });
});
