import { queryOptions, useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { ApiProblem } from './problem';
import { signedInAgain } from './session-loss';
import { keepCsrfToken, send } from './transport';

export type Role = 'applicant' | 'reviewer' | 'administrator';

export interface Membership {
  organisationId: string;
  organisationName: string;
  role: Role;
}

/** Who is signed in, for which organisation and in which role. */
export interface Session {
  user: { id: string; name: string; email: string };
  role: Role;
  organisation: { id: string; name: string };
  memberships: Membership[];
  csrfToken: string;
  demo?: boolean;
}

/** What the first step of the sign-in leads to. */
export type SignInStep = { next: 'in'; session: Session } | { next: 'totp' };

const URL = '/api/session';

async function readSession(response: Response): Promise<Session | null> {
  const body = (await response.json()) as Omit<Session, 'user'> & { user: Session['user'] | null };
  keepCsrfToken(body.csrfToken);
  return body.user ? { ...body, user: body.user } : null;
}

async function getSession(signal?: AbortSignal): Promise<Session | null> {
  try {
    return await readSession(await send({ method: 'GET', url: URL, signal, expectsSession: false }));
  } catch (error) {
    if (error instanceof ApiProblem && error.status === 401) return null;
    throw error;
  }
}

async function post(path: string, body: unknown): Promise<SignInStep> {
  const response = await send({ method: 'POST', url: URL + path, body, expectsSession: false });
  if (response.status === 202) return { next: 'totp' };
  const session = await readSession(response);
  if (!session) throw new Error('The sign-in was answered without a session.');
  return { next: 'in', session };
}

export const sessionQuery = () =>
  queryOptions({
    queryKey: ['session'],
    queryFn: ({ signal }) => getSession(signal),
    staleTime: 5 * 60_000,
  });

/** The session, or null while nobody is signed in. */
export function useSession(): Session | null {
  return useSuspenseQuery(sessionQuery()).data;
}

/** Sends the first step (address and password) or the second (a code) of the sign-in. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (step: { email: string; password: string } | { code: string }) =>
      'code' in step ? post('/totp', step) : post('', step),
    onSuccess: (step) => {
      if (step.next !== 'in') return;
      const before = client.getQueryData(sessionQuery().queryKey);
      // Somebody else at the same screen sees nothing of what the one before has read.
      if (before && before.user.id !== step.session.user.id) client.clear();
      client.setQueryData(sessionQuery().queryKey, step.session);
      signedInAgain();
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => send({ method: 'DELETE', url: URL, expectsSession: false }),
    onSuccess: () => {
      keepCsrfToken(undefined);
      client.clear();
      client.setQueryData(sessionQuery().queryKey, null);
    },
  });
}

/** Goes on working for another of one's organisations; everything read for the former is forgotten. */
export function useSwitchOrganisation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (organisationId: string) =>
      readSession(await send({ method: 'PUT', url: `${URL}/organisation`, body: { organisationId } })),
    onSuccess: (session) => {
      client.clear();
      client.setQueryData(sessionQuery().queryKey, session);
    },
  });
}
