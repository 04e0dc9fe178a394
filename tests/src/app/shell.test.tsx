import { QueryClient } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Suspense, useState } from 'react';
import { MemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Providers } from '../../../src/app/providers';
import { createRouter } from '../../../src/app/router';
import { SessionOverlay } from '../../../src/app/session-overlay';
import { send } from '../../../src/lib/api/transport';

const SIGNED_IN = {
  user: { id: 'u1', name: 'M. Thornholt', email: 'm.thornholt@northmoor.example' },
  role: 'reviewer',
  organisation: { id: 'o1', name: 'Northmoor Grid', kind: 'owner' },
  memberships: [{ organisationId: 'o1', organisationName: 'Northmoor Grid', role: 'reviewer' }],
  barredOrganisationIds: [],
  csrfToken: 'token',
  next: null,
  gridOwner: { name: 'Northmoor Grid' },
  demo: false,
  setUpNeeded: false,
};
const NOBODY = { ...SIGNED_IN, user: null, role: null, organisation: null, memberships: [], csrfToken: null };

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });

type Answer = (url: string, method: string) => Response | undefined;
let answer: Answer;

/** What the tests do not answer stays on its way: pages then show their skeletons. */
const fetchMock = vi.fn((url: RequestInfo | URL, init?: RequestInit) => {
  const given = answer(String(url), init?.method ?? 'GET');
  return given ? Promise.resolve(given) : new Promise<Response>(() => undefined);
});

/** A page's code is fetched when it is first opened. */
const LONG = { timeout: 10_000 };

const client = () => new QueryClient({ defaultOptions: { queries: { retry: false } } });

function open(path: string) {
  window.history.pushState({}, '', path);
  const queryClient = client();
  render(
    <Providers queryClient={queryClient}>
      <RouterProvider router={createRouter(queryClient)} />
    </Providers>,
  );
}

beforeEach(() => {
  vi.stubGlobal('fetch', fetchMock);
  vi.spyOn(window, 'scrollTo').mockImplementation(() => undefined);
});
afterEach(() => vi.unstubAllGlobals());

describe('coming in', () => {
  it('leads somebody without a session to the sign-in, with the way back', async () => {
    answer = (url) => (url === '/api/session' ? json(NOBODY) : undefined);
    open('/queue?sort=-due');
    await waitFor(() => expect(window.location.pathname).toBe('/sign-in'), LONG);
    expect(new URLSearchParams(window.location.search).get('next')).toBe('/queue?sort=-due');
  });

  it('leads each role to its first place, and marks where one is', async () => {
    answer = (url) => (url === '/api/session' ? json(SIGNED_IN) : undefined);
    open('/');
    await waitFor(() => expect(window.location.pathname).toBe('/queue'), LONG);
    const place = await screen.findByRole('link', { name: 'Queue' });
    expect(place).toHaveAttribute('aria-current', 'page');
    expect(screen.getByRole('link', { name: 'Skip to the page' })).toHaveAttribute('href', '#page');
  });

  it('has no page of another role, as if it were not there', async () => {
    answer = (url) => (url === '/api/session' ? json(SIGNED_IN) : undefined);
    open('/bands');
    expect(
      await screen.findByRole('heading', { name: 'There is nothing at this address' }, LONG),
    ).toBeInTheDocument();
  });

  it('has nothing at an address that is nobody’s, and says what may have happened', async () => {
    answer = (url) => (url === '/api/session' ? json(SIGNED_IN) : undefined);
    open('/no-such-place');
    expect(
      await screen.findByRole('heading', { name: 'There is nothing at this address' }),
    ).toBeInTheDocument();
  });
});

function Desk() {
  const [saved, setSaved] = useState('');
  const save = async () => {
    const response = await send({ method: 'PUT', url: '/api/thing', body: {} });
    setSaved(((await response.json()) as { saved: string }).saved);
  };
  return (
    <>
      <input aria-label="Typed" />
      <button onClick={() => void save()}>Save</button>
      <p>{saved}</p>
      <SessionOverlay />
    </>
  );
}

describe('a session that ends while somebody works', () => {
  it('is renewed above the page: what was typed stays, and the save goes on by itself', async () => {
    let alive = true;
    answer = (url, method) => {
      if (url === '/api/session' && method === 'POST') {
        alive = true;
        return json(SIGNED_IN);
      }
      if (url === '/api/session') return json(SIGNED_IN);
      return alive
        ? json({ saved: 'Saved at 10:42' })
        : json({ type: '/problems/not-signed-in', title: 'Sign in', status: 401 }, 401);
    };
    render(
      <Providers queryClient={client()}>
        <MemoryRouter>
          <Suspense>
            <Desk />
          </Suspense>
        </MemoryRouter>
      </Providers>,
    );
    await userEvent.type(await screen.findByLabelText('Typed'), '0.613');
    alive = false;
    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByRole('dialog', { name: 'Sign in to go on' })).toBeInTheDocument();
    expect(screen.getByLabelText('Email')).toHaveValue(SIGNED_IN.user.email);
    await userEvent.type(screen.getByLabelText('Password'), 'a long enough word{Enter}');
    expect(await screen.findByText('Saved at 10:42')).toBeInTheDocument();
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(screen.getByLabelText('Typed')).toHaveValue('0.613');
  });
});
