import { useQuery } from '@tanstack/react-query';
import { Suspense, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Notice } from '#shared/contracts/weather.js';
import { Care } from '#src/ui/surfaces.js';
import { useCommunityChoice } from './community.js';
import { useDateWords } from './date-words.js';
import { useVillageDay } from './village-day.js';
import { weatherQuery } from './weather-query.js';

interface NoticesAboveProps {
  /** What can be done about one, where something can. */
  about?: ((notice: Notice) => ReactNode) | undefined;
}

/** What the weather service says today, above everything that speaks of work. One that has expired is not there. */
export function NoticesAbove({ about }: NoticesAboveProps) {
  const communityId = useCommunityChoice().community?.communityId ?? '';
  const { data } = useQuery({ ...weatherQuery(communityId), enabled: communityId !== '' });
  const today = useVillageDay();
  // What is kept on the device may be older than the day on which a notice ended.
  const holding = (data?.notices ?? []).filter(({ expiresOn }) => expiresOn >= today);
  if (holding.length === 0) return null;
  return (
    <Suspense fallback={null}>
      <div className="mb-4 grid gap-3">
        {holding.map((notice) => (
          <OneNotice key={notice.id} notice={notice} about={about} />
        ))}
      </div>
    </Suspense>
  );
}

function OneNotice({ notice, about }: { notice: Notice } & NoticesAboveProps) {
  const { t } = useTranslation('weather');
  const dates = useDateWords();
  const { text, issuer, issuedOn, expiresOn } = notice;
  return (
    <Care role="note" aria-label={t('notice.of', { issuer })}>
      <p>
        <strong>{t('notice.of', { issuer })}</strong>
      </p>
      <p className="whitespace-pre-line">{text}</p>
      <p className="text-small">
        {t('notice.dates', { issued: dates.day(issuedOn), expires: dates.day(expiresOn) })}{' '}
        {t('notice.first')}
      </p>
      {about?.(notice)}
    </Care>
  );
}
