import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const organisationsQuery = () =>
  queryOptions({
    queryKey: ['people', 'organisations'],
    queryFn: ({ signal }) => call('listOrganisations', { signal }),
  });

/** The grid owner and the applicant organisations. */
export const useOrganisations = () => useSuspenseQuery(organisationsQuery()).data.items;
