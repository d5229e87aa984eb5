import { useCallback, useEffect, useState } from 'react';
import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import { keptParts, keptRecordings, type KeptPart, type KeptRecording } from './kept-recordings.js';

export interface Unsent {
  recording: KeptRecording;
  parts: KeptPart[];
}

/** What is on this device and was not sent yet. A browser without a store for it has none. */
export function useKeptRecordings(
  personId: string,
  { subjectType, subjectId }: AttachmentSubject,
): { unsent: readonly Unsent[]; isKnown: boolean; lookAgain: () => Promise<void> } {
  const [found, setFound] = useState<readonly Unsent[] | null>(null);
  const read = useCallback(async (): Promise<Unsent[]> => {
    try {
      const found: Unsent[] = [];
      for (const recording of await keptRecordings(personId, { subjectType, subjectId })) {
        found.push({ recording, parts: await keptParts(recording) });
      }
      return found.filter(({ parts }) => parts.length > 0);
    } catch {
      return [];
    }
  }, [personId, subjectType, subjectId]);
  const lookAgain = useCallback(async () => {
    setFound(await read());
  }, [read]);
  useEffect(() => {
    let isHere = true;
    void read().then((now) => {
      if (isHere) setFound(now);
    });
    return () => {
      isHere = false;
    };
  }, [read]);
  return { unsent: found ?? [], isKnown: found !== null, lookAgain };
}
