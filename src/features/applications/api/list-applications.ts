import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ListApplicationsRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseListsKey } from '../../../lib/queries/case-key';

/** The applications of the active organisation, filtered and sorted as the URL says. */
export const applicationsQuery = (query: ListApplicationsRequest) =>
  queryOptions({
    queryKey: [...caseListsKey(), query],
    queryFn: ({ signal }) => call('listApplications', { query, signal }),
    placeholderData: keepPreviousData,
  });

export const useApplications = (query: ListApplicationsRequest) => useQuery(applicationsQuery(query));
