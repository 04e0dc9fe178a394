import { ConnectionLost, readProblem, type ApiProblem } from './problem';
import { waitForSignIn } from './session-loss';

export interface Sending {
  method: string;
  url: string;
  body?: unknown;
  headers?: Record<string, string>;
  signal?: AbortSignal;
  /** The sign-in itself and the question who is signed in take "nobody" for an answer. */
  expectsSession?: boolean;
}

const SAFE = new Set(['GET', 'HEAD']);
const SESSION_URL = '/api/session';

let csrfToken: string | undefined;

/** Keeps the token that came with the session, or forgets it after a sign-out. */
export function keepCsrfToken(token: string | undefined): void {
  csrfToken = token;
}

async function fetchCsrfToken(): Promise<void> {
  const response = await fetch(SESSION_URL, { headers: { Accept: 'application/json' } });
  if (!response.ok) return;
  const session = (await response.json()) as { csrfToken?: string };
  csrfToken = session.csrfToken;
}

function bodyOf(body: unknown): { body?: BodyInit; type: Record<string, string> } {
  if (body === undefined) return { type: {} };
  if (body instanceof FormData) return { body, type: {} };
  return { body: JSON.stringify(body), type: { 'Content-Type': 'application/json' } };
}

/** Headers of every write: the token that shows that it comes from this product's page. */
export async function writeHeaders(): Promise<Record<string, string>> {
  if (csrfToken === undefined) await fetchCsrfToken();
  const token: Record<string, string> = csrfToken === undefined ? {} : { 'X-CSRF-Token': csrfToken };
  return { Accept: 'application/json', ...token };
}

async function attempt(sending: Sending): Promise<Response> {
  const { body, type } = bodyOf(sending.body);
  const safe = SAFE.has(sending.method);
  const headers = {
    ...(safe ? { Accept: 'application/json' } : await writeHeaders()),
    ...type,
    ...sending.headers,
  };
  try {
    return await fetch(sending.url, { method: sending.method, headers, body, signal: sending.signal });
  } catch (cause) {
    if (cause instanceof DOMException && cause.name === 'AbortError') throw cause;
    throw new ConnectionLost(cause);
  }
}

const isStaleToken = (refusal: ApiProblem) => refusal.problem === 'cross-site';

/**
 * Sends a request and gives its answer. A token that went stale is fetched anew once; a session that
 * ended makes the request wait for the sign-in and then go again. Any other refusal is thrown.
 */
export async function send(sending: Sending): Promise<Response> {
  const response = await attempt(sending);
  if (response.ok) return response;
  const problem = await readProblem(response);
  if (isStaleToken(problem)) await fetchCsrfToken();
  else if (problem.status === 401 && sending.expectsSession !== false) await waitForSignIn(problem);
  else throw problem;
  const again = await attempt(sending);
  if (!again.ok) throw await readProblem(again);
  return again;
}
