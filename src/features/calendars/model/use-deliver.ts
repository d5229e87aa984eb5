import { sameJson } from '#shared/kernel/canonical-json.js';
import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import { isUnheard } from '#src/lib/keyed-write.js';
import { newId } from '#src/lib/new-id.js';
import { useAddEntry, useUpdateEntry } from '../api/entry-mutations.js';
import { sameContent } from './entry-draft.js';
import type { Sending } from './kept-edits.js';
import type { EntryEdits } from './use-entry-edits.js';

export interface Deliver {
  /** Saves a text: as a new entry where `version` is null, else over that state of the entry. */
  send: (entryId: string, content: EntryInput, version: number | null) => Promise<Entry>;
  /** Sends what was on its way when no answer came. */
  sendAgain: (entryId: string, sending: Sending) => Promise<Entry>;
  isPending: boolean;
}

/**
 * Brings texts to the server so that each is saved once. What is on its way is kept on the device with its key until an
 * answer came; a newer text waits until it is known what became of the one before.
 */
export function useDeliver(calendarId: string, edits: EntryEdits): Deliver {
  const add = useAddEntry(calendarId);
  const update = useUpdateEntry(calendarId);

  const sendAgain = async (entryId: string, sending: Sending): Promise<Entry> => {
    const { key, content, version } = sending;
    edits.mark(entryId, sending);
    try {
      const saved =
        version === null
          ? await add.mutateAsync(content, key)
          : await update.mutateAsync({ entryId, content, version }, key);
      edits.settle(entryId, content, saved);
      return saved;
    } catch (cause) {
      if (!isUnheard(cause)) edits.mark(entryId, null);
      throw cause;
    }
  };

  const send: Deliver['send'] = async (entryId, content, version) => {
    // Pressed on a page that still shows it as new: it is the saved one that is meant.
    const born = edits.bornAs(entryId);
    if (born !== null && version === null) {
      return sameContent(born.content, content) ? born : send(born.id, content, born.version);
    }
    const before = edits.sendingOf(entryId);
    if (before === null) return sendAgain(entryId, { key: newId(), content, version });
    if (before.version === version && sameJson(before.content, content)) return sendAgain(entryId, before);
    const saved = await sendAgain(entryId, before);
    if (sameContent(saved.content, content)) return saved;
    return sendAgain(saved.id, { key: newId(), content, version: saved.version });
  };

  return { send, sendAgain, isPending: add.isPending || update.isPending };
}
