import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AuditEvent } from '#server/entities/record.entities';
import type { BandDraft } from '#shared/contracts/api.generated';
import { makeTestApp } from '../../support/test-app';
import type { Client, TestApp } from '../../support/test-app';

let test: TestApp;
let administrator: Client;

beforeAll(async () => {
  test = await makeTestApp();
  administrator = await test.signInAs('administrator');
});
afterAll(() => test.close());

const draft = async () => (await administrator.get('/api/rules/draft').expect(200)).body as BandDraft;

/** The bands with the first one's lower typical bound moved. */
function moved({ bands }: BandDraft): BandDraft['bands'] {
  const [first, ...others] = bands;
  if (!first) throw new Error('no bands');
  const [low = 0, high = 0] = first.typical;
  return [{ ...first, typical: [low + (high - low) / 10, high], source: 'owner’s own records' }, ...others];
}

describe('the next rule set', () => {
  it('begins as the one in force, saved by nobody', async () => {
    const { version, ruleSetVersion, bands, owner } = await draft();
    expect({ version, ruleSetVersion }).toEqual({ version: 0, ruleSetVersion: 2 });
    expect(bands.length).toBeGreaterThan(100);
    expect(owner.baseMva).toBe(100);
  });

  it.each([
    ['a typical range upside down', { typical: [0.5, 0.3], outer: [0.1, 0.9] }],
    ['an outer range inside the typical one', { typical: [0.3, 0.5], outer: [0.35, 0.9] }],
  ])('refuses %s, with the band', async (_name, change) => {
    const { bands } = await draft();
    const body = { version: 0, bands: [{ ...bands[0], ...change }, ...bands.slice(1)] };
    const answer = await administrator.put('/api/rules/draft', body).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/bands/0' }] });
  });

  it('refuses a band given twice and a tolerance that the checker does not know', async () => {
    const { bands } = await draft();
    const twice = { version: 0, bands: [...bands, bands[0]] };
    expect((await administrator.put('/api/rules/draft', twice).expect(422)).body).toMatchObject({
      errors: [{ pointer: `/bands/${bands.length}` }],
    });
    const unknown = { version: 0, tolerances: { q9: { relative: 0.1, cap: 0.2 } } };
    expect((await administrator.put('/api/rules/draft', unknown).expect(422)).body).toMatchObject({
      errors: [{ pointer: '/tolerances/q9' }],
    });
  });

  it('needs the version that was read', async () => {
    await administrator.put('/api/rules/draft', {}).expect(428);
  });

  it('is saved without coming into force, published with a reason, and recorded value by value', async () => {
    const before = await draft();
    const saved = await administrator
      .put('/api/rules/draft', { version: 0, bands: moved(before) })
      .expect(200);
    expect(saved.body).toMatchObject({ version: 1, ruleSetVersion: 2 });
    await administrator.put('/api/rules/draft', { version: 0, bands: moved(before) }).expect(409);
    await administrator
      .put('/api/rules/draft', { tolerances: { x1: { relative: 0.02, cap: 0.03 } } })
      .set('If-Match', '"1"')
      .expect(200);
    expect((await administrator.put('/api/rules/draft', { version: 1 })).body).toMatchObject({
      type: '/problems/stale',
    });

    const versions = async () =>
      (
        (await administrator.get('/api/rules/versions')).body as {
          items: { version: number; inForce: boolean }[];
        }
      ).items;
    expect(await versions()).toMatchObject([
      { version: 2, status: 'draft', inForce: false },
      { version: 1, status: 'published', inForce: true },
    ]);
    await administrator.post('/api/rules/draft/publish', { version: 1, reason: 'too late' }).expect(409);
    await administrator.post('/api/rules/draft/publish', { version: 2, reason: '' }).expect(422);
    await administrator
      .post('/api/rules/draft/publish', { version: 2, reason: 'own records of 2026' })
      .expect(200);
    expect(await versions()).toMatchObject([
      { version: 2, status: 'published', inForce: true, reason: 'own records of 2026' },
      { version: 1, status: 'published', inForce: false },
    ]);

    const [event] = await test.db.owner.manager.find(AuditEvent, { where: { act: 'bands.published' } });
    const after = event?.after as { bands: object; tolerances: object };
    expect(Object.keys(after.bands)).toHaveLength(1);
    expect(after.tolerances).toEqual({ x1: { relative: 0.02, cap: 0.03 } });
    expect(Object.keys((event?.before as { bands: object }).bands)).toEqual(Object.keys(after.bands));
  });

  it('never changes again once it is published, by nobody', async () => {
    const tries = [
      'UPDATE bands SET typical_low = typical_low - 1e-9',
      'DELETE FROM tolerances',
      `UPDATE rule_sets SET reason = 'another one'`,
      `INSERT INTO settings (rule_set_id, key, value) SELECT id, 'x', '1' FROM rule_sets LIMIT 1`,
    ];
    for (const statement of tries) {
      await expect(test.db.owner.query(statement), statement).rejects.toThrow(
        /published rule set never changes/,
      );
    }
  });
});

describe('a draft', () => {
  it('is thrown away in the version that was read, and leaves the rules in force alone', async () => {
    const inForce = (await administrator.get('/api/rules')).body as { bandsVersion: string };
    await administrator.delete('/api/rules/draft?version=1').expect(409);
    const begun = await draft();
    await administrator.put('/api/rules/draft', { version: 0, bands: moved(begun) }).expect(200);
    await administrator.delete('/api/rules/draft').expect(428);
    await administrator.delete('/api/rules/draft?version=7').expect(409);
    const left = await administrator.delete('/api/rules/draft?version=1').expect(200);
    expect(left.body).toMatchObject({ version: 0, bands: begun.bands });
    expect((await administrator.get('/api/rules')).body).toMatchObject({
      bandsVersion: inForce.bandsVersion,
    });
  });
});

describe('the calendar', () => {
  const next = { timeZone: 'Europe/Oslo', weekendDays: [0, 6], reason: 'first year' };
  const holidays = [{ day: '2027-05-17', name: 'Constitution Day' }];

  it('is read by everybody who is signed in and changed by administrators alone', async () => {
    const reviewer = await test.signInAs('reviewer');
    expect((await reviewer.get('/api/calendar').expect(200)).body).toMatchObject({
      version: 1,
      holidays: [],
    });
    await reviewer.put('/api/calendar', { version: 1, ...next, holidays }).expect(403);
  });

  it('changes by a new version with a reason, once of two at once', async () => {
    const save = () => administrator.put('/api/calendar', { version: 1, ...next, holidays });
    const statuses = (await Promise.all([save(), save()])).map((answer) => answer.status).sort();
    expect(statuses).toEqual([200, 409]);
    const now = await administrator.get('/api/calendar').expect(200);
    expect(now.body).toEqual({ version: 2, timeZone: 'Europe/Oslo', weekendDays: [0, 6], holidays });
  });

  it.each([
    ['a time zone that does not exist', { ...next, timeZone: 'Europe/Nowhere', holidays }, '/timeZone'],
    [
      'a day that does not exist',
      { ...next, holidays: [{ day: '2027-02-30', name: 'x' }] },
      '/holidays/0/day',
    ],
    ['a day twice', { ...next, holidays: [...holidays, ...holidays] }, '/holidays/1/day'],
  ])('refuses %s', async (_name, body, pointer) => {
    const answer = await administrator.put('/api/calendar', { version: 2, ...body }).expect(422);
    expect((answer.body as { errors: { pointer: string }[] }).errors[0]?.pointer).toBe(pointer);
  });
});

describe('the audit trail', () => {
  it('is read page by page, newest first, and narrowed by act', async () => {
    interface Page {
      items: { seq: number; act: string }[];
      next: string | null;
    }
    const first = (await administrator.get('/api/audit-events?limit=2').expect(200)).body as Page;
    expect(first.items).toHaveLength(2);
    const second = (await administrator.get(`/api/audit-events?limit=2&cursor=${first.next}`)).body as Page;
    const places = [...first.items, ...second.items].map((item) => item.seq);
    expect(places).toEqual([...places].sort((a, b) => b - a));
    const bands = (await administrator.get('/api/audit-events?filter[act]=bands.')).body as Page;
    expect(bands.items.map((item) => item.act)).toContain('bands.published');
    expect(bands.items.every((item) => item.act.startsWith('bands.'))).toBe(true);
    await administrator.get('/api/audit-events?cursor=;drop').expect(400);
    await administrator.get('/api/audit-events?order=act').expect(422);
  });
});
