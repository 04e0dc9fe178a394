import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { listQueryOf, type ListSpec, type ListView } from '../../../lib/list-view';
import { linesKey } from '../../../lib/queries/case-key';

export const LINE_FILTERS = ['search', 'voltage', 'state', 'grade'] as const;
export type LineFilter = (typeof LINE_FILTERS)[number];
export const LINE_LIST: ListSpec<LineFilter> = { filters: LINE_FILTERS, sort: 'name' };

const VOLTAGE = /^\d+(\.\d+)?$/;

/** What the server is asked: a voltage only where it is a number. */
function linesRequest(view: ListView<LineFilter>): Record<string, string> {
  const { 'filter[voltage]': kv = '', ...others } = listQueryOf(view);
  return { ...others, ...(VOLTAGE.test(kv) ? { 'filter[voltage]': kv } : {}), limit: '50' };
}

export const linesQuery = (view: ListView<LineFilter>) => {
  const query = linesRequest(view);
  return queryOptions({
    queryKey: [...linesKey(), query],
    queryFn: ({ signal }) => call('listLines', { query, signal }),
    placeholderData: keepPreviousData,
  });
};

/** Lines of the latest revisions that the caller may see, a page. */
export const useLines = (view: ListView<LineFilter>) => useQuery(linesQuery(view));
