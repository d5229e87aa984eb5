import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { VersionSummary } from '#shared/contracts/versions.js';
import {
  answersQuery,
  communityQuery,
  markersQuery,
  versionQuery,
  versionsQuery,
} from '#src/lib/calendar-queries.js';
import type { RolesIn } from '#src/lib/roles-in.js';
import { placesQuery } from '#src/lib/community.js';
import { entriesQuery } from '../api/calendars-queries.js';
import { adviceOfAll } from './advice-of-all.js';
import { answersByEntry, type EntryAnswers } from './elder-requests.js';
import { contentOf, keptDraft, newDraft } from './entry-draft.js';
import { draftFor, isStale, orphans, shownEntries } from './shown-entries.js';
import { specsOf, useSigns } from './signs.js';
import { NO_EDITS, useEntryEdits } from './use-entry-edits.js';
import { useSelection } from './use-selection.js';

const NO_MONTHS: readonly boolean[] = [];

/** Officers write the village's entries, elders those that their people keep. */
export type Writer = Pick<RolesIn, 'isOfficer' | 'isElder'>;

export type Editor = ReturnType<typeof useEditor>;

/** Everything that the editor's screen shows: what is saved, what is written over it, what is open. */
export function useEditor(calendar: Calendar, { isOfficer, isElder }: Writer) {
  const { id, year, placeId, communityId, locked } = calendar;
  const entries = useQuery(entriesQuery(id));
  const markers = useQuery(markersQuery(placeId, year));
  const community = useQuery(communityQuery(communityId));
  const edits = useEntryEdits(id);
  const selection = useSelection(edits.born);
  const canWrite = (isOfficer || isElder) && !locked;
  const isKeeper = isElder && !isOfficer;
  // A locked draft is shown as it is saved; what was written before waits on this device.
  const writing = canWrite ? edits.all : NO_EDITS;

  const newStart = useMemo(
    () => (isKeeper ? keptDraft(selection.wanted) : newDraft(selection.wanted)),
    [isKeeper, selection.wanted],
  );
  const signs = useSigns(
    placeId,
    year,
    // Those being written, one that a new entry shall go by, and those saved: the open one shows all of its days.
    useMemo(() => {
      const written = [...writing.values()].map(({ draft }) => contentOf(draft));
      const saved = (entries.data?.items ?? []).map(({ content }) => content);
      return specsOf([...saved, ...written, contentOf(newStart)]);
    }, [writing, entries.data, newStart]),
  );
  const saved = useMemo(() => entries.data?.items ?? [], [entries.data]);
  const { takeIn } = edits;
  useEffect(() => {
    if (canWrite) takeIn(saved);
  }, [canWrite, takeIn, saved]);
  const shown = useMemo(
    () =>
      shownEntries({
        saved,
        edits: writing,
        openId: canWrite ? selection.openId : null,
        newStart,
        year,
        markers: markers.data?.byKey ?? null,
        signs,
      }),
    [saved, writing, canWrite, selection.openId, newStart, year, markers.data, signs],
  );
  const { data: places } = useQuery(placesQuery(communityId));
  const rainMonths = places?.find((place) => place.id === placeId)?.rainMonths ?? NO_MONTHS;
  const advice = useMemo(() => adviceOfAll(shown, rainMonths), [shown, rainMonths]);
  const open = shown.find((entry) => entry.id === selection.openId) ?? null;
  const selected = open ?? (selection.isWide ? (shown[0] ?? null) : null);
  const edit = selected ? writing.get(selected.id) : undefined;
  const answers = useEntryAnswers(id, saved);

  return {
    calendar,
    /** Somebody who may add entries and write on their own. */
    canWrite,
    /** The village's order and its submission. */
    canOrder: isOfficer && !locked,
    /** An elder, who writes what is kept and reads all else. */
    isKeeper,
    canWriteSelected: canWrite && selected !== null && (selected.saved?.mine ?? true),
    keptCount: entries.data?.keptCount ?? 0,
    entries,
    markers,
    signs,
    community: community.data ?? null,
    edits,
    selection,
    shown,
    /** What to look at besides their days, by entry. */
    advice,
    selected,
    newStart,
    /** Stays the same when a new entry is saved, so that nobody is thrown out of the field they write in. */
    formKey: [...edits.born].find(([, { id: savedId }]) => savedId === selected?.id)?.[0] ?? selected?.id,
    draft: selected ? draftFor(selected, writing, newStart) : null,
    stale: selected !== null && !edit?.sending && isStale(selected.saved, edit),
    orphans: canWrite && entries.isSuccess ? orphans(saved, writing) : [],
    answers: answers.byEntry,
    lastNumber: answers.newest?.number ?? null,
    lastState: answers.newest?.state ?? null,
    unsavedIds: shown.filter((entry) => entry.unsaved).map((entry) => entry.id),
  };
}

/** What elders said to the newest submission, by entry. */
function useEntryAnswers(
  calendarId: string,
  saved: readonly Entry[],
): { byEntry: ReadonlyMap<string, EntryAnswers>; newest: VersionSummary | null } {
  const versions = useQuery(versionsQuery(calendarId));
  const newest = versions.data?.[0] ?? null;
  const lastNumber = newest?.number ?? null;
  const version = useQuery({ ...versionQuery(calendarId, lastNumber ?? 0), enabled: lastNumber !== null });
  const answers = useQuery({ ...answersQuery(calendarId, lastNumber ?? 0), enabled: lastNumber !== null });
  const byEntry = useMemo(() => {
    if (!version.data || !answers.data) return new Map<string, EntryAnswers>();
    return answersByEntry(
      version.data,
      answers.data.items,
      new Map(saved.map(({ id, content }) => [id, content])),
    );
  }, [version.data, answers.data, saved]);
  return { byEntry, newest };
}
