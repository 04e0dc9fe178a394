import type { AddressInfo } from 'node:net';
import { simpleParser } from 'mailparser';
import type { AddressObject } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export interface TakenMail {
  messageId: string;
  sender: string;
  recipient: string;
  subject: string;
  body: string;
  attachments: { name: string; byteLength: number }[];
}

export interface LocalMailServer {
  url: string;
  close(): Promise<void>;
}

const textOf = (address: AddressObject | AddressObject[] | undefined): string =>
  (Array.isArray(address) ? address : address ? [address] : []).map((item) => item.text).join(', ');

const MAX_BYTES = 30 * 1024 * 1024;

/** A mail server on loopback that delivers nowhere and hands every mail to `keep`. */
export async function startLocalMailServer(
  keep: (mail: TakenMail) => Promise<void>,
): Promise<LocalMailServer> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: MAX_BYTES,
    closeTimeout: 1000,
    onData: (stream, session, done) => {
      simpleParser(stream)
        .then((mail) =>
          keep({
            messageId: mail.messageId ?? '',
            sender: textOf(mail.from),
            recipient: session.envelope.rcptTo.map((address) => address.address).join(', '),
            subject: mail.subject ?? '',
            body: mail.text ?? '',
            attachments: mail.attachments.map((item) => ({
              name: item.filename ?? 'attachment',
              byteLength: item.size,
            })),
          }),
        )
        .then(
          () => done(),
          (error: Error) => done(error),
        );
    },
  });
  server.on('error', () => undefined);
  await new Promise<void>((ready, fail) => {
    server.server.once('error', fail);
    server.listen(0, '127.0.0.1', () => ready());
  });
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    close: () => new Promise((done) => server.close(() => done())),
  };
}
