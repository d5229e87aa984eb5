import { ChevronRight, Plus, Printer } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { StateChip } from '#src/ui/state-chip.js';
import { Board } from '#src/ui/surfaces.js';
import { newEntryPath, type WantedMarker } from '../model/wanted-marker.js';

interface CalendarCardProps {
  calendar: Calendar;
  isOfficer: boolean;
  isElder: boolean;
  seesDrafts: boolean;
  wanted: WantedMarker | null;
  /** The way to the next year. */
  next: ReactNode;
}

/** One calendar: what is published, what is out, and the ways on. */
export function CalendarCard({ calendar, isOfficer, isElder, seesDrafts, wanted, next }: CalendarCardProps) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const { id, year, placeName, published, outNumber, entryCount, updatedAt } = calendar;
  const isChosenFor = wanted !== null && isOfficer;
  return (
    <Board title={t('list.yearAtPlace', { year, place: placeName })}>
      <p className="flex flex-wrap gap-2">
        {published !== null && (
          <StateChip state="published">{t('list.publishedLabel', { label: published.label })}</StateChip>
        )}
        {outNumber !== null && (
          <StateChip state="in-review">{t('list.outNumber', { number: outNumber })}</StateChip>
        )}
        {seesDrafts && outNumber === null && <StateChip state="draft">{t('list.draftOpen')}</StateChip>}
      </p>
      <p className="mt-2 text-small text-umber-soft">
        {published === null && !seesDrafts
          ? t('list.notPublished')
          : `${t('list.entries', { count: entryCount })} · ${t('list.changed', { when: dates.moment(updatedAt) })}`}
      </p>
      <div className="mt-3 flex flex-wrap items-center gap-x-3 gap-y-1">
        {isChosenFor &&
          (calendar.locked ? (
            <p>{t('list.lockedForNow', { number: outNumber ?? 0 })}</p>
          ) : (
            <ButtonLink
              to={newEntryPath(id, wanted)}
              icon={<Plus aria-hidden size={22} />}
              aria-label={t('list.putInto', { year, place: placeName })}
            >
              {t('list.newEntryHere')}
            </ButtonLink>
          ))}
        {seesDrafts && !isChosenFor && (
          <ButtonLink to={paths.calendar(id)} icon={<ChevronRight aria-hidden className="turns" size={20} />}>
            {isOfficer && outNumber === null ? t('list.openDraft') : t('list.readDraft')}
          </ButtonLink>
        )}
        {isElder && !isOfficer && outNumber === null && (
          <ButtonLink to={paths.calendar(id, { entry: 'new' })} icon={<Plus aria-hidden size={20} />}>
            {t('editor.addOwn')}
          </ButtonLink>
        )}
        {published !== null && (
          <ButtonLink look={seesDrafts ? 'quiet' : 'plain'} to={paths.version(id, published.number)}>
            {t('list.openPublished', { label: published.label })}
          </ButtonLink>
        )}
        <Link className="link-line" to={paths.versions(id)}>
          {t('list.versions')}
        </Link>
        {(seesDrafts || published !== null) && (
          <Link className="link-line" to={paths.longLook(id)}>
            {t('list.longLook')}
          </Link>
        )}
        {published !== null && (
          <Link className="link-line" to={paths.sheet(id, { number: published.number })}>
            <Printer aria-hidden size={20} />
            {t('list.print')}
          </Link>
        )}
        {seesDrafts && (
          <Link className="link-line" to={paths.seasonReview(id)}>
            {t('list.lookBack', { year })}
          </Link>
        )}
        {next}
      </div>
    </Board>
  );
}
