import type { QueryClient } from '@tanstack/react-query';
import { LINE_LIST, linesQuery } from '../../features/lines/api/list-lines';
import { LinesPage } from '../../features/lines/components/lines-page';
import { useSession } from '../../lib/api/session';
import { readListView } from '../../lib/list-view';

export const prefetch = (client: QueryClient, _params: unknown, url: URL) =>
  client.prefetchQuery(linesQuery(readListView(LINE_LIST, url.searchParams)));

export function Component() {
  const session = useSession();
  return session && <LinesPage role={session.role} />;
}
