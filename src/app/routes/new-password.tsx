import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { useSearchParams } from 'react-router-dom';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery } from '../../features/session/api/get-front-door';
import { NewPasswordPage } from '../../features/session/components/new-password-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

export function Component() {
  const [params] = useSearchParams();
  return (
    <Suspense fallback={<SkeletonPage />}>
      <NewPasswordPage token={params.get('token')} />
    </Suspense>
  );
}
