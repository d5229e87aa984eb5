import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { draftChangesEndpoints, STREAM_MAX_S, type DraftGlance } from '#shared/contracts/draft-changes.js';
import { apiUrl, callApiForFile } from '#src/lib/api-client.js';
import { calendarKeys, calendarQuery } from '#src/lib/calendar-queries.js';
import { useToast } from '#src/ui/toast.js';
import { entriesQuery } from '../api/calendars-queries.js';
import { newsOf, type DraftNews } from './draft-changes.js';
import { listenToDraft } from './draft-listener.js';

/** More at once are said as a number. */
const NAMED_MAX = 2;

/**
 * While the page is looked at, it hears what others do to the draft, takes the new state in and says whose it is. A page in
 * the background lets go of its stream: browsers hold few of them.
 */
export function useDraftChanges(calendarId: string): void {
  const client = useQueryClient();
  const tell = useTellNews(calendarId);
  const latest = useRef(tell);
  useEffect(() => {
    latest.current = tell;
  });
  useEffect(() => {
    let before: DraftGlance | null = null;
    let busy: Promise<void> = Promise.resolve();
    const take = async (now: DraftGlance) => {
      const list = client.getQueryData(entriesQuery(calendarId).queryKey);
      const calendar = client.getQueryData(calendarQuery(calendarId).queryKey);
      if (!list || !calendar) return;
      const news = newsOf({ entries: list.items, calendar }, before, now);
      before = now;
      if (!news.isOlder) return;
      // What is on its way from this page shows in the draft before its own answer has come.
      const isOwn = client.isMutating() > 0;
      const titles = new Map(list.items.map(({ id, content }) => [id, content.titleOfficer]));
      // The list first: what belongs to an entry that is gone is then asked for no more.
      await client.invalidateQueries({ queryKey: calendarKeys.entries(calendarId), exact: true });
      await client.invalidateQueries({
        queryKey: calendarKeys.one(calendarId),
        predicate: ({ queryKey }) =>
          queryKey[2] !== 'entries' && !news.gone.some((entryId) => queryKey.includes(entryId)),
      });
      latest.current(isOwn ? { ...news, gone: [] } : news, titles);
    };
    const ways = {
      open: () =>
        typeof EventSource === 'undefined' ? null : new EventSource(urlOf(calendarId, STREAM_MAX_S)),
      ask: async () => (await callApiForFile(draftChangesEndpoints.watch, callOf(calendarId, 0))).text(),
    };
    let stop: (() => void) | null = null;
    const look = () => {
      if (document.visibilityState === 'hidden') {
        stop?.();
        stop = null;
      } else {
        stop ??= listenToDraft(ways, (glance) => {
          busy = busy.then(() => take(glance)).catch(() => undefined);
        });
      }
    };
    look();
    document.addEventListener('visibilitychange', look);
    return () => {
      document.removeEventListener('visibilitychange', look);
      stop?.();
    };
  }, [client, calendarId]);
}

function callOf(calendarId: string, seconds: number) {
  return { params: { calendarId }, query: { seconds } };
}

function urlOf(calendarId: string, seconds: number): string {
  return apiUrl(draftChangesEndpoints.watch, callOf(calendarId, seconds));
}

function useTellNews(
  calendarId: string,
): (news: DraftNews, titlesBefore: ReadonlyMap<string, string>) => void {
  const { t } = useTranslation('calendars');
  const client = useQueryClient();
  const say = useToast();
  return ({ added, saved, gone }, titlesBefore) => {
    const now = client.getQueryData(entriesQuery(calendarId).queryKey)?.items ?? [];
    const count = added.length + saved.length + gone.length;
    if (count > NAMED_MAX) {
      say(t('live.many', { count }));
      return;
    }
    for (const id of [...added, ...saved]) {
      const entry = now.find((each) => each.id === id);
      if (!entry) continue;
      const title = entry.content.titleOfficer;
      say(t(added.includes(id) ? 'live.added' : 'live.saved', { name: entry.updatedBy, title }));
    }
    for (const id of gone) say(t('live.gone', { title: titlesBefore.get(id) ?? '' }));
  };
}
