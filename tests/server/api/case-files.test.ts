import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import { aDraft, aLine, expecting, runChecks, saveLine, step } from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let reviewer: Client;
let number: string;
const at = (path = '') => `/api/applications/${number}${path}`;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
});
afterAll(() => app.close());

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
