import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { useToast } from '#src/ui/toast.js';
import type { Deliver } from './use-deliver.js';
import type { Editor } from './use-editor.js';

const EVERY_MS = 10_000;

/** What was on its way when the network went, or the page was closed, is sent again by itself, and counts once. */
export function useSendAgain(
  { edits, selection, canWrite }: Editor,
  { sendAgain }: Deliver,
  onSaved: (entryId: string) => void,
): void {
  const { t } = useTranslation('calendars');
  const say = useToast();
  const isBusy = useRef(false);
  const sendAll = async () => {
    if (isBusy.current || !canWrite) return;
    isBusy.current = true;
    for (const [entryId, { sending }] of edits.all) {
      if (!sending) continue;
      try {
        const saved = await sendAgain(entryId, sending);
        onSaved(entryId);
        if (selection.openId === entryId && saved.id !== entryId) selection.rename(saved.id);
        say(t('editor.saved', { title: saved.content.titleOfficer }));
      } catch {
        // Kept as it is: the next time, or the person's own save, tells what stands in the way.
      }
    }
    isBusy.current = false;
  };
  const latest = useRef(sendAll);
  useEffect(() => {
    latest.current = sendAll;
  });
  const isWaiting = [...edits.all.values()].some(({ sending }) => sending !== undefined);
  useEffect(() => {
    if (!isWaiting) return undefined;
    const send = () => void latest.current();
    addEventListener('online', send);
    const timer = setInterval(send, EVERY_MS);
    return () => {
      removeEventListener('online', send);
      clearInterval(timer);
    };
  }, [isWaiting]);
  useEffect(() => {
    void latest.current();
  }, []);
}
