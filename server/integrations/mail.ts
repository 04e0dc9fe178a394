import { createTransport } from 'nodemailer';

export interface Mail {
  /** Stays the same when a mail is sent again, so that a reader's program knows it. */
  messageId: string;
  recipient: string;
  subject: string;
  body: string;
  attachment?: { fileName: string; mediaType: string; bytes: Buffer };
}

/** Hands mail over to a mail server. */
export interface Mailer {
  send(mail: Mail): Promise<void>;
  close(): void;
}

/** A refusal that will not get better by trying again (SMTP 5xx). */
export function isFinalRefusal(error: unknown): boolean {
  const code = (error as { responseCode?: unknown } | null)?.responseCode;
  return typeof code === 'number' && code >= 500 && code < 600;
}

export function makeMailer(smtpUrl: string, sender: { name: string; address: string }): Mailer {
  const transport = createTransport({
    url: smtpUrl,
    pool: true,
    maxConnections: 2,
    connectionTimeout: 10_000,
    socketTimeout: 30_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    send: async ({ messageId, recipient, subject, body, attachment }) => {
      await transport.sendMail({
        messageId,
        from: sender,
        // One address as an object, never a text: a text may smuggle in a second recipient.
        to: { name: '', address: recipient },
        subject,
        text: body,
        attachments: attachment
          ? [{ filename: attachment.fileName, contentType: attachment.mediaType, content: attachment.bytes }]
          : [],
      });
    },
    close: () => transport.close(),
  };
}
