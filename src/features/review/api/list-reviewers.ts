import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { caseKey } from '../../../lib/queries/case-key';

export const reviewersQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'reviewers'],
    queryFn: ({ signal }) => call('listReviewers', { params: { applicationId: number }, signal }),
  });

/** Reviewers who may take this case, with how many they have in hand. */
export const useReviewers = (number: string) => useQuery(reviewersQuery(number));
