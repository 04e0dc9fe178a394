import type { ReceivedMail as MailAnswer } from '../../shared/contracts/api.generated';
import type { ReceivedMail } from '../entities/correspondence.entities';

export function presentMail(mail: ReceivedMail): MailAnswer {
  const { id, sender, recipient, subject, body, attachments, receivedAt } = mail;
  return {
    id,
    from: sender,
    to: recipient,
    subject,
    body,
    attachments,
    receivedAt: receivedAt.toISOString(),
  };
}
