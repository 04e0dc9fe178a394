import type { QueryClient } from '@tanstack/react-query';

/**
 * Where answers about a case are kept in the cache. Every feature names its queries with these, so that
 * a write in one feature can say to all others what went stale.
 */
const ofCase = (application: string) => ['case', application] as const;

export const caseKeys = {
  lists: ['cases'] as const,
  list: (name: string, query: object) => ['cases', name, query] as const,
  all: ofCase,
  part: (application: string, part: string, ...rest: (string | number)[]) =>
    [...ofCase(application), part, ...rest] as const,
};

/** After a write to a case: everything read of it is asked for again, and the lists that it stands in. */
export async function caseChanged(client: QueryClient, application: string): Promise<void> {
  await Promise.all([
    client.invalidateQueries({ queryKey: caseKeys.all(application) }),
    client.invalidateQueries({ queryKey: caseKeys.lists }),
  ]);
}
