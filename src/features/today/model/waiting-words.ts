import { useTranslation } from 'react-i18next';
import type { WaitingItem } from '#shared/contracts/today.js';
import { paths } from '#src/lib/paths.js';

export interface WaitingLine {
  title: string;
  detail: string;
  to: string;
}

/** Who and what in each line, and where it leads. */
export function useWaitingWords(): (item: WaitingItem) => WaitingLine {
  const { t } = useTranslation('today');
  return (item) => {
    const values = {
      place: item.placeName,
      year: String(item.year),
      number: String(item.number ?? ''),
      label: item.label ?? '',
      entry: item.entryTitle ?? '',
      person: item.personName ?? '',
      note: item.note ?? '',
      done: item.done,
      of: item.of,
    };
    const to = addressOf(item);
    switch (item.kind) {
      case 'answer-entries':
        return {
          title: t('waiting.answer-entries.title', { ...values, count: item.of - item.done }),
          detail: t('waiting.answer-entries.detail', values),
          to,
        };
      case 'answer-own-entries':
        return {
          title: t('waiting.answer-own-entries.title', { ...values, count: item.of - item.done }),
          detail: t('waiting.answer-own-entries.detail', values),
          to,
        };
      case 'go-on-with-draft':
        return {
          title: t('waiting.go-on-with-draft.title', values),
          detail: t('waiting.go-on-with-draft.detail', { ...values, count: item.of }),
          to,
        };
      default:
        return {
          title: t(`waiting.${item.kind}.title`, values),
          detail: t(`waiting.${item.kind}.detail`, values),
          to,
        };
    }
  };
}

/** Where the task is done. */
export function addressOf({ kind, calendarId, number, entryId }: WaitingItem): string {
  const at = number ?? 1;
  switch (kind) {
    case 'answer-entries':
    case 'sign-as-elder':
      return paths.review(calendarId, at);
    case 'answer-own-entries':
      return paths.ownEntries(calendarId, at);
    case 'elder-asked-change':
    case 'elder-said-not-for-board':
      return entryId === null
        ? paths.version(calendarId, at)
        : paths.calendar(calendarId, { entry: entryId });
    case 'go-on-with-draft':
      return paths.calendar(calendarId);
    case 'print-published':
      return paths.sheet(calendarId, { number: at });
    default:
      return paths.version(calendarId, at);
  }
}
