import type { WordList, WordListName } from '#shared/contracts/word-lists.js';

/** One of the village's lists, as it is stored, and whether the person may change it. */
export interface OneListProps {
  communityId: string;
  list: WordListName;
  stored: WordList;
  mayWrite: boolean;
}
