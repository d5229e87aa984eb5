import { createTransport } from 'nodemailer';
import { z } from 'zod';
import { MailError, type Mailer, type MailTrouble, type OutgoingLetter } from './mailer.js';

const WAIT_MS = 20_000;
const SENDER_NAME = 'Dawnpeg';

const smtpFault = z.object({
  responseCode: z.number().optional(),
  code: z.string().optional(),
  syscall: z.string().optional(),
});

/** Letters over SMTP, one connection each. */
export function createSmtpMailer({ url, from }: { url: string; from: string }): Mailer {
  const transport = createTransport({
    url,
    connectionTimeout: WAIT_MS,
    greetingTimeout: WAIT_MS,
    socketTimeout: WAIT_MS,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    send: async (letter) => {
      // Asked beforehand, so that a server that is away is known to have taken nothing.
      await transport.verify().catch((error: unknown) => {
        throw new MailError('unreachable', error);
      });
      await transport.sendMail(toMessage(letter, from)).catch((error: unknown) => {
        throw new MailError(troubleOf(error), error);
      });
    },
  };
}

function toMessage({ messageId, to, subject, text, html }: OutgoingLetter, from: string) {
  return {
    messageId,
    from: { name: SENDER_NAME, address: from },
    to: { name: oneLine(to.name), address: oneLine(to.address) },
    subject: oneLine(subject),
    text,
    html,
    headers: { 'Auto-Submitted': 'auto-generated' },
  };
}

/** A line break in a name would begin a header of its own. */
function oneLine(text: string): string {
  return text.replace(/[\p{Cc}\u2028\u2029]+/gu, ' ').trim();
}

/** A server that answered has taken nothing; a connection that broke may have. */
function troubleOf(error: unknown): MailTrouble {
  const { responseCode, code, syscall } = smtpFault.safeParse(error).data ?? {};
  if (responseCode !== undefined && code !== 'EAUTH') return responseCode >= 500 ? 'refused' : 'unreachable';
  const neverBegan = syscall === 'connect' || code === 'EDNS' || code === 'EAUTH' || code === 'EENVELOPE';
  return neverBegan ? 'unreachable' : 'unsure';
}
