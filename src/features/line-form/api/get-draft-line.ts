import { queryOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { DraftLine } from '#shared/contracts/api.generated';
import { problemName } from '#shared/contracts/errors';
import { call } from '../../../lib/api/call';
import { caseKey } from '../../../lib/queries/case-key';
import { draftQuery } from '../../../lib/queries/get-draft';
import { ApiProblem } from '../../../lib/api/problem';

async function read(number: string, lineKey: string, signal?: AbortSignal): Promise<DraftLine | null> {
  try {
    return await call('getDraftLine', { params: { applicationId: number, lineKey }, signal });
  } catch (error) {
    if (error instanceof ApiProblem && problemName(error.type) === 'not-found') return null;
    throw error;
  }
}

/**
 * Whether the draft's own list says that a key is its next one and still free. Should somebody take it in the
 * meantime, the first save of the blank form (on version 0) is refused, and the form shows both.
 */
async function isYetToCome(client: QueryClient, number: string, lineKey: string): Promise<boolean> {
  const { lines, nextLineKey } = await client.fetchQuery(draftQuery(number));
  return lineKey === nextLineKey && !lines.some((line) => line.lineKey === lineKey);
}

/** A line of the draft, or null where none stands under this key yet. Read once: the form keeps it from then on. */
export const draftLineQuery = (number: string, lineKey: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'draft-line', lineKey],
    queryFn: async ({ client, signal }) =>
      (await isYetToCome(client, number, lineKey)) ? null : read(number, lineKey, signal),
    staleTime: 0,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

/** Reads the line as it stands on the server now, past the cache. */
export const readDraftLine = (number: string, lineKey: string) => read(number, lineKey);
