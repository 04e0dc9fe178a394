import {
  queryOptions,
  useMutation,
  useQueryClient,
  useSuspenseQuery,
  type QueryClient,
} from '@tanstack/react-query';
import type {
  Membership,
  NextStep,
  Session as SessionAnswer,
  TotpEnrolment,
} from '#shared/contracts/api.generated';
import { signedInAgain, waitForSignIn } from './session-loss';
import { keepCsrfToken, send } from './transport';

export type Role = Membership['role'];

/** Somebody signed in, for an organisation and in a role. */
export interface Session extends SessionAnswer {
  user: NonNullable<SessionAnswer['user']>;
  role: Role;
  organisation: NonNullable<SessionAnswer['organisation']>;
}

/** What a step of the sign-in leads to. */
export type SignInStep = { next: 'in'; session: Session } | NextStep;

const URL = '/api/session';

function signedIn(answer: SessionAnswer): Session | null {
  const { user, role, organisation } = answer;
  return user && role && organisation ? { ...answer, user, role, organisation } : null;
}

async function readSession(response: Response): Promise<SessionAnswer> {
  const answer = (await response.json()) as SessionAnswer;
  keepCsrfToken(answer.csrfToken ?? undefined);
  return answer;
}

async function getSession(signal?: AbortSignal): Promise<Session | null> {
  const response = await send({ method: 'GET', url: URL, signal, expectsSession: false });
  return signedIn(await readSession(response));
}

async function post(path: string, body: unknown): Promise<SignInStep> {
  const response = await send({ method: 'POST', url: URL + path, body, expectsSession: false });
  if (response.status === 202) return (await response.json()) as NextStep;
  const session = signedIn(await readSession(response));
  if (!session)
    throw new Error('Your account belongs to no organisation. Ask an administrator to add you to one.');
  return { next: 'in', session };
}

const KEY = ['session'] as const;

/**
 * Who is signed in, asked anew. Where somebody was a moment ago and is not any more, the answer waits for
 * the sign-in above the page: to say "nobody" would take the page away with all that was typed into it.
 */
async function askForSession(client: QueryClient, signal: AbortSignal): Promise<Session | null> {
  const session = await getSession(signal);
  const before = client.getQueryData<Session | null>(KEY);
  if (session || !before) return session;
  await waitForSignIn(new Error('The session has ended.'));
  return client.getQueryData<Session | null>(KEY) ?? null;
}

export const sessionQuery = () =>
  queryOptions({
    queryKey: KEY,
    queryFn: ({ client, signal }) => askForSession(client, signal),
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

/** Asks for the secret that an authenticator is set up with, where the role requires a second step. */
export function useEnrolTotp() {
  return useMutation({
    mutationFn: async () => {
      const url = `${URL}/totp-enrolment`;
      const response = await send({ method: 'POST', url, expectsSession: false });
      return (await response.json()) as TotpEnrolment;
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
      signedIn(
        await readSession(
          await send({ method: 'PUT', url: `${URL}/organisation`, body: { organisationId } }),
        ),
      ),
    onSuccess: (session) => {
      // Set before as well: what is on the page listens to the entry that is about to be forgotten.
      client.setQueryData(sessionQuery().queryKey, session);
      client.clear();
      client.setQueryData(sessionQuery().queryKey, session);
    },
  });
}
