import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { ApiProblem } from '../../../lib/api/problem';

async function read(signal?: AbortSignal) {
  try {
    return (await call('listDemoAccounts', { signal })).items;
  } catch (error) {
    if (error instanceof ApiProblem) return [];
    throw error;
  }
}

/** The accounts of the demo scenario; none outside it. */
export const demoAccountsQuery = () =>
  queryOptions({ queryKey: ['demo-accounts'], queryFn: ({ signal }) => read(signal), staleTime: Infinity });

export const useDemoAccounts = () => useQuery(demoAccountsQuery());
