import { useTranslation } from 'react-i18next';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords, type NamesByKey } from '#src/lib/entry-words.js';
import { useRecordFacts } from '#src/lib/record-facts.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { signed } from '#src/lib/signed.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { isOfRecord, recordPartOf, type Unit } from '../model/stale-choice.js';
import type { RecordPart } from '../model/record-parts.js';

/** Facts of a part that go by other names than the part itself. */
const FACTS_OF: Readonly<Partial<Record<RecordPart, readonly string[]>>> = {
  confidence: ['confidence', 'by'],
  heard: ['heardWhere', 'heardDay', 'heardLanguage'],
};

function RecordValue({ part, record }: { part: RecordPart } & Pick<EntryInput, 'record'>) {
  const { t } = useTranslation('calendars');
  const facts = useRecordFacts()(record);
  const said =
    part === 'signs'
      ? facts.signs
      : Object.values(facts)
          .flat()
          .filter(({ key }) => (FACTS_OF[part] ?? [part]).includes(key));
  const [only, ...more] = said;
  if (only === undefined) return <span className="text-umber-soft">{t('stale.empty')}</span>;
  if (more.length === 0 && part !== 'signs') return <span className="whitespace-pre-line">{only.value}</span>;
  return (
    <ul>
      {said.map(({ key, label, value }) => (
        <li key={key}>
          {label}: {value}
        </li>
      ))}
    </ul>
  );
}

/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;

/** One part of an entry as words, for two texts side by side. */
export function UnitValue({
  unit,
  content,
  markers,
}: {
  unit: Unit;
  content: EntryInput;
  markers: NamesByKey;
}) {
  const { t } = useTranslation(['calendars', 'variants']);
  const dates = useDateWords();
  const words = useEntryWords();
  const sharing = useSharingWords();
  if (isOfRecord(unit)) return <RecordValue part={recordPartOf(unit)} record={content.record} />;
  switch (unit) {
    case 'kind':
      return content.kindWord?.word ?? t(`kind.${content.kind}`);
    case 'icon':
      return (
        <span className="inline-flex items-center gap-2">
          <SignIcon sign={content.icon} size={28} />
          {t(`icon.${content.icon}`)}
        </span>
      );
    case 'lead':
      return words.leadAlone(content, markers);
    case 'offsets': {
      const { earliestDays, bestFromDays, bestToDays, lastAdvisedDays } = content.offsets;
      return t('stale.offsetsAre', {
        earliest: signed(earliestDays),
        bestFrom: signed(bestFromDays),
        bestTo: signed(bestToDays),
        lastAdvised: signed(lastAdvisedDays),
      });
    }
    case 'lastDate':
      if (!content.lastDate) return t(content.protectiveWatch ? 'stale.noLastDateWatch' : 'stale.noLastDate');
      return t('stale.lastDateIs', {
        day: dates.day({ year: PLAIN_YEAR, ...content.lastDate.date }),
        source: content.lastDate.source,
      });
    case 'board':
      return content.board
        ? t('variants:board.reasonShown', { reason: content.board.reason })
        : t('variants:board.entry.name');
    case 'agreedToPrint':
      return t(content.agreedToPrint ? 'stale.yes' : 'stale.no');
    case 'sharingLevel':
      return sharing(content.sharingLevel, content.sharing);
    default:
      return content[unit] === '' ? (
        <span className="text-umber-soft">{t('stale.empty')}</span>
      ) : (
        <span className="whitespace-pre-line">{content[unit]}</span>
      );
  }
}
