import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
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
let reviewer: Client;
let second: Client;
let number: string;

const wrong = () => aLine('Fellgate – Sarn', { x1Factor: PER_MILE });
const at = (path = '') => `/api/applications/${number}${path}`;
const refused = (client: Client, path: string, body: object, status = 409) =>
  expecting<Problem>(status, client.post(at(path), body));

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  second = await app.signInAs('reviewer');
});
afterAll(() => app.close());
beforeEach(() => app.db.clock.set('2027-03-01T09:00:00.000Z'));

describe('decisions', () => {
  it('declining is proposed by one and countersigned by another', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    const body = { revision: 'A', reason: 'No line data will be had this year.' };
    const proposed = await step(reviewer, number, 'decline', body, 202);
    expect(proposed).toMatchObject({ state: 'in-review', pendingCountersigns: [{ subject: 'decline' }] });
    const id = proposed.pendingCountersigns[0]?.id ?? '';
    await expecting<Problem>(403, reviewer.post(`/api/countersigns/${id}`, { outcome: 'granted' }));
    await expecting(200, second.post(`/api/countersigns/${id}`, { outcome: 'granted' }));
    const declined = await expecting<Api.Application>(200, applicant.get(at()));
    expect(declined).toMatchObject({
      state: 'declined',
      decision: { kind: 'declined', reason: body.reason, countersignedBy: { id: second.actor.userId } },
      acceptedRevision: null,
    });
    expect(declined.pendingCountersigns).toEqual([]);
    expect((await refused(applicant, '/withdraw', {})).detail).toBe(
      'Withdraw is closed: the application is declined.',
    );
  });

  it('a proposal lapses when the applicant withdraws', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    await step(reviewer, number, 'decline', { revision: 'A', reason: 'No.' }, 202);
    await step(applicant, number, 'withdraw', { reason: 'We think again.' });
    const { items } = await expecting<Api.CountersignList>(
      200,
      second.get('/api/countersigns?outcome=lapsed'),
    );
    const lapsed = items.find((item) => item.number === number);
    await expecting<Problem>(
      409,
      second.post(`/api/countersigns/${lapsed?.id ?? ''}`, { outcome: 'granted' }),
    );
    expect((await expecting<Api.Application>(200, reviewer.get(at()))).state).toBe('withdrawn');
  });

  it('a version that was overtaken is refused and says what holds now', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    const before = await expecting<Api.Application>(200, applicant.get(at()));
    await expecting(200, applicant.patch(at(), { version: before.version, title: 'Fellgate Wind II' }));
    const stale = await refused(applicant, '/file', { version: before.version });
    expect(stale).toMatchObject({
      type: '/problems/stale',
      currentVersion: before.version + 1,
      changed: ['It is Draft now.'],
    });
  });

  it('of two who decide at once one is told that it is done', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
    const answers = await Promise.all([
      reviewer.post(at('/accept'), { revision: 'A' }),
      applicant.post(at('/withdraw'), {}),
      reviewer.post(at('/accept'), { revision: 'A' }),
    ]);
    expect(answers.filter((answer) => answer.status === 200)).toHaveLength(1);
    expect(answers.filter((answer) => answer.status === 409)).toHaveLength(2);
  });
});

describe('check runs', () => {
  it('checking again adds a run that governs only once it is adopted', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    const run = await expecting<Api.Run>(202, reviewer.post(at('/revisions/A/runs'), {}));
    expect(run).toMatchObject({ ordinal: 2, governing: false, reason: 'again', state: 'queued' });
    const busy = await refused(reviewer, '/revisions/A/runs', {});
    expect(busy.detail).toBe('A check of this revision is under way already.');
    await refused(reviewer, '/revisions/A/runs/2/adopt', { reason: 'New bands' });
    await runChecks(app.db);
    const compared = await expecting<Api.RunComparison>(
      200,
      applicant.get(at('/revisions/A/run-comparison?from=1&to=2')),
    );
    expect(compared).toMatchObject({
      appeared: [],
      gone: [],
      from: { governing: true },
      to: { governing: false },
    });
    expect(compared.kept).toBeGreaterThan(0);
    await expecting(200, reviewer.post(at('/revisions/A/runs/2/adopt'), { reason: 'New bands' }));
    const { items } = await expecting<Api.RunList>(200, applicant.get(at('/revisions/A/runs')));
    expect(items.map((item) => [item.ordinal, item.governing])).toEqual([
      [2, true],
      [1, false],
    ]);
  });

  it('two revisions are compared field by field', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    const raise = { revision: 'A', title: 'Length', question: 'Is it 40 km?', lineKeys: ['L1'] };
    await expecting(201, reviewer.post(at('/discrepancies'), raise));
    await step(reviewer, number, 'return', { revision: 'A' });
    await expecting(200, applicant.post(at('/discrepancies/1/answer'), { by: 'change', text: '41 km.' }));
    await saveLine(applicant, number, 'L1', { ...wrong(), from: 'Fellgate' }, 1);
    await step(applicant, number, 'file');
    const path = at('/revision-comparison?from=A&to=B');
    const { lines } = await expecting<Api.RevisionComparison>(200, reviewer.get(path));
    expect(lines).toMatchObject([
      {
        lineKey: 'L1',
        change: 'changed',
        changes: [{ pointer: '/from', before: 'Harrow Fell', after: 'Fellgate' }],
      },
    ]);
    const { items } = await expecting<Api.RevisionList>(200, applicant.get(at('/revisions')));
    expect(items.map((item) => [item.letter, item.change, item.current])).toEqual([
      ['B', 'L1 changed', true],
      ['A', 'first filing, one line', false],
    ]);
  });
});
