import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { useLocation } from 'react-router-dom';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery } from '../../features/session/api/get-front-door';
import { InvitationPage } from '../../features/session/components/invitation-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

/** The token stands behind the #, where no server log sees it. */
export function Component() {
  const { hash } = useLocation();
  return (
    <Suspense fallback={<SkeletonPage />}>
      <InvitationPage key={hash} token={hash.slice(1)} />
    </Suspense>
  );
}
