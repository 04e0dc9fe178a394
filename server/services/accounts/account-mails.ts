import { MAIL_PAGES } from '../../../shared/contracts/mail-pages';
import { queueMail } from '../../database/outbox';
import type { Transaction } from '../../database/transaction';
import { TOKEN_MINUTES } from './tokens';

/** Tokens stand behind the #, which browsers do not send: no server log ever holds one. */
const link = ({ tools }: Transaction, page: string, token: string) =>
  new URL(`${page}#${token}`, tools.publicUrl).href;

interface Recipient {
  id: string;
  email: string;
  name: string;
}

/** The cause is the token's hash: each new token is a mail of its own, the same one never two. */
export async function mailInvitation(
  tx: Transaction,
  to: Recipient,
  organisation: string,
  made: { token: string; tokenHash: string },
) {
  await queueMail(tx, {
    kind: 'invitation',
    causeId: made.tokenHash,
    orgId: null,
    recipient: to.email,
    subject: `Your account for ${organisation}`,
    body: [
      `${to.name},`,
      `you are invited to work on applications to connect for ${organisation}. Choose a password here:`,
      link(tx, MAIL_PAGES.invitation, made.token),
      `The link works once and for ${TOKEN_MINUTES} minutes. If it has run out, ask for a new one.`,
    ].join('\n\n'),
  });
}

export async function mailReset(tx: Transaction, to: Recipient, made: { token: string; tokenHash: string }) {
  await queueMail(tx, {
    kind: 'password-reset',
    causeId: made.tokenHash,
    orgId: null,
    recipient: to.email,
    subject: 'A new password',
    body: [
      `${to.name},`,
      'somebody asked for a new password for your account. If it was you, choose one here:',
      link(tx, MAIL_PAGES.passwordReset, made.token),
      `The link works once and for ${TOKEN_MINUTES} minutes. If it was not you, nothing has changed; you need do nothing.`,
    ].join('\n\n'),
  });
}

export async function mailRefusal(tx: Transaction, to: Recipient, reason: string) {
  await queueMail(tx, {
    kind: 'account-refused',
    causeId: to.id,
    orgId: null,
    recipient: to.email,
    subject: 'Your request for an account',
    body: [`${to.name},`, 'the account that you asked for was not granted.', reason].join('\n\n'),
  });
}
