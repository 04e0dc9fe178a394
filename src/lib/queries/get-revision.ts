import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Revision } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

const WHILE_CHECKING_MS = 1_500;

export const revisionQuery = (number: string, letter: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revision', letter],
    queryFn: ({ signal }): Promise<Revision> =>
      call('getRevision', { params: { applicationId: number, letter }, signal }),
    refetchInterval: ({ state: { data } }) =>
      data?.run?.state === 'queued' || data?.run?.state === 'running' ? WHILE_CHECKING_MS : false,
  });

/** A filed revision with its lines, its runs and what the check found. */
export function useRevision(number: string, letter: string): Revision {
  return useSuspenseQuery(revisionQuery(number, letter)).data;
}
