import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { addressOf, call, fileForm } from '../../../../src/lib/api/call';
import { ApiProblem, ConnectionLost } from '../../../../src/lib/api/problem';
import { isSessionLost, leftInstead, signedInAgain } from '../../../../src/lib/api/session-loss';
import { keepCsrfToken, send } from '../../../../src/lib/api/transport';

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });
const problem = (name: string, status: number, more: object = {}) =>
  json({ type: `/problems/${name}`, title: name, status, ...more }, status);

const fetchMock = vi.fn<typeof fetch>();
const sent = (i: number) => {
  const [url, init] = fetchMock.mock.calls[i] ?? [];
  return {
    url,
    method: init?.method,
    headers: (init?.headers ?? {}) as Record<string, string>,
    body: init?.body,
  };
};

beforeEach(() => {
  vi.stubGlobal('fetch', fetchMock);
  keepCsrfToken('first');
});
afterEach(() => {
  fetchMock.mockReset();
  vi.unstubAllGlobals();
});

describe('sending', () => {
  it('sends the token with writes and not with reads', async () => {
    fetchMock.mockImplementation(async () => json({}));
    await send({ method: 'GET', url: '/api/queue' });
    await send({ method: 'POST', url: '/api/applications', body: { title: 'x' } });
    expect(sent(0).headers['X-CSRF-Token']).toBeUndefined();
    expect(sent(1).headers).toMatchObject({ 'X-CSRF-Token': 'first', 'Content-Type': 'application/json' });
    expect(sent(1).body).toBe('{"title":"x"}');
  });

  it('fetches a token before the first write, and once more when it went stale', async () => {
    keepCsrfToken(undefined);
    fetchMock
      .mockResolvedValueOnce(json({ csrfToken: 'one' }))
      .mockResolvedValueOnce(problem('cross-site', 403))
      .mockResolvedValueOnce(json({ csrfToken: 'two' }))
      .mockResolvedValueOnce(json({ done: true }));
    await send({ method: 'POST', url: '/api/x', body: {} });
    expect(sent(1).headers['X-CSRF-Token']).toBe('one');
    expect(sent(3).headers['X-CSRF-Token']).toBe('two');
    expect(fetchMock).toHaveBeenCalledTimes(4);
  });

  it('does not go round in circles when the new token is refused too', async () => {
    fetchMock.mockImplementation(async (url) =>
      String(url) === '/api/session' ? json({ csrfToken: 'x' }) : problem('cross-site', 403),
    );
    await expect(send({ method: 'POST', url: '/api/x' })).rejects.toMatchObject({ status: 403 });
    expect(fetchMock).toHaveBeenCalledTimes(3);
  });

  it('throws what the server says, with its short name and faults', async () => {
    const errors = [
      { pointer: '/lines/0/name', value: '', expected: 'a name', message: 'The line has no name.' },
    ];
    fetchMock.mockResolvedValueOnce(problem('invalid-content', 422, { detail: 'One entry.', errors }));
    const refusal = await send({ method: 'GET', url: '/api/x' }).catch((e: unknown) => e);
    expect(refusal).toBeInstanceOf(ApiProblem);
    expect(refusal).toMatchObject({ problem: 'invalid-content', message: 'One entry.', faults: errors });
  });

  it('makes a problem of an answer that is none', async () => {
    fetchMock.mockResolvedValueOnce(new Response('<html>', { status: 502 }));
    await expect(send({ method: 'GET', url: '/api/x' })).rejects.toMatchObject({
      status: 502,
      problem: undefined,
    });
  });

  it('tells a lost connection from an abort', async () => {
    fetchMock.mockRejectedValueOnce(new TypeError('failed'));
    await expect(send({ method: 'GET', url: '/api/x' })).rejects.toBeInstanceOf(ConnectionLost);
    fetchMock.mockRejectedValueOnce(new DOMException('stopped', 'AbortError'));
    await expect(send({ method: 'GET', url: '/api/x' })).rejects.toMatchObject({ name: 'AbortError' });
  });
});

describe('a session that ends', () => {
  it('makes requests wait, and lets them go again after the sign-in', async () => {
    fetchMock
      .mockResolvedValueOnce(problem('not-signed-in', 401))
      .mockResolvedValueOnce(json({ saved: true }));
    const saving = send({ method: 'PUT', url: '/api/x', body: { typed: 'kept' } });
    await vi.waitFor(() => expect(isSessionLost()).toBe(true));
    keepCsrfToken('renewed');
    signedInAgain();
    expect(await (await saving).json()).toEqual({ saved: true });
    expect(sent(1)).toMatchObject({ body: '{"typed":"kept"}', headers: { 'X-CSRF-Token': 'renewed' } });
    expect(isSessionLost()).toBe(false);
  });

  it('gives the refusal to those who wait when the person leaves', async () => {
    fetchMock.mockResolvedValueOnce(problem('not-signed-in', 401));
    const reading = send({ method: 'GET', url: '/api/x' });
    await vi.waitFor(() => expect(isSessionLost()).toBe(true));
    leftInstead();
    await expect(reading).rejects.toMatchObject({ problem: 'not-signed-in' });
  });

  it('is no loss where a refusal is the answer: the sign-in itself', async () => {
    fetchMock.mockResolvedValueOnce(problem('sign-in-refused', 401));
    const trying = send({ method: 'POST', url: '/api/session', expectsSession: false });
    await expect(trying).rejects.toMatchObject({ problem: 'sign-in-refused' });
    expect(isSessionLost()).toBe(false);
  });
});

describe('calling an operation', () => {
  it('fills path and query, leaving out what is empty', () => {
    expect(addressOf('getApplication', { params: { applicationId: '27-0418' } })).toBe(
      '/api/applications/27-0418',
    );
    expect(addressOf('listQueue', { query: { sort: '-due', cursor: undefined, limit: '' } })).toBe(
      '/api/queue?sort=-due',
    );
  });

  it('sends the key of an intention, and a file as a form', async () => {
    fetchMock.mockImplementation(async () => json({}));
    const file = new File(['a,b'], 'lines.csv');
    const body = fileForm(file, { subject: 'application' });
    await call('importFile', { params: { applicationId: '27-0418' }, body, idempotencyKey: 'k1' });
    expect(sent(0)).toMatchObject({ method: 'POST', url: '/api/applications/27-0418/imports', body });
    expect(sent(0).headers['Idempotency-Key']).toBe('k1');
    expect(sent(0).headers['Content-Type']).toBeUndefined();
  });
});
