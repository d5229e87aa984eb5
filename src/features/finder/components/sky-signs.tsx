import { useQueries, useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import { skyMarkersQuery } from '#src/lib/sky-marker-queries.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton } from '#src/ui/waiting.js';
import { markerNamesQuery } from '../api/finder-queries.js';
import { nearSigns, type NearSign } from '../model/near-signs.js';
import { useFinderFacts } from './finder-context.js';

/** As far as signs count as near: wanted days by New Year look into the year beside. */
const REACH_DAYS = 20;

/** Signs of the Sun, the nights and the stars at an hour near the wanted days, each with the way to go by it. */
export function SkySigns() {
  const { t } = useTranslation('finder');
  const { wanted, placeId } = useFinderFacts();
  const { from, to } = { from: wanted.from.dayNumber, to: wanted.to.dayNumber };
  const years = [...new Set([from - REACH_DAYS, to + REACH_DAYS].map((day) => dateOfDayNumber(day).year))];
  const asked = useQueries({ queries: years.map((year) => skyMarkersQuery(placeId, year)) });
  if (asked.some(({ isError }) => isError)) return <p>{t('signs.trouble')}</p>;
  if (asked.some(({ data }) => data === undefined)) return <Skeleton lines={4} />;
  const found = nearSigns(
    asked.flatMap(({ data }) => data ?? []),
    { from, to },
  );
  return (
    <ul className="grid gap-3">
      {found.map((sign) => (
        <OneSign key={`${canonicalJson(sign.spec)} ${String(sign.days.expected.dayNumber)}`} sign={sign} />
      ))}
    </ul>
  );
}

/** Beside stars that serve: closed, and asked for only when it is opened. */
export function SkySignsFold() {
  const { t } = useTranslation('finder');
  const [isOpen, setIsOpen] = useState(false);
  return (
    <Board>
      <Fold title={t('signs.title')} line={t('signs.line')} open={isOpen} onToggle={setIsOpen}>
        {isOpen && <SkySigns />}
      </Fold>
    </Board>
  );
}

function OneSign({ sign }: { sign: NearSign }) {
  const { t } = useTranslation(['finder', 'sky']);
  const dates = useDateWords();
  const nameOf = useSkySignWords();
  const { placeId, words, takePath, isForEntry } = useFinderFacts();
  const { data } = useQuery(markerNamesQuery(placeId));
  const names = useMemo(() => new Map((data ?? []).map((each) => [each.markerKey, each])), [data]);
  const { spec, occurrence, days } = sign;
  const name = nameOf(spec, names);
  return (
    <li className="flex gap-3">
      <SignIcon sign={skySignIconKey(spec)} size={32} className="mt-1 shrink-0" />
      <div>
        <p>
          <strong>{name}</strong>
        </p>
        <p>
          {dates.aboutBetween(
            days.expected.gregorian,
            days.early?.gregorian ?? null,
            days.late?.gregorian ?? null,
          )}
        </p>
        <p className="text-small text-umber-soft">{words.nearInFull(sign)}</p>
        {takePath !== null && (
          <ButtonLink
            look="quiet"
            className="-ms-2"
            to={takePath({ spec, occurrence })}
            aria-label={t(isForEntry ? 'signs.takeOf' : 'signs.tieOf', { sign: name })}
          >
            {t(isForEntry ? 'take' : 'tie')}
          </ButtonLink>
        )}
      </div>
    </li>
  );
}
