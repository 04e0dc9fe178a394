import { OutboxMail } from '../entities/correspondence.entities';
import type { Transaction } from './transaction';

export interface MailToSend {
  kind: string;
  /** What it is about: with kind and recipient it makes the mail unique, so that a repeated step mails once. */
  causeId: string;
  /** The case's organisation, or none for mail to the owner's people. */
  orgId: string | null;
  recipient: string;
  subject: string;
  body: string;
  letterId?: string | null;
}

/** Puts a mail into the outbox of this transaction; the worker sends it after the commit. */
export async function queueMail(tx: Transaction, mail: MailToSend): Promise<void> {
  await tx.manager
    .createQueryBuilder()
    .insert()
    .into(OutboxMail)
    .values({ ...mail, letterId: mail.letterId ?? null, nextAttemptAt: tx.now, createdAt: tx.now })
    .orIgnore()
    .updateEntity(false)
    .execute();
}
