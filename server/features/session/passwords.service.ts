import { hash, verify } from '@node-rs/argon2';

/** argon2id with OWASP's first recommended setting: 19 MiB, two passes, one lane. */
const SETTINGS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** What does the slow work; a test counts how often it is asked. */
export const hasher = { hash, verify };

let decoy: Promise<string> | null = null;

export function hashPassword(password: string): Promise<string> {
  return hasher.hash(password.normalize('NFC'), SETTINGS);
}

/** Takes as long for an unknown account as for a known one, so that time tells nobody who has an account. */
export async function passwordMatches(passwordHash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this password');
  const matches = await hasher.verify(passwordHash ?? (await decoy), password.normalize('NFC'));
  return passwordHash !== null && matches;
}
