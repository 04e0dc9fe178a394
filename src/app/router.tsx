import type { QueryClient } from '@tanstack/react-query';
import { createBrowserRouter, redirect, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { SkeletonPage } from '../components/feedback/skeleton';
import { ApiProblem } from '../lib/api/problem';
import { sessionQuery } from '../lib/api/session';
import { mayOpen } from './may-open';
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

/** A page that is not for this person is not there: the same answer as for an address that nobody has. */
async function refuseOthers(client: QueryClient, entry: RouteEntry): Promise<void> {
  if (!entry.roles && !entry.needs) return;
  const session = await client.ensureQueryData(sessionQuery());
  if (session && !mayOpen(session, entry))
    throw new ApiProblem({ type: '/problems/not-found', title: 'Not found', status: 404 });
}

function toRoute(client: QueryClient, entry: RouteEntry, isOpen = false): RouteObject {
  return {
    path: entry.path,
    errorElement: <PageError />,
    hydrateFallbackElement: <SkeletonPage />,
    lazy: async () => {
      const { Component, prefetch } = await entry.lazy();
      const loader = async ({ params, request }: LoaderFunctionArgs) => {
        await refuseOthers(client, entry);
        // The sign-in comes first: what is asked for without a session would only be refused.
        if (!isOpen && !(await client.ensureQueryData(sessionQuery()))) return null;
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
    ...OPEN_ROUTES.map((entry) => toRoute(client, entry, true)),
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
