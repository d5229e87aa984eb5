import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { useCurrentPlace, useRoles } from '#src/lib/community.js';
import { todayIn } from '#src/lib/days.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { finderQuery } from '../api/finder-queries.js';
import {
  askedOf,
  readForEntry,
  readQuestion,
  writeQuestion,
  type ForEntry,
  type Question,
} from '../model/finder-question.js';
import { FinderAnswerView } from './finder-answer.js';
import type { Sign } from './finder-context.js';
import { QuestionBoard } from './question-board.js';

/** From "we used to start when …" to a well-founded marker: one question, and the signs that answer it. */
export function FinderPage() {
  const { t } = useTranslation('finder');
  const [search] = useSearchParams();
  const { place, places, isLoading } = useCurrentPlace();
  usePageTitle(t('title'));
  const shown = places.find((each) => each.id === search.get('placeId')) ?? place;
  if (shown !== null) return <FinderAtPlace key={shown.id} place={shown} />;
  return (
    <Page>
      <Mast title={t('title')} backTo={paths.stars()} />
      <Board>{isLoading ? <Skeleton lines={6} /> : <NoPlace />}</Board>
    </Page>
  );
}

const PAUSE_MS = 300;

function FinderAtPlace({ place }: { place: Place }) {
  const { t } = useTranslation('finder');
  const words = useProblemWords();
  const mayWrite = useRoles().is('officer');
  const [search, setSearch] = useSearchParams();
  const forEntry = readForEntry(search);
  const [question, setQuestion] = useState<Question>(() => readQuestion(search, todayIn(place.timeZone)));
  const asked = useMemo(() => askedOf(question), [question]);
  const settled = useSettled(asked, PAUSE_MS);
  const { data, error, refetch, isPlaceholderData } = useQuery({
    ...finderQuery(place.id, settled ?? { year: question.year }),
    enabled: settled !== null,
    placeholderData: keepPreviousData,
  });
  const change = (patch: Partial<Question>) => {
    const next = { ...question, ...patch };
    setQuestion(next);
    setSearch((before) => writeQuestion(before, next), { replace: true, preventScrollReset: true });
  };
  const takePath = mayWrite ? (found: Sign) => takePathOf(found, forEntry) : null;
  const isLate = isPlaceholderData || settled !== asked;
  return (
    <Page>
      <Mast
        title={t('title')}
        under={t('under', { place: place.name, year: question.year })}
        backTo={backPath(forEntry, place, question.year)}
      />
      <div className="grid gap-4 wide:grid-cols-[minmax(0,22rem)_minmax(0,1fr)] wide:items-start wide:gap-6">
        <QuestionBoard question={question} placeId={place.id} onChange={change} />
        {asked === null ? (
          <Board>
            <p>{t('ask.chooseOld')}</p>
          </Board>
        ) : data === undefined ? (
          <Board>
            {error === null ? (
              <Skeleton lines={8} />
            ) : (
              <TroubleNote
                title={t('trouble')}
                sentence={words.problem(error)}
                onRetry={() => {
                  void refetch();
                }}
              />
            )}
          </Board>
        ) : (
          <div aria-busy={isLate} className={isLate ? 'min-w-0 opacity-85' : 'min-w-0'}>
            <FinderAnswerView
              answer={data}
              place={place}
              takePath={takePath}
              isForEntry={forEntry !== null}
              isAll={question.show === 'all'}
              onShowAll={() => {
                change({ show: 'all' });
              }}
            />
          </div>
        )}
      </div>
    </Page>
  );
}

/** Into the entry that asked, or to the choice of a calendar for a new one. */
function takePathOf(sign: Sign, forEntry: ForEntry | null): string {
  const occurrence = sign.occurrence === 1 ? undefined : sign.occurrence;
  const marker =
    'spec' in sign
      ? { sky: canonicalJson(sign.spec), occurrence }
      : { marker: sign.markerKey, phenomenon: sign.phenomenon, occurrence };
  if (forEntry === null) return paths.calendars(marker);
  const { calendarId, entryId } = forEntry;
  return paths.calendar(calendarId, { entry: entryId ?? 'new', ...marker });
}

function backPath(forEntry: ForEntry | null, place: Place, year: number): string {
  if (forEntry === null) return paths.stars({ placeId: place.id, year });
  const { calendarId, entryId } = forEntry;
  return paths.calendar(calendarId, entryId === null ? {} : { entry: entryId });
}

function NoPlace() {
  const { t } = useTranslation('finder');
  const mayAdd = useRoles().is('officer');
  return (
    <EmptyState
      title={t('noPlace')}
      action={
        mayAdd ? (
          <ButtonLink to={paths.newPlace()} icon={<Plus aria-hidden size={20} />}>
            {t('addPlace')}
          </ButtonLink>
        ) : undefined
      }
    >
      {t('noPlaceHint')}
    </EmptyState>
  );
}
