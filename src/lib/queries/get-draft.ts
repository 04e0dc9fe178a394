import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** The draft of the next revision: its lines and what stands in the way of filing. */
export const draftQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'draft'],
    queryFn: ({ signal }) => call('getDraft', { params: { applicationId: number }, signal }),
  });

/** The draft, asked for only while the application has one. */
export const useDraft = (number: string, hasDraft: boolean) =>
  useQuery({ ...draftQuery(number), enabled: hasDraft });
