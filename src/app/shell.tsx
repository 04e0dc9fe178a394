import { Suspense, useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { SkeletonPage } from '../components/feedback/skeleton';
import { useKeptFocus } from '../hooks/use-kept-focus';
import { useSession } from '../lib/api/session';
import { SessionOverlay } from './session-overlay';
import { TopBar } from './top-bar';

/** After a change of place the focus starts at the page, not at the link that was pressed. */
function usePageFocus() {
  const page = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const first = useRef(true);
  useEffect(() => {
    if (!first.current) page.current?.focus({ preventScroll: true });
    first.current = false;
  }, [pathname]);
  return page;
}

/** The frame of every page for people who are signed in. */
export function Shell() {
  const session = useSession();
  const page = usePageFocus();
  const navigation = useNavigation();
  useKeptFocus();
  if (!session) return null;
  return (
    <>
      <a className="skip-link" href="#page">
        Skip to the page
      </a>
      <TopBar session={session} />
      <main
        id="page"
        className="page"
        tabIndex={-1}
        ref={page}
        aria-busy={navigation.state === 'loading' || undefined}
      >
        <Suspense fallback={<SkeletonPage />}>
          <Outlet />
        </Suspense>
      </main>
      <footer className="page-foot">
        The check replaces no engineering study by licensed engineers. Local codes govern.
      </footer>
      <SessionOverlay />
      <ScrollRestoration />
    </>
  );
}
