import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type * as Api from '#shared/contracts/api.generated';
import { aCaseInReview, aDraft, aLine, expecting, PER_MILE, runChecks, step } from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let reviewer: Client;
let number: string;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  const slipped = () => [aLine('Sarn tie', { x1Factor: PER_MILE })];
  for (const title of ['X1', 'X1 too']) {
    const returned = await aCaseInReview(app, applicant, reviewer, slipped());
    const raise = { revision: 'A', title, question: 'Per mile?' };
    await expecting(201, reviewer.post(`/api/applications/${returned}/discrepancies`, raise));
    await step(reviewer, returned, 'return', { revision: 'A' });
  }
  await aCaseInReview(app, applicant, reviewer, slipped());
  const filed = await aDraft(applicant, slipped());
  await step(applicant, filed.number, 'file');
  await runChecks(app.db);
  await aDraft(applicant, [aLine('Sarn tie')]);
  ({ number } = await aDraft(applicant, []));
});
afterAll(() => app.close());
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
