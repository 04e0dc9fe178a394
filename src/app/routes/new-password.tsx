import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery } from '../../features/session/api/get-front-door';
import { NewPasswordPage } from '../../features/session/components/new-password-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

export function Component() {
  return (
    <Suspense fallback={<SkeletonPage />}>
      <NewPasswordPage token={null} />
    </Suspense>
  );
}
