import { MailError, type Mailer, type MailTrouble, type OutgoingLetter } from '#server/mail/mailer.js';

/** A post that hands letters to the test, and fails as it is told to. */
export interface TestPost extends Mailer {
  sent: OutgoingLetter[];
  /** What becomes of every attempt from now on; null: it arrives. `lost` stands for a process that ends in the middle. */
  trouble: MailTrouble | 'lost' | null;
  attempts: number;
}

export function openTestPost(): TestPost {
  const post: TestPost = {
    sent: [],
    trouble: null,
    attempts: 0,
    send: async (letter) => {
      post.attempts += 1;
      // A second process has time to look in between.
      await new Promise((resolve) => setImmediate(resolve));
      if (post.trouble === 'lost') throw new Error('the process ended');
      if (post.trouble !== null) throw new MailError(post.trouble, null);
      post.sent.push(letter);
    },
  };
  return post;
}

/** The link of a letter, as a path with its hash. */
export function linkOf(letter: { text: string } | undefined): string {
  return /https?:\/\/[^/\s]+(\/\S*)/u.exec(letter?.text ?? '')?.[1] ?? '';
}
