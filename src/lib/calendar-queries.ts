import { queryOptions } from '@tanstack/react-query';
import { calendarsEndpoints } from '#shared/contracts/calendars.js';
import { peopleEndpoints } from '#shared/contracts/people.js';
import { reviewsEndpoints } from '#shared/contracts/reviews.js';
import { starsEndpoints } from '#shared/contracts/stars.js';
import { versionsEndpoints } from '#shared/contracts/versions.js';
import { callApi } from './api-client.js';

/**
 * What several features read of calendars, their versions and their village. Everything of one calendar hangs
 * below `['calendars', calendarId]`, so one call tells all of it to look again.
 */
export const calendarKeys = {
  all: ['calendars'] as const,
  one: (calendarId: string) => ['calendars', calendarId] as const,
  entries: (calendarId: string) => ['calendars', calendarId, 'entries'] as const,
  versions: (calendarId: string) => ['calendars', calendarId, 'versions'] as const,
  version: (calendarId: string, number: number) => ['calendars', calendarId, 'versions', number] as const,
  answers: (calendarId: string, number: number) =>
    ['calendars', calendarId, 'versions', number, 'answers'] as const,
};

export function calendarQuery(calendarId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'calendar'],
    queryFn: ({ signal }) => callApi(calendarsEndpoints.read, { params: { calendarId }, signal }),
  });
}

/** Submissions and published versions, newest first. */
export function versionsQuery(calendarId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.versions(calendarId), 'list'],
    queryFn: async ({ signal }) =>
      (await callApi(versionsEndpoints.list, { params: { calendarId }, signal })).items,
  });
}

/** One version as it was frozen, with its state and signatures. */
export function versionQuery(calendarId: string, number: number) {
  return queryOptions({
    queryKey: [...calendarKeys.version(calendarId, number), 'version'],
    queryFn: ({ signal }) =>
      callApi(versionsEndpoints.read, { params: { calendarId, number: String(number) }, signal }),
  });
}

/** Answers to the entries of a submission; for officers, elders and stewards. */
export function answersQuery(calendarId: string, number: number) {
  return queryOptions({
    queryKey: calendarKeys.answers(calendarId, number),
    queryFn: ({ signal }) =>
      callApi(reviewsEndpoints.listAnswers, { params: { calendarId, number: String(number) }, signal }),
  });
}

/** Languages, contacts and the sign-off rule of a village. */
export function communityQuery(communityId: string) {
  return queryOptions({
    queryKey: ['community', communityId],
    queryFn: ({ signal }) => callApi(peopleEndpoints.readCommunity, { params: { communityId }, signal }),
  });
}

/** Every star and figure at the calendar's place in its year: what an entry can go by. */
export function markersQuery(placeId: string, year: number) {
  return queryOptions({
    queryKey: ['markers', placeId, year],
    queryFn: async ({ signal }) => {
      const { items, firstDayNumber, lastDayNumber } = await callApi(starsEndpoints.list, {
        params: { placeId },
        query: { year },
        signal,
      });
      return {
        span: { first: firstDayNumber, last: lastDayNumber },
        rows: items,
        byKey: new Map(items.map((row) => [row.markerKey, row])),
      };
    },
  });
}
