import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import {
  aCaseInReview,
  aDraft,
  aLine,
  expecting,
  PER_MILE,
  runChecks,
  saveLine,
  step,
} from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let rival: Client;
let reviewer: Client;
let number: string;
const at = (path = '') => `/api/applications/${number}${path}`;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  rival = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
});
afterAll(() => app.close());

const PDF = Buffer.from('%PDF-1.7\n% a sheet of the tower\n');
const PNG = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 1, 2, 3]);
const JPEG = Buffer.from([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3]);

function attach(
  client: Client,
  bytes: Buffer,
  filename: string,
  contentType: string,
  fields: Record<string, string> = {},
) {
  const request = client.agent.post(at('/attachments')).set('X-CSRF-Token', client.csrfToken);
  for (const [name, value] of Object.entries(fields)) void request.field(name, value);
  return request.attach('file', bytes, { filename, contentType });
}

describe('attachments', () => {
  beforeAll(async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie', { x1Factor: PER_MILE })]);
  });

  it('are kept with their hash and come back byte for byte, as a file and not as a page', async () => {
    const kept = await expecting<Api.Attachment>(
      201,
      attach(applicant, PDF, 'tower sheet.pdf', 'application/pdf'),
    );
    expect(kept).toMatchObject({
      fileName: 'tower sheet.pdf',
      mediaType: 'application/pdf',
      byteLength: PDF.length,
      sha256: createHash('sha256').update(PDF).digest('hex'),
      subject: { kind: 'application' },
    });
    const answer = await reviewer.get(kept.href).buffer(true);
    expect(answer.body as Buffer).toEqual(PDF);
    expect(answer.headers['content-disposition']).toMatch(/^attachment; filename="tower sheet\.pdf"/);
    expect(answer.headers['x-content-type-options']).toBe('nosniff');
    expect(answer.headers['content-security-policy']).toContain('sandbox');
    expect((await rival.get(kept.href)).status).toBe(404);
  });

  it('hang on a line or a discrepancy, and on nothing else', async () => {
    const onLine = await expecting<Api.Attachment>(
      201,
      attach(reviewer, PNG, 'a.png', 'image/png', { subject: 'line', ref: 'L1' }),
    );
    expect(onLine.subject).toEqual({ kind: 'line', lineKey: 'L1', discrepancy: null });
    const raise = { revision: 'A', title: 'X1', question: 'Why?' };
    await expecting(201, reviewer.post(at('/discrepancies'), raise));
    const subject = { subject: 'discrepancy', ref: '1' };
    const onD = await expecting<Api.Attachment>(201, attach(reviewer, JPEG, 'b.JPG', 'image/jpeg', subject));
    expect(onD.subject).toEqual({ kind: 'discrepancy', lineKey: null, discrepancy: 1 });
    // the applicant knows of D-1 only once it is sent
    expect((await applicant.get(onD.href)).status).toBe(404);
    await expecting<Problem>(422, attach(applicant, JPEG, 'b.jpg', 'image/jpeg', subject));
    await step(reviewer, number, 'return', { revision: 'A' });
    expect((await applicant.get(onD.href)).status).toBe(200);
    const { items } = await expecting<Api.DiscrepancyList>(200, applicant.get(at('/discrepancies')));
    expect(items[0]?.attachments.map((a) => a.fileName)).toEqual(['b.JPG']);
    for (const fields of [
      { subject: 'line', ref: 'L9' },
      { subject: 'discrepancy', ref: '7' },
      { subject: 'user' },
    ]) {
      expect(
        (await attach(applicant, PNG, 'a.png', 'image/png', fields as Record<string, string>)).status,
      ).toBe(422);
    }
  });

  it.each([
    ['a page under another name', Buffer.from('<html><script>1</script>'), 'a.pdf', 'application/pdf', 415],
    ['a picture declared as PDF', PNG, 'a.pdf', 'application/pdf', 415],
    ['a PDF with the ending of a picture', PDF, 'a.png', 'application/pdf', 415],
    ['a page', Buffer.from('<html>'), 'a.html', 'text/html', 415],
    ['a drawing', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), 'a.svg', 'image/svg+xml', 415],
    ['nothing', Buffer.alloc(0), 'a.pdf', 'application/pdf', 422],
    [
      'what the scan refuses',
      Buffer.concat([
        PDF,
        Buffer.from('X5O!P%@AP[4\\PZX54(P^)7CC)7}$EICAR-STANDARD-ANTIVIRUS-TEST-FILE!$H+H*'),
      ]),
      'a.pdf',
      'application/pdf',
      422,
    ],
    ['more than 20 MB', Buffer.concat([PDF, Buffer.alloc(20_000_000)]), 'a.pdf', 'application/pdf', 413],
  ])('refuse %s', async (_, bytes, name, type, status) => {
    expect((await attach(applicant, bytes, name, type)).status).toBe(status);
  });

  it('take their own name and nothing of a path', async () => {
    const kept = await expecting<Api.Attachment>(
      201,
      attach(applicant, PDF, '../../etc/\u202Efdp.pdf', 'application/pdf'),
    );
    expect(kept.fileName).toBe('fdp.pdf');
  });
});

function send(bytes: Buffer, filename: string, fields: Record<string, string> = {}) {
  return applicant.agent
    .post(at('/imports'))
    .set('X-CSRF-Token', applicant.csrfToken)
    .field(fields)
    .attach('file', bytes, { filename, contentType: 'application/octet-stream' });
}
const json = (value: unknown) => Buffer.from(JSON.stringify(value));

describe('imports', () => {
  it('JSON is staged with counts and taken into the draft on the applicant’s word', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    const file = json({
      format: 'filing/1',
      lines: [aLine('Sarn tie', { lengthKm: 3 }), aLine('Fellgate – Sarn')],
    });
    const staged = await expecting<Api.Import>(201, send(file, 'lines.json'));
    expect(staged).toMatchObject({ state: 'staged', format: 'json', dialect: null, faults: [] });
    expect(staged.lines).toMatchObject([
      { name: 'Sarn tie', replaces: true, lineKey: 'L1', lengthKm: 3 },
      { name: 'Fellgate – Sarn', replaces: false, lineKey: null },
    ]);
    const before = await expecting<Api.Draft>(200, applicant.get(at('/draft')));
    expect(before.lines).toHaveLength(1);
    const taken = await expecting<Api.Import>(
      200,
      applicant.post(at(`/imports/${staged.id}/take`), { take: 'all' }),
    );
    expect(taken.state).toBe('imported');
    const draft = await expecting<Api.Draft>(200, applicant.get(at('/draft')));
    expect(draft.lines.map((line) => [line.lineKey, line.name, line.lengthKm, line.complete])).toEqual([
      ['L1', 'Sarn tie', 3, true],
      ['L2', 'Fellgate – Sarn', 40, true],
    ]);
    expect(draft).toMatchObject({ ready: true, nextLineKey: 'L3' });
    const twice = await expecting<Problem>(
      409,
      applicant.post(at(`/imports/${staged.id}/take`), { take: 'all' }),
    );
    expect(twice.detail).toBe('The file has been taken already.');
  });

  it('a file with faults lists each with its pointer, and only the good lines are taken on a word', async () => {
    ({ number } = await aDraft(applicant, []));
    const bad = { ...aLine('Harrow Fell – Sarn'), frequencyHz: 55 };
    const staged = await expecting<Api.Import>(
      201,
      send(json({ format: 'filing/1', lines: [aLine('Sarn tie'), bad] }), 'lines.json'),
    );
    expect(staged.state).toBe('staged');
    expect(staged.faults.map((fault) => fault.pointer)).toContain('/lines/1/frequencyHz');
    const take = (body: object) => applicant.post(at(`/imports/${staged.id}/take`), body);
    expect((await expecting<Problem>(409, take({ take: 'all' }))).detail).toContain('The file has faults');
    await expecting(200, take({ take: 'good', replaceAll: true }));
    const draft = await expecting<Api.Draft>(200, applicant.get(at('/draft')));
    expect(draft.lines.map((line) => line.name)).toEqual(['Sarn tie']);
  });

  it('CSV goes out and comes back to the same content hash', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    const csv = await applicant
      .get(at('/export?format=csv'))
      .buffer(true)
      .parse((res, done) => {
        const parts: Buffer[] = [];
        res.on('data', (part: Buffer) => parts.push(part)).on('end', () => done(null, Buffer.concat(parts)));
      });
    expect(csv.status).toBe(200);
    expect(csv.headers['content-disposition']).toContain(`${number}-draft.csv`);
    const first = await step(applicant, number, 'file');
    const hash = async () =>
      (await expecting<Api.Revision>(200, applicant.get(at('/revisions/A')))).contentHash;
    const original = await hash();
    expect(first.lineCount).toBe(1);
    ({ number } = await aDraft(applicant, []));
    const staged = await expecting<Api.Import>(201, send(csv.body as Buffer, 'lines.csv'));
    expect(staged).toMatchObject({
      format: 'csv',
      rowCount: 1,
      faults: [],
      dialect: { delimiter: 'comma', decimal: 'point' },
    });
    await expecting(200, applicant.post(at(`/imports/${staged.id}/take`), { take: 'all' }));
    await step(applicant, number, 'file');
    expect(await hash()).toBe(original);
  });

  it('a CSV row’s fault names row and column', async () => {
    ({ number } = await aDraft(applicant, []));
    const text =
      'name,from,to,nominal_voltage_kv,frequency_hz,length_km,r1,x1,b1\nA,B,C,345,60,ten,0.04,0.38,4.3\n';
    const staged = await expecting<Api.Import>(201, send(Buffer.from(text), 'lines.csv'));
    expect(staged.faults).toEqual(
      expect.arrayContaining([expect.objectContaining({ row: 2, column: 'length_km' })]),
    );
    expect(staged.state).toBe('refused');
    const take = applicant.post(at(`/imports/${staged.id}/take`), { take: 'good' });
    expect((await expecting<Problem>(409, take)).detail).toBe('Nothing in the file can be taken.');
  });

  it('what was found of a file can be corrected, and nothing else be said', async () => {
    ({ number } = await aDraft(applicant, []));
    const text =
      'name;from;to;nominal_voltage_kv;frequency_hz;length_km;r1;x1;b1;impedance_unit;susceptance_unit\nA;B;C;345;60;4,5;0,04;0,38;4,3;ohm/km;uS/km\n';
    const found = await expecting<Api.Import>(201, send(Buffer.from(text), 'lines.txt'));
    expect(found.dialect).toMatchObject({ delimiter: 'semicolon', decimal: 'comma', encoding: 'utf-8' });
    expect(found.faults).toEqual([]);
    expect(found.lines).toMatchObject([{ name: 'A', lengthKm: 4.5, nominalVoltageKv: 345, circuitCount: 1 }]);
    const corrected = await expecting<Api.Import>(
      201,
      send(Buffer.from(text), 'lines.txt', { decimal: 'point' }),
    );
    expect(corrected.dialect).toMatchObject({ decimal: 'point' });
    expect(corrected.faults.length).toBeGreaterThan(0);
    const refused = await expecting<Problem>(422, send(Buffer.from(text), 'lines.txt', { decimal: 'dot' }));
    expect(refused.errors).toMatchObject([{ pointer: '/decimal', value: 'dot', expected: 'point or comma' }]);
  });

  it('a file with more lines than an application holds is refused whole', async () => {
    ({ number } = await aDraft(applicant, []));
    const { declared, ...rest } = aLine('Sarn tie');
    const bare = {
      ...rest,
      declared,
      sections: [{ kind: 'overhead', lengthKm: 4, earthResistivityOhmM: 100 }],
    };
    const lines = Array.from({ length: 501 }, (_, i) => ({ ...bare, name: `Line ${i}` }));
    const staged = await expecting<Api.Import>(201, send(json({ format: 'filing/1', lines }), 'lines.json'));
    expect(staged).toMatchObject({ state: 'refused', lines: [] });
    expect(staged.faults[0]).toMatchObject({ pointer: '/lines', value: 501, expected: 'at most 500 lines' });
    const fitting = await expecting<Api.Import>(
      201,
      send(json({ format: 'filing/1', lines: lines.slice(1) }), 'lines.json'),
    );
    await expecting(200, applicant.post(at(`/imports/${fitting.id}/take`), { take: 'all' }));
    const filed = await step(applicant, number, 'file');
    expect(filed).toMatchObject({ state: 'filed', lineCount: 500, check: { lineCount: 500 } });
    const more = await expecting<Problem>(
      409,
      applicant.put(at('/draft/lines/L501'), { version: 0, line: {} }),
    );
    expect(more.detail).toContain('The draft is closed');
  });

  it('a file that is none is answered, not swallowed', async () => {
    ({ number } = await aDraft(applicant, []));
    for (const [bytes, name] of [
      [Buffer.from('{"format":'), 'broken.json'],
      [Buffer.from('PK\u0003\u0004rest'), 'lines.csv'],
      [Buffer.alloc(0), 'empty.csv'],
    ] as const) {
      const staged = await expecting<Api.Import>(201, send(bytes, name));
      expect(staged.state).toBe('refused');
      expect(staged.faults.length).toBeGreaterThan(0);
    }
  });
});

describe('drafts', () => {
  it('an incomplete line is saved with its faults and its text as typed', async () => {
    ({ number } = await aDraft(applicant, []));
    const asTyped = { '/nominalVoltageKv': { text: '345 kV?', unit: 'kV' } };
    const path = at('/draft/lines/L1');
    const body = { version: 0, line: { name: 'Half done', frequencyHz: 60 }, asTyped };
    const saved = await expecting<Api.DraftLine>(200, applicant.put(path, body));
    expect(saved).toMatchObject({ version: 1, complete: false, asTyped, name: 'Half done', lengthKm: null });
    expect(saved.faults.map((fault) => fault.pointer)).toContain('/nominalVoltageKv');
    const draft = await expecting<Api.Draft>(200, applicant.get(at('/draft')));
    expect(draft.ready).toBe(false);
    expect(draft.faults.every((fault) => fault.lineKey === 'L1')).toBe(true);
    const refused = await expecting<Problem>(422, applicant.post(at('/file'), {}));
    expect(refused.errors?.map((fault) => fault.pointer)).toContain('/lines/0/nominalVoltageKv');
  });

  it('count what they hold, incomplete lines too, on their page and in the list', async () => {
    ({ number } = await aDraft(applicant, []));
    await saveLine(applicant, number, 'L1', aLine('Sarn tie'), 0);
    await saveLine(applicant, number, 'L2', { nominalVoltageKv: 230, sections: [{ lengthKm: 41.6 }] }, 0);
    const held = { voltagesKv: [345, 230], lineCount: 2, totalLengthKm: 81.6, revision: null };
    expect(await expecting<Api.Application>(200, applicant.get(at()))).toMatchObject(held);
    const list = applicant.get(`/api/applications?filter[number]=${number}`);
    expect((await expecting<Api.ApplicationList>(200, list)).items).toMatchObject([held]);
  });

  it('of two windows the second is told that the line was saved meanwhile, and nothing is lost', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    await saveLine(applicant, number, 'L1', aLine('Sarn tie', { lengthKm: 5 }), 1);
    const stale = await expecting<Problem>(
      409,
      applicant.put(at('/draft/lines/L1'), { version: 1, line: aLine('Sarn tie', { lengthKm: 6 }) }),
    );
    expect(stale).toMatchObject({ type: '/problems/stale', currentVersion: 2 });
    const kept = await expecting<Api.DraftLine>(200, applicant.get(at('/draft/lines/L1')));
    expect(kept.lengthKm).toBe(5);
    await expecting<Problem>(409, applicant.put(at('/draft/lines/L1'), { version: 0, line: {} }));
  });

  it('geometry that cannot be computed is saved and not filed, with the position named', async () => {
    ({ number } = await aDraft(applicant, []));
    const line = JSON.parse(JSON.stringify(aLine('Sarn tie'))) as {
      sections: { positions: { horizontalM: number }[] }[];
    };
    const [section] = line.sections;
    const [a, b] = section?.positions ?? [];
    if (a === undefined || b === undefined) throw new Error('the sample line has two positions');
    b.horizontalM = a.horizontalM;
    const saved = await saveLine(applicant, number, 'L1', { ...line }, 0);
    expect(saved.complete).toBe(false);
    expect(saved.faults[0]?.pointer).toMatch(/^\/sections\/0\/positions\/[01]$/);
    const refused = await expecting<Problem>(422, applicant.post(at('/file'), {}));
    expect(refused.errors?.[0]).toMatchObject({ lineKey: 'L1' });
  });

  it('keys of lines are never given twice', async () => {
    ({ number } = await aDraft(applicant, [aLine('One'), aLine('Two')]));
    await step(applicant, number, 'file');
    await runChecks(app.db);
    await step(reviewer, number, 'take');
    await expecting(201, reviewer.post(at('/discrepancies'), { revision: 'A', title: 'T', question: 'Q?' }));
    await step(reviewer, number, 'return', { revision: 'A' });
    const draft = await expecting<Api.Draft>(200, applicant.delete(at('/draft/lines/L2?version=1')));
    expect(draft.lines.map((line) => line.lineKey)).toEqual(['L1']);
    expect(draft.nextLineKey).toBe('L3');
  });
});

describe('lists', () => {
  it('filter, sort, search and go on from page to page', async () => {
    const all = await expecting<Api.ApplicationList>(
      200,
      applicant.get('/api/applications?sort=number&limit=200'),
    );
    expect(all.total).toBeGreaterThan(4);
    const numbers: string[] = [];
    let cursor: string | null = null;
    do {
      const next: string = cursor === null ? '' : `&cursor=${encodeURIComponent(cursor)}`;
      const path = `/api/applications?sort=number&limit=2${next}`;
      const page: Api.ApplicationList = await expecting(200, applicant.get(path));
      expect(page.items.length).toBeLessThanOrEqual(2);
      numbers.push(...page.items.map((item) => item.number));
      cursor = page.nextCursor;
    } while (cursor !== null);
    expect(numbers).toEqual(all.items.map((item) => item.number));
    expect(numbers).toEqual([...numbers].sort());
    const drafts = await expecting<Api.ApplicationList>(
      200,
      applicant.get('/api/applications?filter[state]=draft'),
    );
    expect(new Set(drafts.items.map((item) => item.state))).toEqual(new Set(['draft']));
    expect(drafts.total).toBeLessThan(all.total);
    const one = await expecting<Api.ApplicationList>(
      200,
      applicant.get(`/api/applications?filter[search]=${number}`),
    );
    expect(one.items.map((item) => item.number)).toEqual([number]);
    const none = await expecting<Api.ApplicationList>(
      200,
      applicant.get('/api/applications?filter[search]=%25'),
    );
    expect(none.total).toBe(0);
  });

  it.each(['applicant', 'state', 'voltage', 'lines', 'grade', 'due', 'age', 'reviewer', 'number'])(
    'the queue sorts by %s, both ways, over pages',
    async (sort) => {
      for (const order of [sort, `-${sort}`]) {
        const all = await expecting<Api.Queue>(200, reviewer.get(`/api/queue?sort=${order}`));
        const first = await expecting<Api.Queue>(200, reviewer.get(`/api/queue?sort=${order}&limit=1`));
        const rest = await expecting<Api.Queue>(
          200,
          reviewer.get(`/api/queue?sort=${order}&cursor=${encodeURIComponent(first.nextCursor ?? '')}`),
        );
        expect([...first.items, ...rest.items].map((i) => i.number)).toEqual(all.items.map((i) => i.number));
      }
    },
  );

  it('the queue filters by who has it, by grade and by voltage', async () => {
    const get = (query: string) => expecting<Api.Queue>(200, reviewer.get(`/api/queue?${query}`));
    const mine = await get('filter[reviewer]=me');
    expect(new Set(mine.items.map((item) => item.reviewer?.id))).toEqual(new Set([reviewer.actor.userId]));
    expect(mine.total).toBe(mine.counts.mine);
    const nobody = await get('filter[reviewer]=nobody');
    expect(nobody.total).toBe(nobody.counts.nobody);
    const grave = await get('filter[grade]=must-answer');
    expect(new Set(grave.items.map((item) => item.worstGrade))).toEqual(new Set(['must-answer']));
    expect((await get('filter[voltage]=345')).total).toBe((await get('')).total);
    expect((await get('filter[voltage]=115')).total).toBe(0);
    const [first] = mine.items;
    const byNumber = await get(`filter[number]=${first?.number ?? ''}`);
    expect(byNumber.items.map((item) => item.number)).toEqual([first?.number]);
    expect((await get('filter[state]=accepted')).total).toBe(0);
  });

  it('lines and letters of all cases', async () => {
    const lines = await expecting<Api.LineList>(
      200,
      reviewer.get('/api/lines?filter[search]=sarn&sort=-length'),
    );
    expect(lines.total).toBeGreaterThan(2);
    expect(lines.items[0]).toMatchObject({
      conductors: '2 × Drake',
      circuitCount: 1,
      sectionCount: 1,
      nominalVoltageKv: 345,
    });
    const letters = await expecting<Api.LetterList>(
      200,
      reviewer.get('/api/letters?filter[kind]=return&limit=1'),
    );
    expect(letters.items).toHaveLength(1);
    expect(letters.total).toBeGreaterThan(1);
  });

  it('rules and conductors go to whoever is signed in', async () => {
    const rules = await expecting<Api.Rules>(200, applicant.get('/api/rules'));
    expect(rules.bands.length).toBeGreaterThan(100);
    expect(rules.owner).toEqual({ baseMva: 100, earthResistivityOhmM: 100 });
    expect(rules.tolerances).toHaveProperty('x1');
    const conductors = await expecting<Api.ConductorList>(200, applicant.get('/api/conductors'));
    expect(conductors.items.find((item) => item.name === 'Drake')).toMatchObject({
      choosable: true,
      retired: false,
    });
  });
});
