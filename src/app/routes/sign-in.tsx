import type { QueryClient } from '@tanstack/react-query';
import { Suspense } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { SkeletonPage } from '../../components/feedback/skeleton';
import { frontDoorQuery, useFrontDoor } from '../../features/session/api/get-front-door';
import { SignInPage } from '../../features/session/components/sign-in-page';
import { leadTo } from '../../features/session/model/lead-to';

export const prefetch = (client: QueryClient) => client.prefetchQuery(frontDoorQuery());

function Door() {
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const { setUpNeeded } = useFrontDoor();
  if (setUpNeeded) return <Navigate to="/set-up" replace />;
  return <SignInPage onSignedIn={() => navigate(leadTo(params.get('next'), '/'), { replace: true })} />;
}

/** The sign-in, or the set-up of a product that nobody has set up. */
export function Component() {
  return (
    <Suspense fallback={<SkeletonPage />}>
      <Door />
    </Suspense>
  );
}
