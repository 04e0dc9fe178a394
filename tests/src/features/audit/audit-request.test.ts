import { describe, expect, it } from 'vitest';
import { AUDIT_LIST, auditRequest } from '../../../../src/features/audit/api/list-audit-events';
import { readListView } from '../../../../src/lib/list-view';

const request = (query: string) => auditRequest(readListView(AUDIT_LIST, new URLSearchParams(query)));

describe('what the record is asked for', () => {
  it('is a number only once it is written out', () => {
    expect(request('application=27-04')).toEqual({ limit: '50' });
    expect(request('application=27-0418&act=discrepancy')).toEqual({
      'filter[act]': 'discrepancy',
      'filter[application]': '27-0418',
      limit: '50',
    });
  });

  it('is a page, and never an order', () => {
    expect(request('cursor=120&sort=-act')).toEqual({ cursor: '120', limit: '50' });
  });
});
