import type { QueryClient } from '@tanstack/react-query';
import type { RouteObject } from 'react-router-dom';
import { MAIL_PAGES } from '#shared/contracts/mail-pages';
import type { Action, Subject } from '#shared/policies/subjects';
import type { Role } from '../lib/api/session';

/** One URL: who may open it (everybody signed in, if nothing is named) and the file that composes its page. */
export interface RouteEntry {
  path: string;
  /** What the policies must allow for the page to be there at all. */
  needs?: readonly [Action, Subject];
  /** Pages made for one side of a case alone. */
  roles?: readonly Role[];
  lazy: () => Promise<RouteModule>;
}

/** What a file of src/app/routes exports. */
export interface RouteModule {
  Component: RouteObject['Component'];
  /** Loads what the page shows at once, with the same query options that the page's hooks use. */
  prefetch?: (client: QueryClient, params: Readonly<Record<string, string | undefined>>, url: URL) => unknown;
}

/** Pages that need nobody signed in. */
export const OPEN_ROUTES: readonly RouteEntry[] = [
  { path: '/sign-in', lazy: () => import('./routes/sign-in') },
  { path: '/set-up', lazy: () => import('./routes/set-up') },
  { path: '/ask-for-account', lazy: () => import('./routes/ask-for-account') },
  { path: '/new-password', lazy: () => import('./routes/new-password') },
  { path: MAIL_PAGES.passwordReset, lazy: () => import('./routes/password-reset') },
  { path: MAIL_PAGES.invitation, lazy: () => import('./routes/invitation') },
];

/** Pages inside the frame with the bar on top. */
export const ROUTES: readonly RouteEntry[] = [
  { path: '/applications', lazy: () => import('./routes/applications') },
  {
    path: '/applications/new',
    needs: ['create', 'Application'],
    lazy: () => import('./routes/new-application'),
  },
  { path: '/applications/:number', lazy: () => import('./routes/application') },
  {
    path: '/applications/:number/edit',
    needs: ['update', 'Application'],
    lazy: () => import('./routes/edit-application'),
  },
  {
    path: '/applications/:number/lines/:lineKey',
    needs: ['update', 'Application'],
    lazy: () => import('./routes/line-form'),
  },
  {
    path: '/applications/:number/revisions/:letter/lines/:lineKey',
    lazy: () => import('./routes/filed-line'),
  },
  { path: '/account', lazy: () => import('./routes/account') },
  { path: '/mail-room', lazy: () => import('./routes/mail-room') },
  { path: '/applications/:number/compare', lazy: () => import('./routes/compare') },
  { path: '/applications/:number/record', lazy: () => import('./routes/case-record') },
  {
    path: '/applications/:number/review',
    roles: ['reviewer', 'administrator'],
    lazy: () => import('./routes/review'),
  },
  { path: '/queue', roles: ['reviewer'], lazy: () => import('./routes/queue') },
  { path: '/lines', lazy: () => import('./routes/lines') },
  { path: '/letters', lazy: () => import('./routes/letters') },
  { path: '/rules', lazy: () => import('./routes/rules') },
  { path: '/bands', needs: ['update', 'RuleSet'], lazy: () => import('./routes/bands') },
  { path: '/people', needs: ['administer', 'User'], lazy: () => import('./routes/people') },
  { path: '/record', needs: ['read', 'AuditEvent'], lazy: () => import('./routes/record') },
];
