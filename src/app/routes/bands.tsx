import type { QueryClient } from '@tanstack/react-query';
import { bandDraftQuery } from '../../features/bands/api/get-band-draft';
import { ruleSetsQuery } from '../../features/bands/api/list-rule-sets';
import { BandsPage } from '../../features/bands/components/bands-page';
import { calendarQuery } from '../../lib/queries/get-calendar';
import { rulesQuery } from '../../lib/queries/get-rules';

export function prefetch(client: QueryClient) {
  return Promise.all([
    client.prefetchQuery(bandDraftQuery()),
    client.prefetchQuery(ruleSetsQuery()),
    client.prefetchQuery(rulesQuery()),
    client.prefetchQuery(calendarQuery()),
  ]);
}

export const Component = BandsPage;
