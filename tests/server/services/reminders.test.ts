import { afterAll, beforeAll, expect, it } from 'vitest';
import { OutboxMail } from '#server/entities/correspondence.entities';
import { sendReminders } from '#server/services/windows/send-reminders';
import { aCaseInReview, aLine, expecting, step } from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let reviewer: Client;
let number: string;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
  await app.signInAs('reviewer');
  // Monday 1 March 2027; the review is due twenty working days later, on Monday 29 March
  number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie')]);
});
afterAll(() => app.close());

async function remindersAt(iso: string): Promise<[string, string][]> {
  app.db.clock.set(iso);
  // as often as one likes: the second time adds nothing
  for (let run = 0; run < 2; run++)
    await sendReminders({ ...app.db.surroundings, dataSource: app.db.worker });
  const mails = await app.db.owner.manager.find(OutboxMail, {
    where: { kind: 'reminder' },
    order: { createdAt: 'ASC' },
  });
  return mails.map((mail) => [mail.recipient, mail.subject]);
}

it('the case’s reviewer is reminded two working days before and on the day, once each', async () => {
  expect(await remindersAt('2027-03-24T08:00:00Z')).toEqual([]);
  expect(await remindersAt('2027-03-25T08:00:00Z')).toEqual([
    [reviewer.email, `${number}: due on 29 Mar 2027`],
  ]);
  expect(await remindersAt('2027-03-26T08:00:00Z')).toHaveLength(1);
  const onTheDay = await remindersAt('2027-03-29T08:00:00Z');
  expect(onTheDay).toHaveLength(2);
  expect(onTheDay[1]).toEqual([reviewer.email, `${number}: due today`]);
  expect(await remindersAt('2027-03-30T08:00:00Z')).toHaveLength(2);
  expect(await remindersAt('2027-04-03T08:00:00Z')).toHaveLength(2);
});

it('the window for answers reminds the applicant’s organisation and nobody else', async () => {
  app.db.clock.set('2027-03-01T09:00:00Z');
  const raise = { revision: 'A', title: 'Length', question: 'Is it 40 km?' };
  await expecting(201, reviewer.post(`/api/applications/${number}/discrepancies`, raise));
  await step(reviewer, number, 'return', { revision: 'A' });
  const before = await remindersAt('2027-03-01T10:00:00Z');
  // ten working days after 1 March is 15 March
  const after = await remindersAt('2027-03-15T08:00:00Z');
  const known = new Set(before.map((mail) => mail.join()));
  expect(after.filter((mail) => !known.has(mail.join()))).toEqual([
    [applicant.email, `${number}: due today`],
  ]);
  const mails = await app.db.owner.manager.findBy(OutboxMail, {
    recipient: applicant.email,
    kind: 'reminder',
  });
  expect(mails[0]?.body).toContain('The discrepancies are to be answered');
  expect(mails[0]?.orgId).toBe(applicant.actor.orgId);
});
