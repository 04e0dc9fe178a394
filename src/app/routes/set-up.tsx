import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery } from '../../features/session/api/get-front-door';
import { SetUpPage } from '../../features/session/components/set-up-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

export function Component() {
  return (
    <Suspense fallback={<SkeletonPage />}>
      <SetUpPage />
    </Suspense>
  );
}
