import type { QueryClient } from '@tanstack/react-query';
import { invitationsQuery } from '../../features/people/api/list-invitations';
import { organisationsQuery } from '../../features/people/api/list-organisations';
import { peopleQuery } from '../../features/people/api/list-people';
import { PeoplePage } from '../../features/people/components/people-page';

export function prefetch(client: QueryClient) {
  return Promise.all([
    client.prefetchQuery(peopleQuery()),
    client.prefetchQuery(invitationsQuery()),
    client.prefetchQuery(organisationsQuery()),
  ]);
}

export const Component = PeoplePage;
