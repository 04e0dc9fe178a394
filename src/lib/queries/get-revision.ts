import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** A filed revision with its lines and what the check found. */
export const revisionQuery = (number: string, letter: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revision', letter],
    queryFn: ({ signal }) => call('getRevision', { params: { applicationId: number, letter }, signal }),
  });

/** A revision, or nothing while none was filed. */
export const useRevision = (number: string, letter: string | null) =>
  useQuery({ ...revisionQuery(number, letter ?? ''), enabled: letter !== null });
