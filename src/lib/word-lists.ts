import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { VillageWord } from '#shared/contracts/village-word.js';
import {
  wordListsEndpoints,
  type WordList,
  type WordListInput,
  type WordListName,
  type WordLists,
} from '#shared/contracts/word-lists.js';
import { callApi } from './api-client.js';
import { useCurrentCommunity } from './community.js';

/** What the village calls kinds of events, kinds of work, and crops. */
export function wordListsQuery(communityId: string) {
  return queryOptions({
    queryKey: ['words', communityId],
    queryFn: ({ signal }) => callApi(wordListsEndpoints.read, { params: { communityId }, signal }),
  });
}

/** Undefined while they are on their way: until then things have their usual names. */
export function useWordLists(): WordLists | undefined {
  const { communityId } = useCurrentCommunity();
  return useQuery(wordListsQuery(communityId)).data;
}

/** Saves one list whole. Its words stand in drafts, so these are read anew. */
export function useSaveWords(communityId: string, list: WordListName) {
  const client = useQueryClient();
  const take = (saved: WordList) => {
    client.setQueryData(
      wordListsQuery(communityId).queryKey,
      (lists) => lists && { ...lists, [list]: saved },
    );
  };
  const save = useMutation({
    mutationFn: (body: WordListInput) =>
      callApi(wordListsEndpoints.save, { params: { communityId, list }, body }),
    onSuccess: async (saved) => {
      take(saved);
      await client.invalidateQueries({ queryKey: ['calendars'] });
    },
  });
  return { save, take };
}

export interface WordOption<C extends string> {
  /** The built-in code, or the id of the village's own word. */
  value: string;
  code: C;
  /** What an entry says of it; undefined for a built-in one that keeps its usual name. */
  word: VillageWord | undefined;
  label: string;
}

interface Chosen<C extends string> {
  code: C | null;
  word: VillageWord | undefined;
}

/**
 * What can be chosen, in the village's order and words. What is hidden is offered no more, except where it is chosen.
 * @param codes all built-in ones, for while the list is on its way
 */
export function wordOptions<C extends string>(
  list: WordList | undefined,
  codes: readonly C[],
  nameOf: (code: C) => string,
  chosen: Chosen<C>,
): WordOption<C>[] {
  const value = chosenValue(chosen);
  const offered = list?.items.filter(({ key, isHidden }) => !isHidden || key === value) ?? [];
  const options = offered.flatMap(({ key, like, word }): WordOption<C>[] => {
    const code = codes.find((one) => one === like);
    if (code === undefined) return [];
    const said = word === '' ? undefined : key === like ? { word } : { id: key, word };
    return [{ value: key, code, word: said, label: word === '' ? nameOf(code) : word }];
  });
  const plain = list ? codes.filter((code) => list.items.every(({ key }) => key !== code)) : codes;
  const all = [
    ...options,
    ...plain.map((code) => ({ value: code, code, word: undefined, label: nameOf(code) })),
  ];
  const { code, word } = chosen;
  if (code === null || all.some((option) => option.value === value)) return all;
  return [...all, { value, code, word, label: word?.word ?? nameOf(code) }];
}

/** Which option stands for what an entry says. */
export function chosenValue<C extends string>({ code, word }: Chosen<C>): string {
  return word?.id ?? code ?? '';
}
