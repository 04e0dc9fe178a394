import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import { solveLine } from '#shared/engine/index';
import { readLine } from '#shared/filing/read-filing';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { aDraft, aLine, expecting, PARTICULARS, runChecks, saveLine, step } from '../../support/case';
import { aMembership, anOrganisation } from '../../support/people';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let number: string;
const at = (path = '') => `/api/applications/${number}${path}`;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
});
afterAll(() => app.close());

const NUL = '\u0000';
const HALF = '\ud83d';

function send(
  bytes: Buffer | string,
  filename: string,
  fields: Record<string, string> = {},
  type = 'text/csv',
) {
  const request = applicant.agent.post(at('/imports')).set('X-CSRF-Token', applicant.csrfToken);
  for (const [name, value] of Object.entries(fields)) void request.field(name, value);
  return request.attach('file', Buffer.from(bytes), { filename, contentType: type });
}

describe('signs that PostgreSQL keeps nowhere', () => {
  it.each([
    ['NUL', NUL],
    ['half a character', HALF],
  ])('%s is a fault with its place, not a fault of the server', async (_, sign) => {
    const text = `Fell${sign}gate`;
    const named = await expecting<Problem>(
      422,
      applicant.post('/api/applications', { ...PARTICULARS, title: text }),
    );
    expect(named.errors).toMatchObject([{ pointer: '/title' }]);
    const body = { version: 1, line: { name: 'Sarn tie', remarks: [{ deep: text }] } };
    const deep = await expecting<Problem>(422, applicant.put(at('/draft/lines/L1'), body));
    expect(deep.errors).toMatchObject([{ pointer: '/line/remarks/0/deep' }]);
    const key = { version: 1, line: { [text]: 1 } };
    await expecting<Problem>(422, applicant.put(at('/draft/lines/L1'), key));
  });

  it('nor in a query, a field beside a file or a file’s name', async () => {
    await expecting<Problem>(422, applicant.get('/api/applications?filter[search]=%00'));
    const upload = applicant.agent.post(at('/attachments')).set('X-CSRF-Token', applicant.csrfToken);
    void upload.field('subject', 'line').field('ref', `L1${NUL}`);
    const file = { filename: 'a.pdf', contentType: 'application/pdf' };
    const answer = await upload.attach('file', Buffer.from('%PDF-1.7'), file);
    expect(answer.status).toBe(422);
    // a name that is cut in the middle of a character
    const name = `${'a'.repeat(195)}😀${'b'.repeat(40)}.csv`;
    await expecting<Api.Import>(201, send('name\nx\n', name));
  });

  it.each([
    [
      'a JSON file’s texts',
      'a.json',
      JSON.stringify({ format: 'filing/1', lines: [{ name: `a${NUL}b`, from: HALF }] }),
    ],
    [
      'a JSON file’s keys',
      'a.json',
      JSON.stringify({ format: 'filing/1', lines: [{ [`a${NUL}b`]: 1, name: 'x' }] }),
    ],
    [
      'a value that is cut',
      'a.json',
      JSON.stringify({ format: 'filing/1', lines: [{ name: 3, from: `${'x'.repeat(79)}😀y`.repeat(3) }] }),
    ],
    ['a CSV header', 'a.csv', `name,fr${NUL}om\nx,y\n`],
    ['a CSV cell', 'a.csv', `name,from,frequency_hz\nx${NUL},y,5${NUL}0\n`],
  ])('%s: the file is answered with its faults', async (_, fileName, text) => {
    const read = await expecting<Api.Import>(201, send(text, fileName));
    expect(read.faults.length).toBeGreaterThan(0);
    expect((await expecting<Api.Import>(200, applicant.get(at(`/imports/${read.id}`)))).faults).toEqual(
      read.faults,
    );
  });
});

describe('a made-up cursor', () => {
  const cursor = (...parts: unknown[]) => Buffer.from(JSON.stringify(parts)).toString('base64url');
  it.each([
    ['a number for a text', 'number', cursor(5, 'x')],
    ['a text for a number', 'updated', cursor('5; DROP TABLE users', 'x')],
    ['a NUL', 'number', cursor(`a${NUL}`, 'x')],
    ['a list', 'number', cursor([], 'x')],
  ])('with %s is refused in words or gives a page', async (_, sort, made) => {
    const answer = await applicant.get(`/api/applications?sort=${sort}&cursor=${made}`);
    expect([200, 400]).toContain(answer.status);
    expect(answer.text).not.toMatch(/syntax|column|double precision|SELECT/i);
  });
});

describe('JSON that is made to hurt', () => {
  it('of a hundred thousand levels, or with numbers that no double holds, is refused', async () => {
    const raw = (text: string) =>
      applicant.agent
        .put(at('/draft/lines/L1'))
        .set('X-CSRF-Token', applicant.csrfToken)
        .set('Content-Type', 'application/json')
        .send(text);
    const deep = `{"version":1,"line":{"a":${'['.repeat(100_000)}${']'.repeat(100_000)}}}`;
    expect((await raw(deep)).status).toBe(422);
    expect((await raw('{"version":1,"line":{"sections":[{"lengthKm":1e999}]}}')).status).toBe(422);
    expect((await raw('{"version":1,"line":{"__proto__":{"name":"x"}}}')).status).toBe(422);
    expect((await raw(`{"version":1,"line":{"name":"${'x'.repeat(3_000_000)}"}}`)).status).toBe(413);
    expect((await raw('{"version":1,"line":NaN}')).status).toBe(400);
  });
});

describe('numbers', () => {
  it('come back from the database with every digit of a double', async () => {
    const awkward = 40.1 + 0.2 + 1e-13;
    const line = { name: 'Awkward', sections: [{ kind: 'overhead', lengthKm: awkward }] };
    const { number: own } = await aDraft(applicant, []);
    const saved = await saveLine(applicant, own, 'L1', line, 0);
    expect(saved.line).toEqual(line);
    const { number: filed } = await aDraft(applicant, [aLine('Sarn', { x1Factor: 1.1, lengthKm: awkward })]);
    await step(applicant, filed, 'file');
    await runChecks(app.db);
    const kept = await app.db.owner.query<{ recomputed: number; report: number; parameter: string }[]>(
      `SELECT v.parameter, v.recomputed,
          (r.report #>> ARRAY['lines', '0', 'circuits', '0', 'recomputed', v.parameter])::float8 AS report
        FROM run_values v JOIN check_runs r ON r.id = v.run_id WHERE v.parameter IN ('r1', 'x1', 'b1', 'x0')`,
    );
    const again = await recomputed(awkward);
    expect(kept).toHaveLength(4);
    for (const { parameter, recomputed: value, report } of kept) {
      expect(value).toBe(again[parameter as keyof typeof again]);
      expect(report).toBe(value);
    }
  });
});

/** The same line through the engine alone, with nothing of the database between. */
async function recomputed(lengthKm: number) {
  const owner = { baseMva: 100, earthResistivityOhmM: 100 };
  const line = aLine('Sarn', { x1Factor: 1.1, lengthKm });
  const read = readLine(line, { library: STARTING_LIBRARY, owner });
  if (!read.ok || read.line.engineInput === null) throw new Error('the sample line cannot be read');
  const solved = solveLine(read.line.engineInput, 60);
  const [values] = solved.ok ? solved.value.circuits : [];
  if (values === undefined) throw new Error('the sample line cannot be computed');
  return values;
}

describe('a CSV file', () => {
  const HEADER =
    'name,from,to,nominal_voltage_kv,frequency_hz,length_km,r1,x1,b1,impedance_unit,susceptance_unit\n';
  const rows = (count: number) =>
    HEADER +
    Array.from({ length: count }, (_, i) => `Line ${i},A,B,345,60,4,0.04,0.38,4.3,ohm/km,uS/km\n`).join('');

  it('of 500 rows is taken, one of 501 is refused with the reason', async () => {
    const full = await expecting<Api.Import>(201, send(rows(500), 'lines.csv'));
    expect(full).toMatchObject({ state: 'staged', rowCount: 500, faults: [] });
    expect(full.lines).toHaveLength(500);
    const more = await expecting<Api.Import>(201, send(rows(501), 'lines.csv'));
    expect(more).toMatchObject({ state: 'refused', rowCount: 501, lines: [] });
    expect(more.faults[0]).toMatchObject({ expected: 'at most 500 rows' });
  });

  it('or an attachment that is too large is refused while it comes in', async () => {
    const large = Buffer.alloc(25 * 1024 * 1024 + 1, 'a');
    expect((await send(large, 'lines.csv')).status).toBe(413);
    const upload = applicant.agent.post(at('/attachments')).set('X-CSRF-Token', applicant.csrfToken);
    const pdf = Buffer.concat([Buffer.from('%PDF-1.7'), large.subarray(0, 20 * 1024 * 1024)]);
    const answer = await upload.attach('file', pdf, { filename: 'a.pdf', contentType: 'application/pdf' });
    expect(answer.status).toBe(413);
  });
});

describe('a repeated key', () => {
  it('means another request once the person acts for another organisation', async () => {
    const other = await app.db.asSystem((tx) => anOrganisation(tx));
    const consultant = await app.signInAs('applicant');
    await app.db.asSystem((tx) =>
      aMembership(tx, { id: consultant.actor.userId } as never, other, 'applicant'),
    );
    const create = (token: string) =>
      consultant.agent
        .post('/api/applications')
        .set({ 'X-CSRF-Token': token, 'Idempotency-Key': 'once' })
        .send(PARTICULARS);
    const first = await expecting<Api.Application>(201, create(consultant.csrfToken));
    expect(await expecting<Api.Application>(201, create(consultant.csrfToken))).toEqual(first);
    const moved = await expecting<{ csrfToken: string }>(
      200,
      consultant.put('/api/session/organisation', { organisationId: other.id }),
    );
    const refused = await expecting<Problem>(422, create(moved.csrfToken));
    expect(refused.type).toBe('/problems/key-reused');
    expect(JSON.stringify(refused)).not.toContain(first.number);
  });
});
