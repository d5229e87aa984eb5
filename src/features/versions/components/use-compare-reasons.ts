import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { calendarsEndpoints, type Entry } from '#shared/contracts/calendars.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Comparison, EntryComparison, VersionSummary } from '#shared/contracts/versions.js';
import { callApi } from '#src/lib/api-client.js';
import { answersQuery, calendarKeys, versionsQuery } from '#src/lib/calendar-queries.js';
import { useDateWords } from '#src/lib/date-words.js';

/** Who asked for a change, and who put it in, as far as the person may know. */
export type CompareReasons = (entry: EntryComparison) => string[];

/**
 * Looks at the answers to the older side (an elder's "change this" is the reason for what came after it) and at who
 * wrote the newer one. Only those who see drafts learn about answers.
 */
export function useCompareReasons(
  calendarId: string,
  { from, to }: Comparison,
  seesDrafts: boolean,
): CompareReasons {
  const { t } = useTranslation('versions');
  const dates = useDateWords();
  const asksAnswers = seesDrafts && from !== 'draft';
  const { data: answers } = useQuery({
    ...answersQuery(calendarId, asksAnswers ? Number(from) : 0),
    enabled: asksAnswers,
  });
  const { data: versions } = useQuery(versionsQuery(calendarId));
  const { data: entries } = useQuery({
    queryKey: calendarKeys.entries(calendarId),
    queryFn: ({ signal }) => callApi(calendarsEndpoints.listEntries, { params: { calendarId }, signal }),
    enabled: seesDrafts && to === 'draft',
  });
  return useMemo(
    () => (entry) => {
      if (entry.change === 'same') return [];
      const asked = askedBy(entry, answers?.items ?? []).map(({ elderName: name, note }) =>
        note === '' ? t('compare.askedByPlain', { name }) : t('compare.askedBy', { name, note }),
      );
      const writer = putInBy(entry, to, versions ?? [], entries?.items ?? []);
      if (writer === null) return asked;
      const key = to === 'draft' ? 'compare.savedBy' : 'compare.submittedBy';
      return [...asked, t(key, { name: writer.name, when: dates.moment(writer.at) })];
    },
    [t, dates, answers, versions, entries, to],
  );
}

function askedBy(entry: EntryComparison, answers: readonly Answer[]): Answer[] {
  return answers.filter(
    ({ entryId, answer }) =>
      entryId === entry.entryId && (answer === 'change-this' || answer === 'not-for-the-board'),
  );
}

function putInBy(
  entry: EntryComparison,
  to: string,
  versions: readonly VersionSummary[],
  entries: readonly Entry[],
): { name: string; at: string } | null {
  if (to === 'draft') {
    const own = entries.find(({ id }) => id === entry.entryId);
    return own ? { name: own.updatedBy, at: own.updatedAt } : null;
  }
  const version = versions.find(({ number }) => String(number) === to);
  return version ? { name: version.submittedBy, at: version.submittedAt } : null;
}
