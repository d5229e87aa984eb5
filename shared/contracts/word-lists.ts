import { z } from 'zod';
import { ENTRY_KINDS } from './calendars.js';
import { id, line } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { CROP_DAYS_MAX, OPERATIONS } from './event-record.js';
import { ROLES } from './people.js';
import { WORD_MAX_LENGTH } from './village-word.js';

/** What a village has words of its own for. Kinds and work carry behaviour; a crop is a name with its length. */
export const WORD_LISTS = ['kinds', 'operations', 'crops'] as const;
export type WordListName = (typeof WORD_LISTS)[number];

/** How many words a village adds to one list. */
export const OWN_WORDS_MAX = 60;

/** Codes that are there from the beginning. "Something else" is no word to be renamed: it asks for one. */
export const BUILT_IN_WORDS: Readonly<Record<WordListName, readonly string[]>> = {
  kinds: ENTRY_KINDS,
  operations: OPERATIONS.filter((operation) => operation !== 'other'),
  crops: [],
};

/** After which code a word of the village's own can be meant; its rules are that one's for good. */
export const LIKE_CODES: Readonly<Record<WordListName, readonly string[]>> = {
  kinds: ENTRY_KINDS,
  operations: OPERATIONS,
  crops: [],
};

const cropDays = z
  .number('not-a-number')
  .int('whole-days')
  .min(0, 'days-range')
  .max(CROP_DAYS_MAX, 'days-range');

const wordFields = z.strictObject({
  /** The built-in code; the id of a word of the village's own; empty for one that is being added. */
  key: z.union([z.enum([...ENTRY_KINDS, ...OPERATIONS]), id, z.literal('')]),
  /** Which built-in code it behaves like: of a built-in one its own, of a crop none. */
  like: z.enum([...ENTRY_KINDS, ...OPERATIONS]).nullable(),
  /** Empty where a built-in one keeps its usual name. */
  word: line(WORD_MAX_LENGTH),
  /** Offered no more; entries that use it keep it. */
  isHidden: z.boolean(),
  /** Of a crop: from sowing to harvest, as far as it is known. */
  fromDays: cropDays.nullable(),
  toDays: cropDays.nullable(),
});

/** One word of a list, in the list's order. */
export const listedWord = wordFields;
export type ListedWord = z.infer<typeof listedWord>;

export const wordList = z.strictObject({
  /** 0 while nobody has changed anything. */
  version: z.number().int().min(0),
  items: z.array(listedWord),
});
export type WordList = z.infer<typeof wordList>;

export const wordLists = z.strictObject({ kinds: wordList, operations: wordList, crops: wordList });
export type WordLists = z.infer<typeof wordLists>;

export const wordListInput = z
  .strictObject({
    version: z.number().int().min(0),
    items: z.array(wordFields).max(OPERATIONS.length + OWN_WORDS_MAX, 'too-many-words'),
  })
  .superRefine(({ items }, context) => {
    const taken = new Set<string>();
    items.forEach(({ word, fromDays, toDays }, index) => {
      const plain = plainWord(word);
      if (plain !== '' && taken.has(plain)) refuse(context, index, 'word', 'word-taken');
      taken.add(plain);
      if (fromDays !== null && toDays !== null && toDays < fromDays) {
        refuse(context, index, 'toDays', 'days-order');
      }
    });
  });
export type WordListInput = z.infer<typeof wordListInput>;

/** Words that differ in nothing that people would hear are the same. */
export function plainWord(word: string): string {
  return word.normalize('NFC').trim().toLowerCase();
}

function refuse(context: z.RefinementCtx, index: number, field: string, message: string): void {
  context.addIssue({ code: 'custom', path: ['items', index, field], message });
}

const communityParams = z.strictObject({ communityId: id });

export const wordListsEndpoints = {
  read: defineEndpoint({
    id: 'readWordLists',
    method: 'GET',
    path: '/api/communities/:communityId/words',
    summary: 'What the village calls kinds of events, kinds of work, and crops',
    access: member('community', ...ROLES),
    params: communityParams,
    response: wordLists,
  }),
  save: defineEndpoint({
    id: 'saveWordList',
    method: 'PUT',
    path: '/api/communities/:communityId/words/:list',
    summary:
      'Rename, add, hide and order the words of one list; drafts follow, versions keep theirs; 409 with both states when stale',
    access: member('community', 'officer'),
    params: z.strictObject({ communityId: id, list: z.enum(WORD_LISTS) }),
    body: wordListInput,
    response: wordList,
  }),
} as const;
