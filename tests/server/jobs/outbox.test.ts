import { SMTPServer } from 'smtp-server';
import type { AddressInfo } from 'node:net';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { queueMail } from '#server/database/outbox';
import type { MailToSend } from '#server/database/outbox';
import { OutboxMail } from '#server/entities/correspondence.entities';
import { startLocalMailServer } from '#server/integrations/local-mail-server';
import type { TakenMail } from '#server/integrations/local-mail-server';
import { makeMailer } from '#server/integrations/mail';
import type { Mailer } from '#server/integrations/mail';
import { OutboxSender } from '#server/jobs/outbox-sender';
import { makeLogger } from '#server/logging/logger';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
const closing: (() => unknown)[] = [];
beforeAll(async () => {
  db = await makeTestDatabase();
});
afterEach(async () => {
  for (const close of closing.splice(0).reverse()) await close();
  await db.owner.query('DELETE FROM outbox');
});
afterAll(() => db.close());

const mail = (n: number): MailToSend => ({
  kind: 'receipt',
  causeId: `cause-${n}`,
  orgId: null,
  recipient: `person${n}@example.org`,
  subject: `Received ${n}`,
  body: `Your filing ${n} has arrived.\n`,
});
const queue = (...mails: MailToSend[]) =>
  db.asSystem(async (tx) => {
    for (const one of mails) await queueMail(tx, one);
  });

function senderTo(url: string): OutboxSender {
  const mailer: Mailer = makeMailer(url, { name: 'Counterpoise', address: 'no-reply@127.0.0.1' });
  closing.push(() => mailer.close());
  const surroundings = { ...db.surroundings, dataSource: db.worker };
  return new OutboxSender(surroundings, mailer, makeLogger('silent'));
}

async function aMailServer(): Promise<{ url: string; taken: TakenMail[] }> {
  const taken: TakenMail[] = [];
  const server = await startLocalMailServer(async (one) => void taken.push(one));
  closing.push(() => server.close());
  return { url: server.url, taken };
}

/** A mail server that answers every recipient with the given code. */
async function aRefusingServer(code: number): Promise<string> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    onRcptTo: (_address, _session, done) => done(Object.assign(new Error('no'), { responseCode: code })),
  });
  await new Promise<void>((ready) => server.listen(0, '127.0.0.1', () => ready()));
  closing.push(() => new Promise<void>((done) => server.close(() => done())));
  return `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`;
}

const stored = () => db.owner.manager.find(OutboxMail, { order: { causeId: 'ASC' } });

describe('the outbox', () => {
  it('sends each mail once, to its one recipient, under an id of its own', async () => {
    const { url, taken } = await aMailServer();
    await queue(mail(1), mail(2));
    const sender = senderTo(url);
    expect(await sender.sendDue()).toBe(2);
    expect(await sender.sendDue()).toBe(0);
    expect(taken.map((one) => one.recipient).sort()).toEqual(['person1@example.org', 'person2@example.org']);
    const ids = (await stored()).map((row) => `<${row.id}@127.0.0.1>`).sort();
    expect(taken.map((one) => one.messageId).sort()).toEqual(ids);
    expect((await stored()).map((row) => row.status)).toEqual(['sent', 'sent']);
  });

  it('keeps a repeated step from mailing twice', async () => {
    await queue(mail(1));
    await queue(mail(1));
    expect(await stored()).toHaveLength(1);
  });

  it('forgets the mail of a transaction that fails', async () => {
    await expect(
      db.asSystem(async (tx) => {
        await queueMail(tx, mail(1));
        throw new Error('undone');
      }),
    ).rejects.toThrow('undone');
    expect(await stored()).toEqual([]);
  });

  it('loses nothing and doubles nothing while the mail server is down', async () => {
    await queue(mail(1), mail(2), mail(3));
    const down = senderTo('smtp://127.0.0.1:1');
    for (let i = 0; i < 3; i++) {
      expect(await down.sendDue()).toBe(0);
      db.clock.advance(61_000);
    }
    expect((await stored()).map(({ status, attempts }) => ({ status, attempts }))).toEqual(
      Array.from({ length: 3 }, () => ({ status: 'waiting', attempts: 3 })),
    );
    const { url, taken } = await aMailServer();
    expect(await senderTo(url).sendDue()).toBe(3);
    expect(taken).toHaveLength(3);
  });

  it('shares the work between two workers without sending twice', async () => {
    const { url, taken } = await aMailServer();
    await queue(...Array.from({ length: 8 }, (_, n) => mail(n)));
    const sent = await Promise.all([senderTo(url).sendDue(), senderTo(url).sendDue()]);
    expect(sent[0] + sent[1]).toBe(8);
    expect(new Set(taken.map((one) => one.messageId)).size).toBe(8);
    expect(taken).toHaveLength(8);
  });

  it('takes up what a worker had claimed when it died, under the same id', async () => {
    const { url, taken } = await aMailServer();
    await queue(mail(1));
    await db.owner.query(`UPDATE outbox SET status = 'sending', next_attempt_at = $1`, [
      new Date(db.clock.now().getTime() + 60_000),
    ]);
    const sender = senderTo(url);
    expect(await sender.sendDue()).toBe(0);
    db.clock.advance(60_000);
    expect(await sender.sendDue()).toBe(1);
    expect(taken[0]?.messageId).toBe(`<${(await stored())[0]?.id}@127.0.0.1>`);
  });

  it.each([
    [550, 'failed'],
    [450, 'waiting'],
  ])('after a refusal with %i a mail is %s', async (code, status) => {
    await queue(mail(1));
    await senderTo(await aRefusingServer(code)).sendDue();
    expect((await stored())[0]).toMatchObject({ status, attempts: 1 });
  });

  it('cannot be steered to a second recipient by what stands in an address', async () => {
    const { url, taken } = await aMailServer();
    const crooked = [
      'a@example.org, evil@example.org',
      'a@example.org\r\nBcc: evil@example.org',
      '<evil@example.org>',
    ];
    await queue(...crooked.map((recipient, n) => ({ ...mail(n), recipient })));
    await senderTo(url).sendDue();
    for (const { recipient } of taken) expect(recipient.split(', ')).toHaveLength(1);
    expect(taken.map((one) => one.recipient)).not.toContain('evil@example.org, a@example.org');
  });
});
