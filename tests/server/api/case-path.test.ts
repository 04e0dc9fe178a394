import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { OutboxMail } from '#server/entities/correspondence.entities';
import { AuditEvent } from '#server/entities/record.entities';
import { verifyChain } from '#server/database/audit/verify-chain';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import {
  aDraft,
  aLine,
  expecting,
  findingsOf,
  PER_MILE,
  runChecks,
  saveLine,
  step,
} from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let reviewer: Client;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
});
afterAll(() => app.close());

describe('from draft to acceptance', () => {
  let number: string;
  const at = (path = '') => `/api/applications/${number}${path}`;

  it('a draft is opened and filed as revision A, frozen with its check queued', async () => {
    const created = await aDraft(applicant, [
      aLine('Fellgate – Sarn', { x1Factor: PER_MILE }),
      aLine('Sarn tie'),
    ]);
    ({ number } = created);
    expect(number).toMatch(/^27-\d{4}$/);
    expect(created).toMatchObject({ state: 'draft', revision: null, nextRevision: 'A', window: null });
    const filed = await step(applicant, number, 'file', { note: 'As agreed on the telephone.' });
    expect(filed).toMatchObject({
      state: 'filed',
      revision: 'A',
      lineCount: 2,
      totalLengthKm: 80,
      voltagesKv: [345],
      check: { state: 'queued', lineCount: 2, linesChecked: 0 },
      window: { kind: 'take-up', used: 0, total: 5, left: 5 },
      grades: null,
    });
    const draft = await expecting<Problem>(
      409,
      applicant.put(at('/draft/lines/L1'), { version: 1, line: {} }),
    );
    expect(draft.type).toBe('/problems/conflict');
  });

  it('take waits for the check, with words', async () => {
    const early = await expecting<Problem>(409, reviewer.post(at('/take'), {}));
    expect(early).toMatchObject({
      type: '/problems/check-running',
      detail: 'Take opens once the check is done: 0 of 2 lines so far.',
    });
    expect(await runChecks(app.db)).toBe(1);
    const taken = await step(reviewer, number, 'take');
    expect(taken).toMatchObject({
      state: 'in-review',
      reviewer: { name: reviewer.actor.name },
      window: { kind: 'review', total: 20, left: 20 },
      worstGrade: 'must-answer',
    });
    expect(taken.steps.find((s) => s.step === 'accept')).toMatchObject({ open: false });
  });

  it('the finding carries its cause, and the line its balance rows', async () => {
    const x1 = (await findingsOf(reviewer, number, 'A')).find((f) => f.code === 'geometry.x1');
    expect(x1).toMatchObject({
      lineKey: 'L1',
      circuit: 1,
      grade: 'must-answer',
      stands: true,
      disposition: null,
    });
    expect(x1?.causes[0]?.code).toBe('per-mile');
    const line = await expecting<Api.RevisionLine>(200, applicant.get(at('/revisions/A/lines/L1')));
    const row = line.values.find((value) => value.parameter === 'x1');
    expect(row?.declared).toBeGreaterThan(0.6);
    expect(row?.recomputed).toBeLessThan(0.4);
    expect(row?.typical?.[1]).toBeLessThan(row?.declared ?? 0);
    expect(line.bandClassKv).toBe(345);
    expect(line.line).toMatchObject({ name: 'Fellgate – Sarn' });
    expect(JSON.stringify(line.line)).toContain('"gmrMm"');
  });

  it('a discrepancy is raised, and the applicant sees it with the letter and not before', async () => {
    const x1 = (await findingsOf(reviewer, number, 'A')).find((f) => f.code === 'geometry.x1');
    const early = await expecting<Problem>(409, reviewer.post(at('/return'), { revision: 'A' }));
    expect(early.detail).toBe('Return opens once a discrepancy is open.');
    const raised = await expecting<Api.Discrepancy>(
      201,
      reviewer.post(at('/discrepancies'), {
        revision: 'A',
        fingerprints: [x1?.fingerprint],
        title: 'X1 of Fellgate – Sarn',
        question: 'Please check whether the value is per mile.',
        wanted: 'the corrected X1 in revision B',
      }),
    );
    expect(raised).toMatchObject({
      number: 1,
      state: 'open',
      grade: 'must-answer',
      lineKeys: ['L1'],
      raisedOn: 'A',
    });
    const seen = async () =>
      (await expecting<Api.DiscrepancyList>(200, applicant.get(at('/discrepancies')))).items;
    expect(await seen()).toEqual([]);
    const returned = await step(reviewer, number, 'return', { revision: 'A' });
    expect(returned).toMatchObject({ state: 'returned', window: { kind: 'cure', total: 10, left: 10 } });
    expect((await seen()).map((d) => d.number)).toEqual([1]);
  });

  it('the letter is kept as PDF with its hash and mailed to the applicant alone', async () => {
    const { items } = await expecting<Api.LetterList>(200, applicant.get(at('/letters')));
    expect(items).toMatchObject([{ number: 1, kind: 'return', revision: 'A', discrepancies: [1] }]);
    const pdf = await applicant.get(items[0]?.href ?? '').buffer(true);
    expect(pdf.headers['content-type']).toBe('application/pdf');
    expect(pdf.headers['content-security-policy']).toContain('sandbox');
    expect(pdf.headers['x-content-type-options']).toBe('nosniff');
    expect((pdf.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    const mails = await app.db.owner.manager.findBy(OutboxMail, { orgId: applicant.actor.orgId });
    expect(mails.map((mail) => mail.kind).sort()).toEqual(['receipt', 'return']);
    expect(new Set(mails.map((mail) => mail.recipient))).toEqual(new Set([applicant.email]));
    for (const mail of mails) expect(mail.body).toContain('replaces no engineering study');
  });

  it('filing again waits for the answer and for the change', async () => {
    const early = await expecting<Problem>(409, applicant.post(at('/file'), {}));
    expect(early.detail).toBe('File opens once D-1 is answered.');
    const kept = await expecting<Api.Discrepancy>(
      200,
      applicant.post(at('/discrepancies/1/answer'), { by: 'change', text: 'We will', draft: true }),
    );
    expect(kept).toMatchObject({ state: 'open', draftAnswer: 'We will' });
    const answered = await expecting<Api.Discrepancy>(
      200,
      applicant.post(at('/discrepancies/1/answer'), {
        by: 'change',
        text: 'It was per mile.',
        version: kept.version,
      }),
    );
    expect(answered).toMatchObject({ state: 'answered', answeredBy: 'change', draftAnswer: null });
    const unchanged = await expecting<Problem>(409, applicant.post(at('/file'), {}));
    expect(unchanged.detail).toBe('File opens once the draft has the change that answers D-1.');
    await saveLine(applicant, number, 'L1', aLine('Fellgate – Sarn'), 1);
    const filed = await step(applicant, number, 'file');
    expect(filed).toMatchObject({
      state: 'in-review',
      revision: 'B',
      reviewer: { name: reviewer.actor.name },
    });
  });

  it('a decision on the older revision is refused and says what changed', async () => {
    await runChecks(app.db);
    const stale = await expecting<Problem>(409, reviewer.post(at('/accept'), { revision: 'A' }));
    expect(stale).toMatchObject({ type: '/problems/stale', currentRevision: 'B' });
    expect(stale.changed).toEqual(['Revision B was filed since.', 'From A to B: L1 changed.']);
  });

  it('the reviewer settles and accepts; the record stands', async () => {
    const early = await expecting<Problem>(409, reviewer.post(at('/accept'), { revision: 'B' }));
    expect(early.detail).toBe('Accept opens once D-1 is settled.');
    const settled = await expecting<Api.Discrepancy>(
      200,
      reviewer.post(at('/discrepancies/1/settle'), { revision: 'B', text: 'Thank you.' }),
    );
    expect(settled.entries.map((entry) => entry.kind)).toEqual(['raised', 'answered', 'settled']);
    expect(settled.entries.map((entry) => entry.party.name === 'Grid owner')).toEqual([true, false, true]);
    const conditions = ['As-built data before energising.'];
    const accepted = await step(reviewer, number, 'accept', { revision: 'B', conditions });
    expect(accepted).toMatchObject({
      state: 'accepted',
      acceptedRevision: 'B',
      decision: { kind: 'accepted', conditions, revision: 'B' },
      window: null,
    });
    const again = await expecting<Problem>(409, reviewer.post(at('/accept'), { revision: 'B' }));
    expect(again.detail).toBe('Accept is closed: the application is accepted.');
    const { items } = await expecting<Api.LetterList>(200, applicant.get(at('/letters')));
    expect(items.map((letter) => letter.kind).sort()).toEqual(['decision', 'return']);
    const decision = await app.db.owner.manager.findOneByOrFail(OutboxMail, { kind: 'decision' });
    expect(decision).toMatchObject({ recipient: applicant.email, orgId: applicant.actor.orgId });
    expect(decision.letterId).not.toBeNull();
  });

  it('everything stands in the trail, which verifies', async () => {
    const acts = (await app.db.owner.manager.find(AuditEvent, { order: { seq: 'ASC' } })).map(
      (event) => event.act,
    );
    for (const act of [
      'application.created',
      'application.filed',
      'check.done',
      'application.taken',
      'discrepancy.raised',
      'application.returned',
      'discrepancy.answered',
      'discrepancy.settled',
      'application.accepted',
    ]) {
      expect(acts).toContain(act);
    }
    expect((await verifyChain(app.db.owner)).whole).toBe(true);
    const timeline = await expecting<Api.Timeline>(200, applicant.get(at('/timeline')));
    expect(timeline.items.at(-1)?.sentence).toBe(`${reviewer.actor.name} accepted revision B.`);
  });

  it('an amendment opens a new round and leaves the accepted record as it is', async () => {
    const amended = await step(applicant, number, 'amend', { reason: 'A second conductor was chosen.' });
    expect(amended).toMatchObject({
      state: 'draft',
      acceptedRevision: 'B',
      round: { ordinal: 2, kind: 'amendment' },
    });
    const seenByOwner = await expecting<Api.Application>(200, reviewer.get(at()));
    expect(seenByOwner).toMatchObject({ state: 'accepted', round: { ordinal: 1 } });
    const withdrawn = await step(applicant, number, 'withdraw');
    expect(withdrawn).toMatchObject({ state: 'withdrawn', acceptedRevision: 'B' });
    expect(withdrawn.steps.find((s) => s.step === 'amend')?.open).toBe(true);
  });
});
