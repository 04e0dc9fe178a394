import type { QueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { CaseRecord } from '../../features/audit/components/case-record';
import { useSession } from '../../lib/api/session';
import { timelineQuery } from '../../lib/queries/get-timeline';

export const prefetch = (
  client: QueryClient,
  { number = '' }: Readonly<Record<string, string | undefined>>,
) => client.prefetchQuery(timelineQuery(number));

export function Component() {
  const { number = '' } = useParams();
  const session = useSession();
  return session && <CaseRecord number={number} role={session.role} />;
}
