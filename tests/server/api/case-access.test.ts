import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { randomUUID } from 'node:crypto';
import { ROUTES } from '#server/routes/route-table';
import { CASE_OPERATIONS, fillPath } from '#shared/contracts/api-paths';
import { ReviewerBar } from '#server/entities/people.entities';
import type * as Api from '#shared/contracts/api.generated';
import { aCaseInReview, aDraft, aLine, expecting, findingsOf, PER_MILE } from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let rival: Client;
let reviewer: Client;
let administrator: Client;
let number: string;
let draft: string;
let params: Record<string, string>;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  rival = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  administrator = await app.signInAs('administrator');
  number = await aCaseInReview(app, applicant, reviewer, [aLine('Fellgate – Sarn', { x1Factor: PER_MILE })]);
  ({ number: draft } = await aDraft(applicant, [aLine('Sarn tie')]));
  const [finding] = await findingsOf(reviewer, number, 'A');
  params = {
    applicationId: number,
    lineKey: 'L1',
    importId: randomUUID(),
    number: '1',
    fingerprint: finding?.fingerprint ?? '',
    letter: 'A',
    run: '1',
    attachmentId: randomUUID(),
    countersignId: randomUUID(),
  };
});
afterAll(() => app.close());

type Id = keyof typeof CASE_OPERATIONS;
const OPERATIONS = Object.keys(CASE_OPERATIONS).filter((id) => id !== 'listDemoAccounts') as Id[];

/** A body that each schema takes, so that what answers is the rule and not the schema. */
const BODIES: Partial<Record<Id, object>> = {
  updateApplication: { version: 1, title: 'Another' },
  saveDraftLine: { version: 1, line: {} },
  takeImport: { take: 'all' },
  handOverApplication: { to: randomUUID(), reason: 'Leave' },
  putBackApplication: { reason: 'Leave' },
  returnApplication: { revision: 'A' },
  acceptApplication: { revision: 'A' },
  declineApplication: { revision: 'A', reason: 'No' },
  amendApplication: { reason: 'More' },
  raiseDiscrepancy: { revision: 'A', title: 'X1', question: 'Why?' },
  answerDiscrepancy: { by: 'explanation', text: 'So.' },
  settleDiscrepancy: { revision: 'A' },
  reopenDiscrepancy: { revision: 'A', text: 'Again' },
  remarkOnDiscrepancy: { text: 'A word' },
  waiveFinding: { revision: 'A', reason: 'No matter' },
  setAsideFinding: { revision: 'A', reason: 'No matter' },
  adoptRun: { reason: 'New bands' },
  decideCountersign: { outcome: 'granted' },
  createApplication: {
    title: 'T',
    connectionKind: 'load',
    pointOfConnection: 'S',
    contact: { name: 'N', email: 'n@example.org', phone: null },
  },
};
const QUERIES: Partial<Record<Id, string>> = {
  compareRuns: '?from=1&to=1',
  compareRevisions: '?from=A&to=A',
};
const UPLOADS: readonly Id[] = ['importFile', 'uploadAttachment'];

function ask(client: Client | null, id: Id, changes: Record<string, string> = {}) {
  const { method, path } = CASE_OPERATIONS[id];
  const url = `${fillPath(path, { ...params, ...changes })}${QUERIES[id] ?? ''}`;
  const agent = client?.agent ?? app.visitor();
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  const request = agent[verb](url).set('X-CSRF-Token', client?.csrfToken ?? '');
  if (UPLOADS.includes(id))
    return request.attach('file', Buffer.from('%PDF-1.7'), {
      filename: 'a.pdf',
      contentType: 'application/pdf',
    });
  return method === 'GET' || method === 'DELETE' ? request : request.send(BODIES[id] ?? {});
}

const ofOneCase = OPERATIONS.filter((id) => CASE_OPERATIONS[id].path.includes('{applicationId}'));

describe('nobody signed in', () => {
  it.each(OPERATIONS)('%s: 401', async (id) => {
    expect((await ask(null, id)).status).toBe(401);
  });
});

describe('another organisation’s case is not found, as one that does not exist', () => {
  it.each(ofOneCase)('%s', async (id) => {
    const theirs = await ask(rival, id);
    const unknown = await ask(rival, id, { applicationId: randomUUID() });
    expect([403, 404]).toContain(theirs.status);
    expect(theirs.status).toBe(unknown.status);
    expect({ ...(theirs.body as object), instance: '', requestId: '' }).toEqual({
      ...(unknown.body as object),
      instance: '',
      requestId: '',
    });
    expect(theirs.text).not.toContain('Fellgate');
  });

  it('a draft of anybody is not found for the owner’s people', async () => {
    for (const client of [reviewer, administrator]) {
      for (const id of ['getApplication', 'getTimeline', 'listRevisions', 'listAttachments'] as const) {
        expect((await ask(client, id, { applicationId: draft })).status).toBe(404);
      }
    }
  });

  it('lists hold the own alone', async () => {
    for (const id of ['listApplications', 'listLines', 'listLetters'] as const) {
      const mine = (await expecting<{ total: number }>(200, ask(applicant, id))).total;
      const theirs = (await expecting<{ total: number }>(200, ask(rival, id))).total;
      expect(theirs).toBe(0);
      expect(mine).toBe({ listApplications: 2, listLines: 1, listLetters: 0 }[id]);
    }
    const ownersList = await expecting<Api.ApplicationList>(200, ask(reviewer, 'listApplications'));
    expect(ownersList.items.map((item) => item.number)).toEqual([number]);
  });

  it('a reviewer who is barred from the applicant finds nothing of it', async () => {
    const barred = await app.signInAs('reviewer');
    await app.db.owner.manager.insert(ReviewerBar, {
      userId: barred.actor.userId,
      orgId: applicant.actor.orgId,
      reason: 'Worked there until last year.',
    });
    for (const id of ofOneCase.filter((o) => CASE_OPERATIONS[o].method === 'GET')) {
      expect([403, 404]).toContain((await ask(barred, id)).status);
    }
    expect((await expecting<Api.Queue>(200, ask(barred, 'listQueue'))).counts.everyone).toBe(0);
    expect((await ask(barred, 'takeApplication')).status).toBe(404);
    const who = await expecting<Api.ReviewerList>(200, ask(reviewer, 'listReviewers'));
    expect(who.items.map((item) => item.id)).not.toContain(barred.actor.userId);
  });
});

describe('what a role does not do is forbidden', () => {
  const forReviewers: Id[] = [
    'listQueue',
    'takeApplication',
    'handOverApplication',
    'putBackApplication',
    'returnApplication',
    'acceptApplication',
    'declineApplication',
    'raiseDiscrepancy',
    'settleDiscrepancy',
    'reopenDiscrepancy',
    'waiveFinding',
    'setAsideFinding',
    'checkAgain',
    'adoptRun',
    'listCountersigns',
    'decideCountersign',
    'listReviewers',
  ];
  const forApplicants: Id[] = [
    'createApplication',
    'updateApplication',
    'getDraft',
    'getDraftLine',
    'saveDraftLine',
    'deleteDraftLine',
    'importFile',
    'getImport',
    'takeImport',
    'fileApplication',
    'withdrawApplication',
    'amendApplication',
    'answerDiscrepancy',
  ];
  it.each(forReviewers)('%s is neither an applicant’s nor an administrator’s', async (id) => {
    expect((await ask(applicant, id)).status).toBe(403);
    expect((await ask(administrator, id)).status).toBe(403);
  });
  it.each(forApplicants)('%s is neither a reviewer’s nor an administrator’s', async (id) => {
    expect((await ask(reviewer, id)).status).toBe(403);
    expect((await ask(administrator, id)).status).toBe(403);
  });
  it('an administrator attaches nothing', async () => {
    expect((await ask(administrator, 'uploadAttachment')).status).toBe(403);
  });
});

describe('bad bodies', () => {
  const withBody = OPERATIONS.filter(
    (id) => CASE_OPERATIONS[id].method !== 'GET' && CASE_OPERATIONS[id].method !== 'DELETE',
  ).filter((id) => !UPLOADS.includes(id));
  it.each(withBody)('%s refuses what its schema does not name, with a pointer', async (id) => {
    const client = ask(applicant, id);
    void client.send({ ...(BODIES[id] ?? {}), surprise: 1 });
    const forMe = await client;
    const used =
      forMe.status === 403 ? await ask(reviewer, id).send({ ...(BODIES[id] ?? {}), surprise: 1 }) : forMe;
    expect(used.status).toBe(422);
    expect(JSON.stringify((used.body as { errors: unknown }).errors)).toContain('surprise');
  });

  it('a version is asked for where somebody else may have written', async () => {
    const answer = await applicant.put(`/api/applications/${draft}/draft/lines/L1`, { line: {} });
    expect(answer.status).toBe(428);
    const header = await applicant
      .put(`/api/applications/${draft}/draft/lines/L1`, { line: {} })
      .set('If-Match', '"99"');
    expect(header.status).toBe(409);
  });

  it('a cursor of another list’s making is refused in words', async () => {
    const answer = await applicant.get('/api/applications?cursor=zzz');
    expect(answer.status).toBe(400);
  });
});

describe('the demo’s accounts', () => {
  it('are shown in the demo and do not exist without it', async () => {
    expect((await app.visitor().get('/api/demo/accounts')).status).toBe(200);
    const real = await makeTestApp({ demo: false });
    expect((await real.visitor().get('/api/demo/accounts')).status).toBe(404);
    await real.close();
  });
});

it('every operation of the case is in the route table', () => {
  const routed = new Set<string>(ROUTES.map((route) => route.operationId));
  expect(Object.keys(CASE_OPERATIONS).filter((id) => !routed.has(id))).toEqual([]);
});
