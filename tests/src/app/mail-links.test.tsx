import { QueryClient } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { MAIL_PAGES } from '#shared/contracts/mail-pages';
import { Providers } from '../../../src/app/providers';
import { createRouter } from '../../../src/app/router';

const NOBODY = {
  user: null,
  role: null,
  organisation: null,
  memberships: [],
  barredOrganisationIds: [],
  csrfToken: null,
  next: null,
  gridOwner: { name: 'Northmoor Grid' },
  demo: false,
  setUpNeeded: false,
};
const TOKEN = 'abcdefghijklmnopqrstuvwxyz0123456789';

/** A page's code is fetched when it is first opened. */
const LONG = { timeout: 10_000 };

interface Sent {
  url: string;
  body: unknown;
}
let sent: Sent[];
let status: number;

const json = (body: unknown, code = 200) =>
  new Response(JSON.stringify(body), { status: code, headers: { 'Content-Type': 'application/json' } });
const used = {
  type: '/problems/gone',
  title: 'This link has been used or has expired',
  status: 410,
  instance: '/api',
};

const fetchMock = vi.fn((url: RequestInfo | URL, init?: RequestInit) => {
  if ((init?.method ?? 'GET') === 'GET') return Promise.resolve(json(NOBODY));
  sent.push({ url: String(url), body: JSON.parse(String(init?.body)) as unknown });
  return Promise.resolve(status === 204 ? new Response(null, { status }) : json(used, status));
});

function open(path: string) {
  window.history.pushState({}, '', path);
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  render(
    <Providers queryClient={client}>
      <RouterProvider router={createRouter(client)} />
    </Providers>,
  );
}

beforeEach(() => {
  sent = [];
  status = 204;
  vi.stubGlobal('fetch', fetchMock);
});
afterEach(() => vi.unstubAllGlobals());

describe('the links of account mails', () => {
  it('opens the account of an invitation by the token behind the #', async () => {
    open(`${MAIL_PAGES.invitation}#${TOKEN}`);
    await userEvent.type(await screen.findByLabelText('Your name', {}, LONG), 'N. Newton');
    await userEvent.type(screen.getByLabelText('Password'), 'a beam at rest');
    await userEvent.click(screen.getByRole('button', { name: 'Open the account' }));
    expect(await screen.findByText('Your account is open')).toBeInTheDocument();
    expect(sent.map((one) => one.body)).toEqual([
      { token: TOKEN, name: 'N. Newton', password: 'a beam at rest' },
    ]);
  });

  it('says whom to ask when the link of an invitation holds no more', async () => {
    status = 410;
    open(`${MAIL_PAGES.invitation}#${TOKEN}`);
    await userEvent.type(await screen.findByLabelText('Your name', {}, LONG), 'N. Newton');
    await userEvent.type(screen.getByLabelText('Password'), 'a beam at rest');
    await userEvent.click(screen.getByRole('button', { name: 'Open the account' }));
    expect(await screen.findByText('Ask Northmoor Grid to send another one.')).toBeInTheDocument();
  });

  it('sets a new password by the token behind the #', async () => {
    open(`${MAIL_PAGES.passwordReset}#${TOKEN}`);
    await userEvent.type(await screen.findByLabelText('New password', {}, LONG), 'a beam at rest');
    await userEvent.click(screen.getByRole('button', { name: 'Set the new password' }));
    expect(await screen.findByText('The new password holds')).toBeInTheDocument();
    expect(sent.map((one) => one.body)).toEqual([{ token: TOKEN, password: 'a beam at rest' }]);
  });
});
