import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Application } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

const WHILE_CHECKING_MS = 1_500;

/** While a check runs the page follows it; else it waits to be told. */
function pollWhileChecking(application: Application | undefined): number | false {
  const state = application?.check?.state;
  return state === 'queued' || state === 'running' ? WHILE_CHECKING_MS : false;
}

export const applicationQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'head'],
    queryFn: ({ signal }): Promise<Application> =>
      call('getApplication', { params: { applicationId: number }, signal }),
    refetchInterval: (query) => pollWhileChecking(query.state.data),
  });

/** An application with its state, windows and the steps that the caller may take. */
export function useApplication(number: string): Application {
  return useSuspenseQuery(applicationQuery(number)).data;
}
