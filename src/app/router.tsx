import type { QueryClient } from '@tanstack/react-query';
import { createBrowserRouter, redirect, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { SkeletonPage } from '../components/feedback/skeleton';
import { ApiProblem } from '../lib/api/problem';
import { sessionQuery } from '../lib/api/session';
import { NotFound, PageError } from './page-error';
import { homeOf } from './places';
import { OPEN_ROUTES, ROUTES, type RouteEntry } from './route-table';
import { Shell } from './shell';

/** Where a person without a session is led, with the way back. */
function signInAddress(request: Request): string {
  const { pathname, search } = new URL(request.url);
  return pathname === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(pathname + search)}`;
}

function requireSession(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const session = await client.ensureQueryData(sessionQuery());
    if (!session) throw redirect(signInAddress(request));
    return null;
  };
}

function leadHome(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const session = await client.ensureQueryData(sessionQuery());
    throw redirect(session ? homeOf(session.role) : signInAddress(request));
  };
}

/** A page of another role is not there for this one. */
async function refuseOtherRoles(client: QueryClient, entry: RouteEntry): Promise<void> {
  if (!entry.roles) return;
  const session = await client.ensureQueryData(sessionQuery());
  if (session && !entry.roles.includes(session.role))
    throw new ApiProblem({ type: '/problems/not-found', title: 'Not found', status: 404 });
}

function toRoute(client: QueryClient, entry: RouteEntry): RouteObject {
  return {
    path: entry.path,
    errorElement: <PageError />,
    lazy: async () => {
      const { Component, prefetch } = await entry.lazy();
      const loader = async ({ params, request }: LoaderFunctionArgs) => {
        await refuseOtherRoles(client, entry);
        // Not awaited: the page's own skeletons hold the place, and its own queries show what fails.
        void Promise.resolve(prefetch?.(client, params, new URL(request.url))).catch(() => undefined);
        return null;
      };
      return { Component, loader };
    },
  };
}

export function createRouter(client: QueryClient) {
  return createBrowserRouter([
    ...OPEN_ROUTES.map((entry) => toRoute(client, entry)),
    {
      path: '/',
      element: <Shell />,
      errorElement: <PageError />,
      hydrateFallbackElement: <SkeletonPage />,
      loader: requireSession(client),
      children: [
        { index: true, loader: leadHome(client), element: null },
        ...ROUTES.map((entry) => toRoute(client, entry)),
        { path: '*', element: <NotFound /> },
      ],
    },
  ]);
}
