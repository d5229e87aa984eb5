import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { EntryWindow } from '#shared/contracts/calendars.js';
import type { AwaitedRecord } from '#shared/contracts/event-record.js';
import { signsIn, spanOfSeen, type SignsIn } from '#shared/calendar/signs-in.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { SignMarks } from '#src/ui/pictures/sign-marks.js';
import { useCommunityChoice } from './community.js';
import { useDateWords } from './date-words.js';
import { listWords } from './list-words.js';
import { OwnSignsSeen } from './own-signs-seen.js';
import { ownSeenQuery, signsQuery, type SignHome } from './sign-queries.js';

interface SignsInLineProps {
  record: AwaitedRecord | undefined;
  window: EntryWindow | null;
  /** The calendar's. */
  year: number;
  /** Where signs in the entry's own words can be marked as seen; left out where nothing is marked. */
  home?: SignHome | undefined;
}

/**
 * How many signs of an entry are in, as marks and in words: people prepare until enough are in, and then it is they who
 * decide. The day on which to stop stands beside it. Nothing where no sign is named.
 */
export function SignsInLine({ record, ...about }: SignsInLineProps) {
  if (record === undefined || record.signs.list.length === 0) return null;
  return <Line record={record} {...about} />;
}

function Line({ record, window, year, home }: SignsInLineProps & { record: AwaitedRecord }) {
  const { t, i18n } = useTranslation('signs');
  const dates = useDateWords();
  const communityId = useCommunityChoice().community?.communityId ?? '';
  const { data: known } = useQuery({ ...signsQuery(communityId), enabled: communityId !== '' });
  const hasOwn = record.signs.list.some(({ ownId }) => ownId !== undefined);
  const { data: own } = useQuery({ ...ownSeenQuery(communityId), enabled: hasOwn && communityId !== '' });
  const seenDays = new Map([
    ...(known ?? []).map(({ id, seen }) => [id, daysOf(seen)] as const),
    ...(own ?? []).map(({ ownId, seen }) => [ownId, daysOf(seen)] as const),
  ]);
  const state = signsIn(record.signs, seenDays, spanOfSeen(window, year, record.when));
  if (state === null) return null;
  const { stop } = record.work;
  const namesOf = (which: boolean | null) =>
    listWords(
      record.signs.list.filter((_sign, place) => state.isIn[place] === which).map(({ name }) => name),
      i18n.language,
    );
  return (
    <div className="signs-in">
      <p>
        <SignMarks
          needed={state.inCount}
          total={state.total}
          label={t('in.forEars', { count: state.inCount, total: state.total })}
        />{' '}
        <strong>{t(`in.${state.state}`)}</strong>{' '}
        {t('in.needed', { count: state.needed, total: state.total })}
      </p>
      <p className="text-small text-umber-soft">
        {said([
          state.inCount > 0 && t('in.areIn', { names: namesOf(true) }),
          missingMust(record, state) && t('in.notWithout', { name: missingMust(record, state) }),
          state.isIn.includes(null) && t('in.ownWords', { names: namesOf(null) }),
        ])}
      </p>
      {stop !== null && (
        <p className="text-small">
          {t('in.stop', { day: dates.day({ year, ...stop.date }), source: stop.source })}
        </p>
      )}
      {home && hasOwn && <OwnSignsSeen communityId={communityId} home={home} list={record.signs.list} />}
    </div>
  );
}

function daysOf(seen: readonly { day: string }[]): number[] {
  return seen.map(({ day }) => dayNumberFromIso(day));
}

function missingMust({ signs }: AwaitedRecord, { missingMust: place }: SignsIn): string {
  return place === null ? '' : (signs.list[place]?.name ?? '');
}

function said(sentences: readonly (string | false)[]): string {
  return sentences.filter((one) => one !== false && one !== '').join(' ');
}
