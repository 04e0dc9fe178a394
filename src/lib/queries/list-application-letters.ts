import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { LetterList } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const applicationLettersQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'letters'],
    queryFn: ({ signal }): Promise<LetterList> =>
      call('listApplicationLetters', { params: { applicationId: number }, signal }),
  });

/** Letters that were sent on an application. */
export function useApplicationLetters(number: string): LetterList {
  return useSuspenseQuery(applicationLettersQuery(number)).data;
}
