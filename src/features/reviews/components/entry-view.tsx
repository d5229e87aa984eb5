import { Trans, useTranslation } from 'react-i18next';
import { BoardLine } from '#src/lib/board-line.js';
import { useGiverWords } from '#src/lib/giver-words.js';
import { KeptChip } from '#src/lib/level-chip.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { useDateWords } from '#src/lib/date-words.js';
import { RecordReading } from '#src/lib/record-reading.js';
import { SignsInLine } from '#src/lib/signs-in-line.js';
import { VariantList } from '#src/lib/variant-list.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { Care } from '#src/ui/surfaces.js';
import { useEntrySentences } from '../model/entry-sentences.js';
import { EntryDays } from './entry-days.js';
import { ReadAloud } from './read-aloud.js';

/** One entry as an elder reads it: the village's words first, then when, then everything that belongs to it. */
export function EntryView({
  entry,
  header,
}: {
  entry: VersionEntryBody;
  header: Pick<VersionHeader, 'year' | 'markers' | 'villageLanguage' | 'officerLanguage'>;
}) {
  const { t } = useTranslation(['reviews', 'variants']);
  const sharing = useSharingWords();
  const giverWords = useGiverWords();
  const words = useDateWords();
  const { content, dates } = entry;
  const say = useEntrySentences(entry, header.markers, header.year);
  const { window } = dates;
  const bestKey = window !== null && window.bestFrom === window.bestTo ? 'bestOneDay' : 'best';
  const best =
    window === null
      ? t('noWindow')
      : t(bestKey, {
          day: words.day(window.bestFrom),
          range: words.range(window.bestFrom, window.bestTo),
        }).replace(/<\/?d>/gu, '');
  return (
    <div className="review-entry">
      <div className="flex items-center gap-4">
        <SignIcon sign={content.icon} size={72} className="shrink-0" />
        <h1 id="entry-title" tabIndex={-1} className="min-w-0">
          {content.titleVillage !== '' && (
            <span className="block text-umber-soft" lang={header.villageLanguage.tag}>
              {content.titleVillage}
            </span>
          )}
          <span className="block" lang={header.officerLanguage.tag}>
            {content.titleOfficer}
          </span>
        </h1>
      </div>
      <p>
        <KeptChip level={content.sharingLevel} details={content.sharing} />
      </p>
      <ReadAloud
        language={header.officerLanguage.tag}
        sentences={[content.titleOfficer, best, say.lead, say.counted, say.begins, say.lastAdvised]
          .concat(content.protectiveWatch ? t('watch') : null)
          .concat(
            spoken(t('signs'), content.otherSigns),
            spoken(t('ifLate'), content.ifLate),
            content.caution,
          )
          .filter((sentence): sentence is string => sentence !== null && sentence !== '')}
      />
      <p className="review-best">
        {window === null ? (
          t('noWindow')
        ) : window.bestFrom === window.bestTo ? (
          <Trans
            t={t}
            i18nKey="bestOneDay"
            values={{ day: words.day(window.bestFrom) }}
            components={{ d: <strong /> }}
          />
        ) : (
          <Trans
            t={t}
            i18nKey="best"
            values={{ range: words.range(window.bestFrom, window.bestTo) }}
            components={{ d: <strong /> }}
          />
        )}
      </p>
      <p>{say.lead}</p>
      {say.counted !== null && <p>{say.counted}</p>}
      {say.begins !== null && <p>{say.begins}</p>}
      {window !== null && <EntryDays window={window} dates={dates} content={content} />}
      {say.lastAdvised !== null && <p>{say.lastAdvised}</p>}
      {content.protectiveWatch && <p>{t('watch')}</p>}
      <Part title={t('signs')} text={content.otherSigns} />
      <Part title={t('ifLate')} text={content.ifLate} />
      <SignsInLine record={content.record} window={window} year={header.year} />
      <RecordReading record={content.record} />
      <Part title={t('crop')} text={content.crop} />
      <Part title={t('notes')} text={content.notes} />
      {entry.variants !== undefined && (
        <section className="grid gap-2">
          <h2>{t('variants:title')}</h2>
          <p className="text-small text-umber-soft">{t('variants:lead')}</p>
          <BoardLine entry={entry} />
          <VariantList
            variants={entry.variants}
            year={header.year}
            markers={new Map(header.markers.map((marker) => [marker.markerKey, marker]))}
          />
        </section>
      )}
      {content.caution !== '' && (
        <Care>
          <p>{content.caution}</p>
        </Care>
      )}
      <p className="text-umber-soft">
        {content.giver !== '' && `${t('giver', { giver: giverWords(content.giver) })}. `}
        {sharing(content.sharingLevel, content.sharing)}.
      </p>
    </div>
  );
}

function spoken(title: string, text: string): string {
  return text === '' ? '' : `${title}: ${text}`;
}

function Part({ title, text }: { title: string; text: string }) {
  if (text === '') return null;
  return (
    <section>
      <h2 className="review-part">{title}</h2>
      <p className="whitespace-pre-line">{text}</p>
    </section>
  );
}
