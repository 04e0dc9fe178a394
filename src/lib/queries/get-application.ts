import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Application } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

const isChecking = (application: Application | undefined): boolean =>
  application?.check?.state === 'queued' || application?.check?.state === 'running';

/** An application with all that its page shows; asked for again each second while its check runs. */
export const applicationQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'application'],
    queryFn: ({ signal }) => call('getApplication', { params: { applicationId: number }, signal }),
    refetchInterval: (query) => (isChecking(query.state.data) ? 1000 : false),
  });

export const useApplication = (number: string): Application =>
  useSuspenseQuery(applicationQuery(number)).data;
