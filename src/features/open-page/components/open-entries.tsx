import { useTranslation } from 'react-i18next';
import type { OpenEntry, OpenPage } from '#shared/contracts/open-page.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';

interface OpenEntriesProps {
  entries: readonly OpenEntry[];
  markers: OpenPage['markers'];
  year: number;
}

/** In the order of their days, those without any last. Lines stand below entries, so that both columns begin at one height. */
export function OpenEntries({ entries, markers, year }: OpenEntriesProps) {
  const byDay = entries.toSorted((a, b) => dayOf(a).localeCompare(dayOf(b)));
  return (
    <ul className="gap-x-8 wide:columns-2 print:columns-2">
      {byDay.map((entry) => (
        <li
          key={entry.entryId}
          className="mb-3 break-inside-avoid border-b border-hairline pb-3 last:mb-0 last:border-0 last:pb-0"
        >
          <Entry entry={entry} markers={markers} year={year} />
        </li>
      ))}
    </ul>
  );
}

const AFTER_EVERY_DAY = '9999';

function dayOf({ window }: OpenEntry): string {
  return window?.bestFrom ?? AFTER_EVERY_DAY;
}

function Entry({ entry, markers, year }: { entry: OpenEntry } & Omit<OpenEntriesProps, 'entries'>) {
  const { t } = useTranslation(['open', 'sky', 'calendars']);
  const words = useEntryWords();
  const { titleVillage, titleOfficer, kind, crop, otherSigns, ifLate, caution, window, star } = entry;
  const names = markers.find(({ markerKey }) => markerKey === star?.markerKey);
  return (
    <article>
      <div className="flex items-start gap-3">
        <SignIcon sign={entry.icon} size={36} className="flex-none" />
        <div className="min-w-0">
          <h3 className="text-body font-bold">{titleOfficer}</h3>
          {titleVillage !== '' && titleVillage !== titleOfficer && (
            <p className="own-words">{titleVillage}</p>
          )}
        </div>
      </div>
      <p>
        <strong>{window ? words.window(entry, window, year) : t('open:noDay')}</strong>
      </p>
      {window && <p>{words.windowSentence(window)}</p>}
      <p className="text-small">{entry.kindWord === '' ? t(`calendars:kind.${kind}`) : entry.kindWord}</p>
      {star && names && (
        <p>
          {t('open:goesBy', { star: markerName(names), phenomenon: t(`sky:phenomenon.${star.phenomenon}`) })}
        </p>
      )}
      {crop !== '' && <p>{t('open:crop', { crop })}</p>}
      {otherSigns !== '' && <p>{t('open:signs', { signs: otherSigns })}</p>}
      {ifLate !== '' && <p>{t('open:ifLate', { words: ifLate })}</p>}
      {caution !== '' && <p>{t('open:takeCare', { words: caution })}</p>}
    </article>
  );
}
