import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROUTES } from '#server/routes/route-table';
import type { Checker } from '#server/integrations/checker';
import { fillPath } from '#shared/contracts/api-paths';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import {
  aCaseInReview,
  aDraft,
  aLine,
  expecting,
  findingsOf,
  PARTICULARS,
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
let second: Client;
let number: string;

const wrong = (name = 'Fellgate – Sarn') => aLine(name, { x1Factor: PER_MILE });
const at = (path = '') => `/api/applications/${number}${path}`;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  rival = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  second = await app.signInAs('reviewer');
});
afterAll(() => app.close());

/** Stands in every text of the one company's cases; nowhere may the other company meet it. */
const CANARY = 'Zeisig';

async function upload(
  client: Client,
  path: string,
  fileName: string,
  bytes: string,
  type: string,
  fields = {},
) {
  const request = client.agent.post(at(path)).set('X-CSRF-Token', client.csrfToken);
  for (const [name, value] of Object.entries<string>(fields)) void request.field(name, value);
  const file = { filename: fileName, contentType: type };
  return expecting<{ id: string }>(201, request.attach('file', Buffer.from(bytes), file));
}

const pdf = (client: Client, fields = {}) =>
  upload(client, '/attachments', `${CANARY}.pdf`, '%PDF-1.7', 'application/pdf', fields);

/** A case that has been through everything: two revisions, letters, files, proposals, an acceptance, an amendment. */
async function aFullCase(): Promise<Record<string, string>> {
  const line = { ...wrong(`${CANARY} – Sarn`), from: CANARY };
  ({ number } = await aDraft(applicant, [line, { ...wrong(`${CANARY} tie`) }]));
  const contact = { name: CANARY, email: 'zeisig@fellgate.example', phone: null };
  const particulars = { version: 1, title: CANARY, pointOfConnection: CANARY, contact };
  await expecting(200, applicant.patch(at(), particulars));
  const imported = await upload(
    applicant,
    '/imports',
    `${CANARY}.json`,
    JSON.stringify({ format: 'filing/1', lines: [line] }),
    'application/json',
  );
  const onCase = await pdf(applicant);
  await step(applicant, number, 'file', { note: CANARY });
  await runChecks(app.db);
  await step(reviewer, number, 'take');
  const [one, other] = (await findingsOf(reviewer, number, 'A')).filter((f) => f.code === 'geometry.x1');
  const raise = { revision: 'A', fingerprints: [one?.fingerprint], title: CANARY, question: CANARY };
  await expecting(201, reviewer.post(at('/discrepancies'), raise));
  const onDiscrepancy = await pdf(reviewer, { subject: 'discrepancy', ref: '1' });
  await step(reviewer, number, 'return', { revision: 'A', message: CANARY });
  const answer = { by: 'explanation', text: CANARY };
  await expecting(200, applicant.post(at('/discrepancies/1/answer'), answer));
  await step(applicant, number, 'file');
  await runChecks(app.db);
  await expecting(200, reviewer.post(at('/discrepancies/1/settle'), { revision: 'B', text: CANARY }));
  const waiver = { revision: 'B', reason: CANARY };
  await expecting(200, reviewer.post(at(`/findings/${other?.fingerprint ?? ''}/waive`), waiver));
  const { items } = await expecting<Api.CountersignList>(200, second.get('/api/countersigns'));
  const countersign = items.find((item) => item.number === number)?.id ?? '';
  await expecting(
    200,
    second.post(`/api/countersigns/${countersign}`, { outcome: 'granted', remark: CANARY }),
  );
  const accepted = await step(reviewer, number, 'accept', { revision: 'B', conditions: [CANARY] });
  expect(accepted.state).toBe('accepted');
  await step(applicant, number, 'amend', { reason: CANARY });
  return {
    applicationId: number,
    lineKey: 'L1',
    importId: imported.id,
    attachmentId: onCase.id,
    otherAttachmentId: onDiscrepancy.id,
    countersignId: countersign,
    number: '1',
    letter: 'B',
    run: '1',
    fingerprint: one?.fingerprint ?? '',
    userId: applicant.actor.userId,
    organisationId: applicant.actor.orgId,
    invitationId: '00000000-0000-4000-8000-000000000000',
  };
}

const QUERIES: Readonly<Record<string, string>> = {
  compareRuns: '?from=1&to=1',
  compareRevisions: '?from=A&to=B',
};
const READS = ROUTES.filter((route) => route.method === 'GET' && route.kind !== 'bare');
/** Signed in or not, these show the demo's own invented mail and accounts to everybody. */
const OF_THE_DEMO = ['getMailRoom', 'listDemoAccounts'];

describe('one company’s case', () => {
  let theirs: Record<string, string>;
  let own: string;
  const urlOf = (route: (typeof READS)[number], params: Record<string, string>) =>
    fillPath(route.path, params) + (QUERIES[route.operationId] ?? '');

  beforeAll(async () => {
    theirs = await aFullCase();
    const full = number;
    ({ number: own } = await aDraft(rival, [aLine('Own line')]));
    await step(rival, own, 'file');
    await runChecks(app.db);
    number = full;
  });

  it('fills every read of it with what is looked for', async () => {
    const found = [];
    for (const route of READS.filter((r) => r.path.includes('{applicationId}'))) {
      const answer = await applicant.get(urlOf(route, theirs)).buffer(true);
      const bytes = `${answer.text ?? ''}${Buffer.isBuffer(answer.body) ? answer.body.toString('latin1') : ''}`;
      if (answer.status === 200 && `${JSON.stringify(answer.headers)}${bytes}`.includes(CANARY))
        found.push(route.operationId);
    }
    expect(found.length, found.join(' ')).toBeGreaterThan(9);
  });

  it('shows no byte of itself to another company, whatever is asked of whichever address', async () => {
    const applications = [theirs['applicationId'] ?? '', own];
    let asked = 0;
    for (const route of READS.filter(({ operationId }) => !OF_THE_DEMO.includes(operationId))) {
      for (const applicationId of route.path.includes('{applicationId}') ? applications : [own]) {
        for (const attachmentId of ['attachmentId', 'otherAttachmentId'].slice(
          0,
          route.path.includes('{attachmentId}') ? 2 : 1,
        )) {
          const params = { ...theirs, applicationId, attachmentId: theirs[attachmentId] ?? '' };
          const answer = await rival.get(urlOf(route, params)).buffer(true);
          const { instance: _asked, ...body } = answer.body as Record<string, unknown>;
          const told = `${JSON.stringify(answer.headers)}${JSON.stringify(body)}`;
          asked += 1;
          expect(told, route.operationId).not.toContain(CANARY);
          expect(told, route.operationId).not.toContain(applicant.actor.userId);
          if (route.path.includes('{applicationId}') && applicationId === theirs['applicationId']) {
            expect([403, 404], route.operationId).toContain(answer.status);
            const none = await rival.get(urlOf(route, { ...params, applicationId: '27-0000' }));
            expect(none.status, route.operationId).toBe(answer.status);
            expect(none.body).toEqual({
              ...body,
              instance: (none.body as Problem).instance,
              requestId: (none.body as Problem).requestId,
            });
          }
        }
      }
    }
    expect(asked).toBeGreaterThan(READS.length);
  });

  it('is not reached by its parts through a case of one’s own', async () => {
    const mine = (path: string) => `/api/applications/${own}${path}`;
    const parts = [
      `/attachments/${theirs['attachmentId']}`,
      `/imports/${theirs['importId']}`,
      '/revisions/B',
    ];
    for (const path of [...parts, '/letters/1']) expect((await rival.get(mine(path))).status, path).toBe(404);
    const take = await rival.post(mine(`/imports/${theirs['importId']}/take`), { take: 'all' });
    expect([404, 409]).toContain(take.status);
  });

  it('takes no word of whose it is, in which state or by whom', async () => {
    const forged = { orgId: applicant.actor.orgId, state: 'accepted', createdBy: applicant.actor.userId };
    for (const [name, value] of Object.entries(forged)) {
      const answer = await rival.post('/api/applications', { ...PARTICULARS, [name]: value });
      expect(answer.status, name).toBe(422);
    }
    const line = { version: 0, line: {}, roundId: applicant.actor.orgId };
    const { number: draft } = await aDraft(rival, []);
    expect((await rival.put(`/api/applications/${draft}/draft/lines/L1`, line)).status).toBe(422);
    await saveLine(rival, draft, 'L1', { orgId: applicant.actor.orgId, name: 'Own line' }, 0);
    expect((await rival.get(`/api/applications/${draft}`)).body).toMatchObject({
      number: draft,
      state: 'draft',
    });
  });
});

describe('what reviewers have among themselves', () => {
  const seenBy = async (client: Client) =>
    (await expecting<Api.Timeline>(200, client.get(at('/timeline')))).items.map((item) => item.sentence);

  it('a discrepancy that no letter holds stays unknown to the applicant, with all that is done with it', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    for (const title of ['Silent matter', 'Open matter']) {
      const raise = { revision: 'A', title, question: 'Why so?', lineKeys: ['L1'] };
      await expecting(201, reviewer.post(at('/discrepancies'), raise));
    }
    await expecting(200, reviewer.post(at('/discrepancies/1/remarks'), { text: 'Never mind.' }));
    const upload = reviewer.agent.post(at('/attachments')).set('X-CSRF-Token', reviewer.csrfToken);
    void upload.field('subject', 'discrepancy').field('ref', '1');
    const hung = await upload.attach('file', Buffer.from('%PDF-1.7'), {
      filename: 'silent.pdf',
      contentType: 'application/pdf',
    });
    expect(hung.status).toBe(201);
    await expecting(200, reviewer.post(at('/discrepancies/1/settle'), { revision: 'A' }));
    await step(reviewer, number, 'return', { revision: 'A' });
    const theirs = await seenBy(reviewer);
    for (const words of [/Silent matter/, /wrote on D-1/, /silent\.pdf/, /settled D-1/])
      expect(theirs.some((sentence) => words.test(sentence))).toBe(true);
    const shown = await seenBy(applicant);
    expect(shown.filter((sentence) => /[Ss]ilent|D-1/.test(sentence))).toEqual([]);
    expect(shown.some((sentence) => sentence.includes('D-2, Open matter'))).toBe(true);
    const paths = ['', '/discrepancies', '/attachments', '/letters', '/revisions/A', '/revisions/A/lines/L1'];
    for (const path of paths) {
      const { status, text } = await applicant.get(at(path));
      expect(status, path).toBe(200);
      expect(text, path).not.toMatch(/[Ss]ilent|Never mind/);
    }
  });

  it('why a case changes hands is not told to the applicant', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [wrong()]);
    await step(reviewer, number, 'hand-over', { to: second.actor.userId, reason: 'Surgery in May.' });
    await step(second, number, 'put-back', { reason: 'Too much to do.' });
    const told = (await seenBy(applicant)).join(' ');
    expect(told).toContain('handed the case over to');
    expect(told).toContain('put the case back.');
    expect(told).not.toMatch(/Surgery|Too much/);
    expect((await seenBy(reviewer)).join(' ')).toMatch(/Surgery in May.*Too much to do/);
  });
});

describe('an adopted run', () => {
  it('what was set aside as an Explain is to be answered once an adopted run makes a Must answer of it', async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie', { earthGiven: false })]);
    const [note] = await findingsOf(reviewer, number, 'A');
    const path = at(`/findings/${note?.fingerprint ?? ''}`);
    await expecting(200, reviewer.post(`${path}/set-aside`, { revision: 'A', reason: 'Known.' }));
    await expecting(202, reviewer.post(at('/revisions/A/runs'), {}));
    // the same figures, weighed by harder rules
    const hard: Checker = {
      ...app.db.surroundings.tools.checker,
      check: async (task) => {
        const report = await app.db.surroundings.tools.checker.check(task);
        return JSON.parse(
          JSON.stringify(report).replaceAll('"grade":"note"', '"grade":"must-answer"'),
        ) as never;
      },
    };
    const { tools } = app.db.surroundings;
    await runChecks(app.db, { ...tools, checker: hard });
    await expecting(200, reviewer.post(at('/revisions/A/runs/2/adopt'), { reason: 'Harder rules' }));
    const [again] = await findingsOf(reviewer, number, 'A');
    expect(again).toMatchObject({ fingerprint: note?.fingerprint, grade: 'must-answer', stands: true });
    expect((await expecting<Problem>(409, reviewer.post(at('/accept'), { revision: 'A' }))).detail).toMatch(
      /settled or waived\.$/,
    );
    const proposed = await expecting<Api.Finding>(
      200,
      reviewer.post(`${path}/waive`, { revision: 'A', reason: 'Known.' }),
    );
    expect(proposed.disposition).toMatchObject({ kind: 'waived', inForce: false });
  });
});

it('what the applicant changes of the head before filing again is no business of the owner’s people', async () => {
  number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
  const raise = { revision: 'A', title: 'Length', question: 'Is it 40 km?', lineKeys: ['L1'] };
  await expecting(201, reviewer.post(at('/discrepancies'), raise));
  const { version } = await step(reviewer, number, 'return', { revision: 'A' });
  const contact = { name: 'A. Draft', email: 'draft@fellgate.example', phone: '1' };
  const head = { title: 'Unfiled title', capacityMw: null, pointOfConnection: 'Unfiled', contact };
  await expecting(200, applicant.patch(at(), { version, ...head }));
  expect((await applicant.get(at())).body).toMatchObject(head);
  const filed = { title: PARTICULARS.title, capacityMw: 480, contact: PARTICULARS.contact };
  expect((await reviewer.get(at())).body).toMatchObject(filed);
  for (const path of ['/api/queue', '/api/applications', '/api/letters', '/api/lines']) {
    const { status, text } = await reviewer.get(path);
    expect(status, path).toBe(200);
    expect(text, path).not.toMatch(/Unfiled|A\. Draft/);
  }
  const answer = { by: 'explanation', text: 'It is.' };
  await expecting(200, applicant.post(at('/discrepancies/1/answer'), answer));
  await step(applicant, number, 'file');
  expect((await reviewer.get(at())).body).toMatchObject(head);
});
