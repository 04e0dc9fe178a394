import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Suspense, memo } from 'react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { sessionQuery, useSession, useSwitchOrganisation } from '../../../../src/lib/api/session';

const working = (id: string, name: string) => ({
  user: { id: 'u1', name: 'R. Aske', email: 'aske@askeline.example' },
  role: 'applicant' as const,
  organisation: { id, name, kind: 'applicant' as const },
  memberships: [],
  barredOrganisationIds: [],
  csrfToken: 'token',
  next: null,
  gridOwner: { name: 'Northmoor Grid' },
  demo: false,
  setUpNeeded: false,
});

/** Stands elsewhere on the page: nothing but the session makes it draw again. */
const Lead = memo(function Lead() {
  return <p>{`Working for ${useSession()?.organisation.name ?? 'nobody'}`}</p>;
});

function Switch() {
  const change = useSwitchOrganisation();
  return <button onClick={() => change.mutate('o2')}>Skerrow Power</button>;
}

beforeEach(() =>
  vi.stubGlobal(
    'fetch',
    vi.fn(() => Promise.resolve(Response.json(working('o2', 'Skerrow Power')))),
  ),
);
afterEach(() => vi.unstubAllGlobals());

it('tells every part of the page for whom one works now, and forgets what was read for the former', async () => {
  const client = new QueryClient();
  client.setQueryData(sessionQuery().queryKey, working('o1', 'Lintgarth Industries'));
  client.setQueryData(['applications'], ['26-0292']);
  render(
    <QueryClientProvider client={client}>
      <Suspense>
        <Lead />
      </Suspense>
      <Switch />
    </QueryClientProvider>,
  );
  expect(screen.getByText('Working for Lintgarth Industries')).toBeInTheDocument();
  await userEvent.click(screen.getByRole('button'));
  expect(await screen.findByText('Working for Skerrow Power')).toBeInTheDocument();
  expect(client.getQueryData(['applications'])).toBeUndefined();
});
