import { useQuery } from '@tanstack/react-query';
import type { Language } from '#shared/contracts/people.js';
import { communityQuery } from '#src/lib/calendar-queries.js';

/** The village's two languages; any other is called by its tag. */
export function useLanguageNames(communityId: string): {
  languages: readonly Language[];
  nameOf: (tag: string) => string;
} {
  const { data } = useQuery(communityQuery(communityId));
  const languages = data ? [data.villageLanguage, data.officerLanguage] : [];
  return {
    languages,
    nameOf: (tag) => languages.find((language) => language.tag === tag)?.name ?? tag,
  };
}
