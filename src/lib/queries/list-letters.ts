import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** The letters of an application, newest first. */
export const lettersQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'letters'],
    queryFn: ({ signal }) => call('listApplicationLetters', { params: { applicationId: number }, signal }),
  });

export const useLetters = (number: string) => useQuery(lettersQuery(number));
