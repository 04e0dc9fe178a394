import type { QueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { ComparePage } from '../../features/compare/components/compare-page';
import { useSession } from '../../lib/api/session';
import { revisionsQuery } from '../../lib/queries/list-revisions';

export const prefetch = (
  client: QueryClient,
  { number = '' }: Readonly<Record<string, string | undefined>>,
) => client.prefetchQuery(revisionsQuery(number));

export function Component() {
  const { number = '' } = useParams();
  const session = useSession();
  return session && <ComparePage number={number} role={session.role} />;
}
