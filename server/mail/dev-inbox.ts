import { simpleParser } from 'mailparser';
import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';
import type { DevInbox, ReceivedLetter } from './inbox.js';

const KEPT = 200;

/** A mailbox for everybody, on this machine and in memory only. Never started in production. */
export async function startDevInbox(port: number): Promise<DevInbox> {
  const received: ReceivedLetter[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    logger: false,
    onData: (stream, session, done) => {
      simpleParser(stream).then(
        (mail) => {
          received.unshift({
            recipients: session.envelope.rcptTo.map(({ address }) => address),
            messageId: mail.messageId ?? '',
            subject: mail.subject ?? '',
            text: mail.text ?? '',
            html: typeof mail.html === 'string' ? mail.html : '',
            headerNames: [...mail.headers.keys()],
            headers: mail.headerLines.map(({ line }) => line).join('\n'),
          });
          received.splice(KEPT);
          done();
        },
        (error: unknown) => {
          done(error instanceof Error ? error : new Error('The letter could not be read', { cause: error }));
        },
      );
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      server.off('error', reject);
      // A sender that hangs up is no fault of the inbox.
      server.on('error', () => undefined);
      resolve();
    });
  });
  const { port: taken } = server.server.address() as AddressInfo;
  return {
    smtpUrl: `smtp://127.0.0.1:${taken}`,
    letters: () => received,
    close: () =>
      new Promise((resolve) => {
        server.close(() => {
          resolve();
        });
      }),
  };
}
