import { SHARED_ITEM_TYPES } from '#shared/contracts/sharing.js';
import { appendFile, mkdir, open, readFile } from 'node:fs/promises';
import path from 'node:path';
import { z } from 'zod';

/** What of a thing was taken back. */
const WITHDRAWN_PARTS = ['all', 'sound'] as const;
export type WithdrawnPart = (typeof WITHDRAWN_PARTS)[number];

const listed = z.strictObject({
  itemType: z.enum(SHARED_ITEM_TYPES),
  itemId: z.uuid(),
  communityId: z.uuid(),
  leavesTrace: z.boolean(),
  /** Lines from before there was a choice have none. */
  part: z.enum(WITHDRAWN_PARTS).default('all'),
  at: z.iso.datetime(),
});
export type ListedWithdrawal = z.infer<typeof listed>;

/**
 * What was taken back, kept beside the database: whoever restores an older copy of the tables brings withdrawn things
 * with it, and the list takes them out again at the next start. It holds ids and times, nothing else.
 */
export interface WithdrawalList {
  add(withdrawal: ListedWithdrawal): Promise<void>;
  all(): Promise<ListedWithdrawal[]>;
}

/** One line of JSON for each, only ever added to, on the disk before the answer goes out. */
export class WithdrawalFile implements WithdrawalList {
  constructor(private readonly file: string) {}

  async add(withdrawal: ListedWithdrawal): Promise<void> {
    await mkdir(path.dirname(this.file), { recursive: true });
    await appendFile(this.file, `${JSON.stringify(listed.parse(withdrawal))}\n`, { mode: 0o600 });
    const handle = await open(this.file, 'r');
    await handle.sync();
    await handle.close();
  }

  /** A line that was cut off by a broken end is passed over; its withdrawal is in the tables or was never answered. */
  async all(): Promise<ListedWithdrawal[]> {
    const text = await readFile(this.file, 'utf8').catch(() => '');
    return text.split('\n').flatMap((line) => {
      const parsed = listed.safeParse(parseJson(line));
      return parsed.success ? [parsed.data] : [];
    });
  }
}

function parseJson(line: string): unknown {
  try {
    return JSON.parse(line) as unknown;
  } catch {
    return null;
  }
}
