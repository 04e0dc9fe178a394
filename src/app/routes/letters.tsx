import type { QueryClient } from '@tanstack/react-query';
import { LETTER_LIST, lettersQuery } from '../../features/letters/api/list-letters';
import { LettersPage } from '../../features/letters/components/letters-page';
import { useSession } from '../../lib/api/session';
import { readListView } from '../../lib/list-view';

export const prefetch = (client: QueryClient, _params: unknown, url: URL) =>
  client.prefetchQuery(lettersQuery(readListView(LETTER_LIST, url.searchParams)));

export function Component() {
  const session = useSession();
  return session && <LettersPage role={session.role} />;
}
