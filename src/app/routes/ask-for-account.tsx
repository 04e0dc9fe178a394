import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery } from '../../features/session/api/get-front-door';
import { AskForAccountPage } from '../../features/session/components/ask-for-account-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

export function Component() {
  return (
    <Suspense fallback={<SkeletonPage />}>
      <AskForAccountPage />
    </Suspense>
  );
}
