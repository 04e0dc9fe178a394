import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { RevisionLine } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

const WHILE_CHECKING_MS = 1_500;

export const revisionLineQuery = (number: string, letter: string, lineKey: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revision', letter, 'line', lineKey],
    queryFn: ({ signal }): Promise<RevisionLine> =>
      call('getRevisionLine', { params: { applicationId: number, letter, lineKey }, signal }),
    refetchInterval: ({ state: { data } }) =>
      data?.run?.state === 'queued' || data?.run?.state === 'running' ? WHILE_CHECKING_MS : false,
  });

/** A line of a revision as filed, with its values weighed and its findings. */
export function useRevisionLine(number: string, letter: string, lineKey: string): RevisionLine {
  return useSuspenseQuery(revisionLineQuery(number, letter, lineKey)).data;
}
