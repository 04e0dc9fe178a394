import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { ThreadReply } from '../../../../src/features/review/components/thread-reply';

interface Sent {
  url: string;
  body: unknown;
  key: string | null;
}

let sent: Sent[];
let answers: Response[];

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } });

const STALE = {
  type: '/problems/stale',
  title: 'Somebody changed this in the meantime',
  status: 409,
  detail: 'D-2 was changed since you last saw it.',
  changed: ['D-2 is settled now.'],
};

beforeEach(() => {
  sent = [];
  answers = [];
  vi.stubGlobal(
    'fetch',
    vi.fn((url: string, init?: RequestInit) => {
      if ((init?.method ?? 'GET') === 'GET') return Promise.resolve(json({ csrfToken: 't' }));
      const headers = new Headers(init?.headers);
      sent.push({ url, body: JSON.parse(String(init?.body)), key: headers.get('Idempotency-Key') });
      const answer = answers.shift();
      return answer ? Promise.resolve(answer) : Promise.reject(new TypeError('no connection'));
    }),
  );
});
afterEach(() => vi.unstubAllGlobals());

function open(state: Discrepancy['state']) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  render(
    <QueryClientProvider client={client}>
      <ThreadReply
        discrepancy={{ number: 2, version: 7, state } as Discrepancy}
        context={{ number: '27-0418', revision: 'B', mayAct: true }}
      />
    </QueryClientProvider>,
  );
  return screen.getByRole('textbox', { name: 'Reply to D-2' });
}

const press = (name: string) => userEvent.click(screen.getByRole('button', { name }));

describe('a reviewer’s reply', () => {
  it('asks again only with words, and accepts an answer without', () => {
    open('answered');
    expect(screen.getByRole('button', { name: 'Ask again' })).toBeDisabled();
    expect(screen.getByRole('button', { name: 'Accept the answer' })).toBeEnabled();
  });

  it('settles on the revision and the version that were read', async () => {
    answers = [json({})];
    const words = open('answered');
    await userEvent.type(words, 'Thank you.');
    await press('Accept the answer');
    await waitFor(() => expect(words).toHaveValue(''));
    expect(sent[0]?.url).toBe('/api/applications/27-0418/discrepancies/2/settle');
    expect(sent[0]?.body).toEqual({ revision: 'B', version: 7, text: 'Thank you.' });
  });

  it('keeps the words when the server refuses, and says what changed', async () => {
    answers = [json(STALE, 409)];
    const words = open('answered');
    await userEvent.type(words, 'Please ask the maker.');
    await press('Ask again');
    expect(await screen.findByText('D-2 is settled now.')).toBeInTheDocument();
    expect(words).toHaveValue('Please ask the maker.');
  });

  it('sends the same key again after a lost connection, and another after an answer', async () => {
    const words = open('open');
    await userEvent.type(words, 'One more thing.');
    await press('Add to the thread');
    expect(await screen.findByText(/cannot be reached/)).toBeInTheDocument();
    answers = [json({}), json({})];
    await press('Add to the thread');
    await waitFor(() => expect(words).toHaveValue(''));
    await userEvent.type(words, 'One more thing.');
    await press('Add to the thread');
    await waitFor(() => expect(sent).toHaveLength(3));
    expect(sent[1]?.key).toBe(sent[0]?.key);
    expect(sent[2]?.key).not.toBe(sent[1]?.key);
  });
});
