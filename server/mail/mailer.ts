/** One letter, ready to go. */
export interface OutgoingLetter {
  /** The same at every attempt, so that a receiver can tell a second copy. */
  messageId: string;
  to: { name: string; address: string };
  subject: string;
  text: string;
  html: string;
}

/** What became of an attempt: `unreachable` means surely not sent; `unsure` means perhaps. */
export type MailTrouble = 'unreachable' | 'refused' | 'unsure';

export class MailError extends Error {
  override readonly name = 'MailError';
  constructor(
    readonly trouble: MailTrouble,
    cause: unknown,
  ) {
    super(`A letter did not go: ${trouble}`, { cause });
  }
}

/** Where letters leave the house. Throws a MailError and nothing else. */
export interface Mailer {
  send(letter: OutgoingLetter): Promise<void>;
}
