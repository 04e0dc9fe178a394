import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { problemType } from '#shared/contracts/errors';
import { createQueryClient } from '../../../../src/lib/api/query-client';
import { caseKey } from '../../../../src/lib/queries/case-key';
import { draftLineQuery } from '../../../../src/features/line-form/api/get-draft-line';

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });

/** A server whose draft holds lines under these keys. */
function serverWith(keys: string[], nextLineKey: string) {
  const asked: string[] = [];
  vi.stubGlobal('fetch', (url: string | URL | Request) => {
    const path = new URL(url instanceof Request ? url.url : url, 'http://127.0.0.1').pathname;
    asked.push(path);
    if (path.endsWith('/draft'))
      return Promise.resolve(json({ lines: keys.map((lineKey) => ({ lineKey })), nextLineKey }));
    const found = keys.find((key) => path.endsWith(`/${key}`));
    return Promise.resolve(
      found
        ? json({ lineKey: found, version: 3, line: { name: found } })
        : json({ type: problemType('not-found'), title: 'Not found', status: 404 }, 404),
    );
  });
  return { asked, add: (key: string, next: string) => (keys.push(key), (nextLineKey = next)) };
}

let client = createQueryClient();
beforeEach(() => (client = createQueryClient()));
afterEach(() => {
  client.clear();
  vi.unstubAllGlobals();
});

const open = (lineKey: string) => client.fetchQuery(draftLineQuery('27-0418', lineKey));

describe('a line of the draft that is opened', () => {
  it('begins blank under the next key without asking for a line that cannot be there', async () => {
    const { asked } = serverWith(['L1', 'L2'], 'L3');
    expect(await open('L3')).toBeNull();
    expect(asked.filter((path) => path.endsWith('/L3'))).toEqual([]);
  });

  it('is read where the list has it', async () => {
    serverWith(['L1', 'L2'], 'L3');
    expect(await open('L2')).toMatchObject({ lineKey: 'L2', version: 3 });
  });

  it('is asked for under any other key: the list may be of before', async () => {
    const { asked } = serverWith(['L1'], 'L2');
    expect(await open('L7')).toBeNull();
    expect(asked.some((path) => path.endsWith('/L7'))).toBe(true);
  });

  it('is no blank over the line that was saved under that key a moment ago', async () => {
    const server = serverWith(['L1'], 'L2');
    expect(await open('L2')).toBeNull();
    server.add('L2', 'L3');
    // What every save does.
    await client.invalidateQueries({ queryKey: caseKey('27-0418'), refetchType: 'none' });
    expect(await open('L2')).toMatchObject({ lineKey: 'L2' });
  });
});
