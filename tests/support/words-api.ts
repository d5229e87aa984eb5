import type { ListedWord, WordList, WordListName, WordLists } from '#shared/contracts/word-lists.js';
import type { Client } from '#tests/support/api.js';

export const wordsPath = ({ communityId }: Client) => `/api/communities/${communityId}/words`;

export async function wordsOf(client: Client): Promise<WordLists> {
  return (await client.get(wordsPath(client)).expect(200)).body as WordLists;
}

export const newWord = (changes: Partial<ListedWord> = {}): ListedWord => ({
  ...{ key: '', like: 'farm', word: 'Work of the terraces', isHidden: false, fromDays: null, toDays: null },
  ...changes,
});

/** Saves what a change makes of a list; the answer is still to be looked at. */
export async function changeWords(
  officer: Client,
  list: WordListName,
  change: (items: ListedWord[]) => ListedWord[],
) {
  const { version, items } = (await wordsOf(officer))[list];
  return officer.put(`${wordsPath(officer)}/${list}`, { version, items: change(items) });
}

/** A word of the village's own. */
export async function addWord(
  officer: Client,
  list: WordListName,
  changes: Partial<ListedWord> = {},
): Promise<ListedWord> {
  const answer = await changeWords(officer, list, (items) => [...items, newWord(changes)]);
  const added = (answer.body as WordList).items.at(-1);
  if (answer.status !== 200 || added === undefined) throw new Error(JSON.stringify(answer.body));
  return added;
}

export const renaming = (key: string, word: string) => (items: ListedWord[]) =>
  items.map((item) => (item.key === key ? { ...item, word } : item));
