import { createContext, useContext, type ReactNode } from 'react';

const Titles = createContext<ReadonlyMap<string, string>>(new Map());

/** Around a page that shows several entries: what is counted from another one can name it. */
export function EntryTitles({
  titles,
  children,
}: {
  titles: ReadonlyMap<string, string>;
  children: ReactNode;
}) {
  return <Titles value={titles}>{children}</Titles>;
}

export function useEntryTitles(): ReadonlyMap<string, string> {
  return useContext(Titles);
}

export function titlesOf(
  entries: readonly { entryId: string; content: { titleOfficer: string } }[],
): ReadonlyMap<string, string> {
  return new Map(entries.map(({ entryId, content }) => [entryId, content.titleOfficer]));
}
