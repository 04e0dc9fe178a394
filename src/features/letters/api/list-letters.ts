import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { listQueryOf, type ListSpec, type ListView } from '../../../lib/list-view';
import { lettersKey } from '../../../lib/queries/case-key';

export const LETTER_FILTERS = ['kind', 'search'] as const;
export type LetterFilter = (typeof LETTER_FILTERS)[number];
export const LETTER_LIST: ListSpec<LetterFilter> = { filters: LETTER_FILTERS, sort: '-sent' };

export const lettersQuery = (view: ListView<LetterFilter>) => {
  const query = { ...listQueryOf(view), limit: '50' };
  return queryOptions({
    queryKey: [...lettersKey(), query],
    queryFn: ({ signal }) => call('listLetters', { query, signal }),
    placeholderData: keepPreviousData,
  });
};

/** Letters that were sent, newest first unless sorted, a page. */
export const useLetterList = (view: ListView<LetterFilter>) => useQuery(lettersQuery(view));
