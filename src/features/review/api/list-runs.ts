import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Run, RunList } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseKey } from '../../../lib/queries/case-key';

const WHILE_RUNNING_MS = 1_500;
const isUnderWay = (run: Run) => run.state === 'queued' || run.state === 'running';

export const runsQuery = (number: string, letter: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revision', letter, 'runs'],
    queryFn: ({ signal }): Promise<RunList> =>
      call('listRuns', { params: { applicationId: number, letter }, signal }),
    refetchInterval: (query) => (query.state.data?.items.some(isUnderWay) ? WHILE_RUNNING_MS : false),
  });

/** The check runs of a revision, newest first; followed while one is under way. */
export function useRuns(number: string, letter: string): readonly Run[] {
  return useSuspenseQuery(runsQuery(number, letter)).data.items;
}
