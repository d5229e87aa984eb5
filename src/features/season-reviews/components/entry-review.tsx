import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ReviewedEntry, SeasonReview } from '#shared/contracts/season-reviews.js';
import { ActualDaysPanel } from '#src/lib/actual-days-panel.js';
import { Fold } from '#src/ui/fold.js';
import { useSeasonWords } from '../model/season-words.js';
import { Decisions } from './decisions.js';
import { Lessons } from './lessons.js';

/** What the person may write besides lessons. */
export interface Writing {
  /** The days on which work was done. */
  typesDays: boolean;
  /** What is to be done otherwise next year. */
  decides: boolean;
}

interface EntryReviewProps {
  review: SeasonReview;
  entry: ReviewedEntry;
  writing: Writing;
}

/** One entry: closed, what was planned and done; open, everything else and what people say to it. */
export function EntryReview({ review, entry, writing }: EntryReviewProps) {
  const { t } = useTranslation('season');
  const [isOpen, setIsOpen] = useState(false);
  const words = useSeasonWords();
  const { titleVillage, titleOfficer } = entry;
  return (
    <Fold
      title={
        <>
          {titleOfficer}
          {titleVillage !== '' && (
            <span className="own-words text-umber-soft" lang={review.villageLanguageTag}>
              {' '}
              {titleVillage}
            </span>
          )}
        </>
      }
      line={`${t('facts.done')}: ${words.done(entry) ?? t('done.nothing')}`}
      open={isOpen}
      onToggle={setIsOpen}
    >
      {isOpen && <Opened review={review} entry={entry} writing={writing} />}
    </Fold>
  );
}

function Opened({ review, entry, writing: { typesDays, decides } }: EntryReviewProps) {
  const { t } = useTranslation('season');
  const words = useSeasonWords();
  const { calendarId, year } = review;
  const { entryId, inDraft, actual } = entry;
  const star = words.star(entry);
  const signs = words.signs(entry);
  const maySayDays = typesDays && inDraft;
  return (
    <>
      <dl className="season-facts">
        <dt>{t('facts.planned')}</dt>
        <dd>{words.planned(entry, review)}</dd>
        {!maySayDays && (
          <>
            <dt>{t('facts.done')}</dt>
            <dd>{words.done(entry, true) ?? t('done.nothing')}</dd>
          </>
        )}
        {star !== null && (
          <>
            <dt>{t('facts.star')}</dt>
            <dd>{star}</dd>
          </>
        )}
        {signs.length > 0 && (
          <>
            <dt>{t('facts.signs')}</dt>
            <dd>
              <ul>
                {signs.map((sign) => (
                  <li key={sign}>{sign}</li>
                ))}
              </ul>
            </dd>
          </>
        )}
        {entry.otherSigns !== '' && (
          <>
            <dt>{t('facts.otherSigns')}</dt>
            <dd>{entry.otherSigns}</dd>
          </>
        )}
      </dl>
      {maySayDays && (
        <ActualDaysPanel
          key={actual?.typedAt}
          calendarId={calendarId}
          year={year}
          entry={{ id: entryId, ...(actual === null ? {} : { actual }) }}
        />
      )}
      <Lessons calendarId={calendarId} entryId={entryId} lessons={entry.lessons} />
      <Decisions review={review} entryId={entryId} decisions={entry.decisions} decides={decides} />
    </>
  );
}
