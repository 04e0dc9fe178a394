import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { Disposition } from '#server/entities/review.entities';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import {
  aCaseInReview,
  aDraft,
  aLine,
  expecting,
  findingsOf,
  PER_MILE,
  runChecks,
  saveLine,
  step,
} from '../../support/case';
import { makeTestApp, signIn, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let reviewer: Client;
let second: Client;
let number: string;

const wrong = () => aLine('Fellgate – Sarn', { x1Factor: PER_MILE });
const at = (path = '') => `/api/applications/${number}${path}`;
const refused = (client: Client, path: string, body: object, status = 409) =>
  expecting<Problem>(status, client.post(at(path), body));
const x1Of = async (letter: string) => {
  const finding = (await findingsOf(reviewer, number, letter)).find((f) => f.code === 'geometry.x1');
  if (finding === undefined) throw new Error(`revision ${letter} has no finding on X1`);
  return finding;
};

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  second = await app.signInAs('reviewer');
});
afterAll(() => app.close());
beforeEach(() => app.db.clock.set('2027-03-01T09:00:00.000Z'));

/** Days later: sessions have run out, so people sign in again. */
function later(iso: string, client: Client): Promise<Client> {
  app.db.clock.set(iso);
  return signIn(app.app, client.email, client.actor);
}

/** Raises, returns, has it answered by words, files again and checks: revision B with the same finding. */
async function explained(): Promise<void> {
  const { fingerprint } = await x1Of('A');
  const raise = { revision: 'A', fingerprints: [fingerprint], title: 'X1', question: 'Per mile?' };
  await expecting(201, reviewer.post(at('/discrepancies'), raise));
  await step(reviewer, number, 'return', { revision: 'A' });
  const answer = { by: 'explanation', text: 'It was measured.' };
  await expecting(200, applicant.post(at('/discrepancies/1/answer'), answer));
  await step(applicant, number, 'file');
  await runChecks(app.db);
}

describe('taking', () => {
  it('of twenty at once exactly one has it, the others are told so', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    await step(applicant, number, 'file');
    await runChecks(app.db);
    const reviewers = [reviewer, second];
    // a machine under load may say "come back in a moment": whoever is told so comes back
    const insist = async (client: Client): Promise<Awaited<ReturnType<Client['post']>>> => {
      const answer = await client.post(at('/take'), {});
      return answer.status === 503 ? insist(client) : answer;
    };
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, i) => insist(reviewers[i % 2] ?? reviewer)),
    );
    const statuses = answers.map((answer) => answer.status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(1);
    expect(statuses.filter((status) => status === 409)).toHaveLength(19);
    const lost = answers
      .filter((answer) => answer.status === 409)
      .map((answer) => (answer.body as Problem).type);
    expect(new Set(lost)).toEqual(new Set(['/problems/already-taken']));
    const [row] = await app.db.owner.query<{ count: number }[]>(
      `SELECT count(*)::int FROM audit_events e JOIN applications a ON a.id = e.application_id
        WHERE e.act = 'application.taken' AND a.number = $1`,
      [number],
    );
    expect(row?.count).toBe(1);
  });

  it('of five filings at once one makes the revision', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    const answers = await Promise.all(Array.from({ length: 5 }, () => applicant.post(at('/file'), {})));
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409, 409, 409]);
    const { items } = await expecting<Api.RevisionList>(200, applicant.get(at('/revisions')));
    expect(items).toHaveLength(1);
    expect(await runChecks(app.db)).toBe(1);
  });

  it('a retry with the same key gets the same answer, and another body with it is refused', async () => {
    ({ number } = await aDraft(applicant, [aLine('Sarn tie')]));
    const key = 'file-once-1';
    const file = (body: object) => applicant.post(at('/file'), body).set('Idempotency-Key', key);
    const first = await expecting<Api.Application>(200, file({}));
    const again = await expecting<Api.Application>(200, file({}));
    expect(again).toEqual(first);
    expect(again.revision).toBe('A');
    expect((await expecting<Problem>(422, file({ note: 'x' }))).type).toBe('/problems/key-reused');
  });
});

describe('windows', () => {
  it('put back opens a new take-up window and keeps the review days used', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
    const back = await step(await later('2027-03-08T09:00:00.000Z', reviewer), number, 'put-back', {
      reason: 'I am on leave.',
    });
    expect(back).toMatchObject({ state: 'filed', reviewer: null, window: { kind: 'take-up', left: 5 } });
    const taken = await step(await later('2027-03-10T09:00:00.000Z', second), number, 'take');
    expect(taken.window).toMatchObject({ kind: 'review', used: 5, total: 20, left: 15 });
    expect(taken.windows.map((w) => w.kind)).toEqual(['take-up', 'review', 'take-up', 'review']);
    expect(taken.windows[1]).toMatchObject({ used: 5, total: 20 });
  });

  it('overdue is counted and sorted first, and nothing is withdrawn by the clock', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
    const then = await later('2027-03-31T09:00:00.000Z', reviewer);
    const queue = await expecting<Api.Queue>(200, then.get('/api/queue'));
    expect(queue.counts.overdue).toBeGreaterThan(0);
    expect(queue.items[0]?.window?.left).toBeLessThan(0);
    const dues = queue.items.map((item) => item.dueAt ?? '');
    expect(dues).toEqual([...dues].sort());
    const byNumber = await expecting<Api.Queue>(
      200,
      then.get(`/api/queue?filter[number]=${number.slice(3)}`),
    );
    expect(byNumber.items.map((item) => item.number)).toContain(number);
    expect(byNumber.items.every((item) => item.number.includes(number.slice(3)))).toBe(true);
    expect((await expecting<Api.Application>(200, then.get(at()))).state).toBe('in-review');
  });

  it('handing over needs a reviewer who may have it', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
    const administrator = await app.signInAs('administrator');
    await refused(reviewer, '/hand-over', { to: administrator.actor.userId, reason: 'Please.' }, 422);
    await refused(reviewer, '/hand-over', { to: reviewer.actor.userId, reason: 'Please.' });
    await refused(second, '/hand-over', { to: second.actor.userId, reason: 'Mine.' });
    const over = await step(reviewer, number, 'hand-over', { to: second.actor.userId, reason: 'Leave.' });
    expect(over).toMatchObject({ state: 'in-review', reviewer: { id: second.actor.userId } });
    expect((await refused(reviewer, '/accept', { revision: 'A' })).detail).toContain(
      'is for the case’s reviewer',
    );
  });
});

describe('a reviewer who is gone', () => {
  it('leaves no case behind that nobody can go on with', async () => {
    const leaver = await app.signInAs('reviewer');
    number = await aCaseInReview(app, applicant, leaver, [aLine('Sarn tie')]);
    const mine = { to: second.actor.userId, reason: 'The colleague has left.' };
    await refused(second, '/hand-over', mine);
    await app.db.owner.query(`UPDATE users SET status = 'disabled' WHERE id = $1`, [leaver.actor.userId]);
    const seen = await expecting<Api.Application>(200, second.get(at()));
    const open = seen.steps.filter((s) => s.open).map((s) => s.step);
    expect(open).toEqual(['hand-over', 'put-back']);
    const over = await step(second, number, 'hand-over', mine);
    expect(over).toMatchObject({ state: 'in-review', reviewer: { id: second.actor.userId } });
    expect(await step(second, number, 'accept', { revision: 'A' })).toMatchObject({ state: 'accepted' });
  });
});

describe('findings', () => {
  it('an Explain or a Note is set aside, a Must answer is not', async () => {
    const noted = aLine('Fellgate – Sarn', { x1Factor: PER_MILE, earthGiven: false });
    number = await aCaseInReview(app, applicant, reviewer, [noted]);
    const x1 = await x1Of('A');
    const refusal = await refused(reviewer, `/findings/${x1.fingerprint}/set-aside`, {
      revision: 'A',
      reason: 'r',
    });
    expect(refusal.detail).toContain('Only a Note or an Explain');
    const note = (await findingsOf(reviewer, number, 'A')).find(
      (f) => f.grade !== 'must-answer' && f.follows === null,
    );
    const path = at(`/findings/${note?.fingerprint ?? 'none'}/set-aside`);
    const aside = await expecting<Api.Finding>(200, reviewer.post(path, { revision: 'A', reason: 'Known.' }));
    expect(aside).toMatchObject({ stands: false, disposition: { kind: 'set-aside', inForce: true } });
    expect(
      (await expecting<Problem>(409, reviewer.post(path, { revision: 'A', reason: 'Known.' }))).detail,
    ).toBe('It is set aside already.');
  });

  it('a discrepancy whose findings are all waived is waived with them', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie', { earthGiven: false })]);
    const [note] = await findingsOf(reviewer, number, 'A');
    const raise = { revision: 'A', fingerprints: [note?.fingerprint], title: 'Earth', question: 'Which?' };
    await expecting(201, reviewer.post(at('/discrepancies'), raise));
    expect((await refused(reviewer, '/accept', { revision: 'A' })).detail).toBe(
      'Accept opens once D-1 is settled.',
    );
    const path = at(`/findings/${note?.fingerprint ?? ''}/waive`);
    const waived = await expecting<Api.Finding>(
      200,
      reviewer.post(path, { revision: 'A', reason: 'It matters little.' }),
    );
    expect(waived).toMatchObject({
      stands: false,
      discrepancy: 1,
      disposition: { kind: 'waived', inForce: true },
    });
    const { items } = await expecting<Api.DiscrepancyList>(200, reviewer.get(at('/discrepancies')));
    expect(items[0]).toMatchObject({ state: 'waived', entries: [{ kind: 'raised' }, { kind: 'waived' }] });
    expect(await step(reviewer, number, 'accept', { revision: 'A' })).toMatchObject({ state: 'accepted' });
  });

  it('the waiver of a Must answer waits for a second reviewer, who is another', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    const { fingerprint } = await x1Of('A');
    const body = { revision: 'A', reason: 'The study is made with the recomputed value.' };
    await refused(second, `/findings/${fingerprint}/waive`, body);
    const proposed = await expecting<Api.Finding>(
      200,
      reviewer.post(at(`/findings/${fingerprint}/waive`), body),
    );
    expect(proposed).toMatchObject({ stands: true, disposition: { kind: 'waived', inForce: false } });
    const asSeenByApplicant = await findingsOf(applicant, number, 'A');
    expect(asSeenByApplicant.find((f) => f.fingerprint === fingerprint)?.disposition).toBeNull();
    expect((await refused(reviewer, '/accept', { revision: 'A' })).detail).toContain(
      'a second reviewer has decided',
    );
    const { items } = await expecting<Api.CountersignList>(
      200,
      second.get('/api/countersigns?outcome=pending'),
    );
    const proposal = items.find((item) => item.number === number);
    const path = `/api/countersigns/${proposal?.id ?? ''}`;
    expect((await expecting<Problem>(403, reviewer.post(path, { outcome: 'granted' }))).detail).toContain(
      'second reviewer',
    );
    const granted = await expecting<Api.Countersign>(
      200,
      second.post(path, { outcome: 'granted', remark: 'Fine.' }),
    );
    expect(granted).toMatchObject({ outcome: 'granted', decidedBy: { id: second.actor.userId } });
    await expecting<Problem>(409, second.post(path, { outcome: 'refused' }));
    expect((await x1Of('A')).disposition).toMatchObject({
      inForce: true,
      countersignedBy: { id: second.actor.userId },
    });
    expect(await step(reviewer, number, 'accept', { revision: 'A' })).toMatchObject({ state: 'accepted' });
  });

  it('a waiver that is refused leaves the finding as it was', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    const { fingerprint } = await x1Of('A');
    await expecting(200, reviewer.post(at(`/findings/${fingerprint}/waive`), { revision: 'A', reason: 'r' }));
    const { items } = await expecting<Api.CountersignList>(
      200,
      second.get('/api/countersigns?outcome=pending'),
    );
    const id = items.find((item) => item.number === number)?.id ?? '';
    await expecting(200, second.post(`/api/countersigns/${id}`, { outcome: 'refused' }));
    expect((await x1Of('A')).stands).toBe(true);
    expect((await refused(reviewer, '/accept', { revision: 'A' })).detail).toBe(
      'Accept opens once X1 of L1 is settled or waived.',
    );
  });

  it('a settlement carries over where code, circuit and figures are equal, and not where they changed', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong(), aLine('Sarn tie', { x1Factor: 1.2 })]);
    await explained();
    await expecting(200, reviewer.post(at('/discrepancies/1/settle'), { revision: 'B', text: 'Measured.' }));
    expect((await x1Of('B')).disposition).toMatchObject({
      kind: 'settled',
      revision: 'B',
      carriedOver: false,
    });
    const rest = (await findingsOf(reviewer, number, 'B')).find((f) => f.lineKey === 'L2' && f.stands);
    const raise = {
      revision: 'B',
      fingerprints: [rest?.fingerprint],
      title: 'X1 of L2',
      question: 'And here?',
    };
    await expecting(201, reviewer.post(at('/discrepancies'), raise));
    await step(reviewer, number, 'return', { revision: 'B' });
    await expecting(200, applicant.post(at('/discrepancies/2/answer'), { by: 'change', text: 'Put right.' }));
    await saveLine(applicant, number, 'L2', aLine('Sarn tie', { x1Factor: 1.15 }), 1);
    await step(applicant, number, 'file');
    await runChecks(app.db);
    const found = await findingsOf(reviewer, number, 'C');
    const carried = found.find((f) => f.lineKey === 'L1' && f.code === 'geometry.x1');
    expect(carried).toMatchObject({ stands: false, disposition: { kind: 'settled', carriedOver: true } });
    expect(found.find((f) => f.lineKey === 'L2' && f.code === 'geometry.x1')).toMatchObject({
      stands: true,
      disposition: null,
    });
    const kept = await app.db.owner.manager.countBy(Disposition, { reason: 'Measured.' });
    expect(kept).toBeGreaterThan(1);
  });

  it('reopening takes back what was settled', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    await explained();
    await expecting(200, reviewer.post(at('/discrepancies/1/settle'), { revision: 'B' }));
    expect((await x1Of('B')).stands).toBe(false);
    app.db.clock.advance(60_000);
    const again = { revision: 'B', text: 'On second thought: measured how?' };
    const reopened = await expecting<Api.Discrepancy>(
      200,
      reviewer.post(at('/discrepancies/1/reopen'), again),
    );
    expect(reopened).toMatchObject({ state: 'open', answeredBy: null });
    expect((await x1Of('B')).stands).toBe(true);
    expect((await refused(reviewer, '/discrepancies/1/reopen', again)).detail).toBe('D-1 is still open.');
    const asApplicantSees = async () =>
      (await expecting<Api.DiscrepancyList>(200, applicant.get(at('/discrepancies')))).items[0];
    expect(await asApplicantSees()).toMatchObject({ state: 'answered' });
    expect(JSON.stringify(await asApplicantSees())).not.toContain('On second thought');
    await step(reviewer, number, 'return', { revision: 'B' });
    expect(await asApplicantSees()).toMatchObject({ state: 'open' });
    expect(JSON.stringify(await asApplicantSees())).toContain('On second thought');
  });
});
