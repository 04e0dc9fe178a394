import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const ruleSetsQuery = () =>
  queryOptions({
    queryKey: ['rules', 'versions'],
    queryFn: ({ signal }) => call('listRuleSets', { signal }),
  });

/** Every rule set that was published, and the draft. */
export const useRuleSets = () => useSuspenseQuery(ruleSetsQuery()).data.items;
