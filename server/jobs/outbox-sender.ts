import { system } from '../database/actor';
import { inTransaction } from '../database/transaction';
import type { Transaction } from '../database/transaction';
import { Letter, OutboxMail } from '../entities/correspondence.entities';
import { isFinalRefusal } from '../integrations/mail';
import type { Mail, Mailer } from '../integrations/mail';
import type { Surroundings } from '../integrations/surroundings';
import type { Logger } from '../logging/logger';

const BATCH = 10;
/** For how long a claimed mail is left to the worker that claimed it; after a crash another one takes it up. */
const LEASE_MS = 60_000;
const LONGEST_WAIT_MS = 60_000;
const MOST_ATTEMPTS = 500;

/** Claims what is due; two workers at once claim different mails. */
async function claim({ manager, now }: Transaction): Promise<OutboxMail[]> {
  const due = await manager
    .createQueryBuilder(OutboxMail, 'mail')
    .where(`mail.status IN ('waiting', 'sending') AND mail.nextAttemptAt <= :now`, { now })
    .orderBy('mail.nextAttemptAt')
    .limit(BATCH)
    .setLock('pessimistic_write')
    .setOnLocked('skip_locked')
    .getMany();
  for (const mail of due) {
    mail.attempts += 1;
    const nextAttemptAt = new Date(now.getTime() + LEASE_MS);
    await manager.update(
      OutboxMail,
      { id: mail.id },
      { status: 'sending', attempts: mail.attempts, nextAttemptAt },
    );
  }
  return due;
}

async function attachmentOf({ manager }: Transaction, letterId: string | null): Promise<Mail['attachment']> {
  if (letterId === null) return undefined;
  const letter = await manager
    .createQueryBuilder(Letter, 'letter')
    .addSelect('letter.bytes')
    .where('letter.id = :letterId', { letterId })
    .getOneOrFail();
  const ending = letter.mediaType === 'application/pdf' ? 'pdf' : 'txt';
  return { fileName: `letter-${letter.number}.${ending}`, mediaType: letter.mediaType, bytes: letter.bytes };
}

export class OutboxSender {
  private readonly sender = system('outbox');

  constructor(
    private readonly surroundings: Surroundings,
    private readonly mailer: Mailer,
    private readonly log: Logger,
  ) {}

  /** Sends what is due; answers how many went out. A mail server that is down leaves everything waiting. */
  async sendDue(): Promise<number> {
    const claimed = await this.transact(claim);
    let sent = 0;
    for (const mail of claimed) if (await this.sendOne(mail)) sent += 1;
    return sent;
  }

  private transact<T>(work: (tx: Transaction) => Promise<T>): Promise<T> {
    return inTransaction(this.surroundings, this.sender, work);
  }

  private async sendOne(mail: OutboxMail): Promise<boolean> {
    const { id, recipient, subject, body, letterId } = mail;
    const domain = this.surroundings.tools.publicUrl.hostname;
    try {
      const attachment = await this.transact((tx) => attachmentOf(tx, letterId));
      await this.mailer.send({ messageId: `<${id}@${domain}>`, recipient, subject, body, attachment });
    } catch (error) {
      await this.transact((tx) => this.putBack(tx, mail, error));
      return false;
    }
    await this.transact(({ manager, now }) =>
      manager.update(OutboxMail, { id }, { status: 'sent', sentAt: now, lastError: null }),
    );
    return true;
  }

  private async putBack({ manager, now }: Transaction, mail: OutboxMail, error: unknown): Promise<void> {
    const final = isFinalRefusal(error) || mail.attempts >= MOST_ATTEMPTS;
    const wait = Math.min(LONGEST_WAIT_MS, 1000 * 2 ** Math.min(mail.attempts, 6));
    const lastError = error instanceof Error ? error.message.slice(0, 500) : 'unknown';
    this.log.warn(
      { event: 'mail-not-sent', outboxId: mail.id, attempts: mail.attempts, final },
      'mail not sent',
    );
    await manager.update(
      OutboxMail,
      { id: mail.id },
      { status: final ? 'failed' : 'waiting', nextAttemptAt: new Date(now.getTime() + wait), lastError },
    );
  }
}
