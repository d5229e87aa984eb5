import { ArrowLeft } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { OwnEntries } from '#shared/contracts/reviews.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { ProgressPegs } from '#src/ui/pegs.js';
import { Page } from '#src/ui/page.js';
import type { VersionRef } from '../api/reviews-api.js';
import { nextOpen } from '../model/answers-of.js';
import { useFocusOnMove } from '../model/use-focus-on-move.js';
import { EntrySteps } from './entry-steps.js';
import { EntryView } from './entry-view.js';
import type { Speak } from './note-panel.js';
import { OwnAnswerFoot } from './own-answer-foot.js';

/** What belongs to an entry besides its words, and the recorder of a voice about it. */
export interface BesideOwnEntry {
  about: (entry: VersionEntryBody) => ReactNode;
  speak: (entry: VersionEntryBody, done: Parameters<Speak>[0]) => ReactNode;
}

/** Goes through the entries that the person keeps; behind the last one stands that everything is said. */
export function OwnEntriesRound({
  versionRef,
  own,
  title,
  about,
  speak,
}: BesideOwnEntry & {
  versionRef: VersionRef;
  own: OwnEntries;
  title: string;
}) {
  const { t } = useTranslation('reviews');
  const { items } = own;
  const entryIds = items.map(({ entry }) => entry.entryId);
  const given = new Map(items.flatMap((item) => (item.answer === null ? [] : [[item.entry.entryId, item]])));
  const [index, setIndex] = useState(() => nextOpen(entryIds, given, -1) ?? 0);
  useFocusOnMove(index);
  const current = items[index];
  return (
    <Page className="review">
      <div className="review-head">
        <Link to={paths.today()} className="btn quiet">
          <ArrowLeft aria-hidden size={24} className="turns" />
          {t('leave')}
        </Link>
        <span className="text-umber-soft">{title}</span>
      </div>
      <ProgressPegs
        total={items.length}
        current={current ? index : null}
        isDone={(each) => given.has(entryIds[each] ?? '')}
        label={
          current
            ? t('progress', { done: given.size, total: items.length, entry: index + 1 })
            : t('progressEnd', { done: given.size, total: items.length })
        }
      />
      {current ? (
        <>
          <EntryView
            key={current.entry.entryId}
            entry={current.entry}
            header={{
              year: own.year,
              markers: own.markers,
              villageLanguage: own.villageLanguage,
              officerLanguage: own.officerLanguage,
            }}
          />
          <div className="review-entry">
            <p className="text-umber-soft">{t('own.keptHint')}</p>
            {about(current.entry)}
            <p className="text-umber-soft">{t('silence')}</p>
            {items.length > 1 && <EntrySteps index={index} total={items.length} goTo={setIndex} />}
          </div>
          <OwnAnswerFoot
            key={current.entry.entryId}
            versionRef={versionRef}
            entryId={current.entry.entryId}
            answer={current.answer}
            speak={(done) => speak(current.entry, done)}
            onAnswered={() => {
              const after = new Map<string, unknown>(given).set(current.entry.entryId, null);
              setIndex(nextOpen(entryIds, after, index) ?? items.length);
            }}
          />
        </>
      ) : (
        <div className="review-entry">
          <h1 id="entry-title" tabIndex={-1}>
            {given.size === items.length ? t('own.allAnswered') : t('end.title')}
          </h1>
          <p>
            {given.size === items.length
              ? t('own.thanks')
              : t('end.open', { count: items.length - given.size })}
          </p>
          <div className="flex flex-wrap gap-2">
            <ButtonLink to={paths.today()} look="main">
              {t('leave')}
            </ButtonLink>
            <Button
              look="quiet"
              onClick={() => {
                setIndex(0);
              }}
            >
              {t('own.again')}
            </Button>
          </div>
        </div>
      )}
    </Page>
  );
}
