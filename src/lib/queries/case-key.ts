import { useQueryClient } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';

/**
 * Where answers about a case are kept in the cache, by the application's number as in the URL. Every
 * query of a case begins with this, so that a write can say to all of them that they went stale.
 */
export const caseKey = (number: string) => ['application', number] as const;

/** Lists of cases, in which a write to one may show. */
export const caseListsKey = () => ['applications'] as const;
export const queueKey = () => ['queue'] as const;
export const linesKey = () => ['lines'] as const;
export const lettersKey = () => ['letters'] as const;
export const countersignsKey = () => ['countersigns'] as const;

/** After a write to a case: everything read of it is asked for again, and the lists that it stands in. */
export async function caseChanged(client: QueryClient, number: string): Promise<void> {
  const stale = [caseKey(number), caseListsKey(), queueKey(), linesKey(), lettersKey(), countersignsKey()];
  await Promise.all(stale.map((queryKey) => client.invalidateQueries({ queryKey })));
}

/** The same as a hook, for a mutation's `onSettled`. */
export function useInvalidateCase(): (number: string) => Promise<void> {
  const client = useQueryClient();
  return (number) => caseChanged(client, number);
}
