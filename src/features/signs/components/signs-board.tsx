import { useQuery } from '@tanstack/react-query';
import { Suspense } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Sign } from '#shared/contracts/signs.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { SeeSign } from '#src/lib/see-sign.js';
import { signsQuery, useSeeing } from '#src/lib/sign-queries.js';
import { useVillageDay } from '#src/lib/village-day.js';
import { Board } from '#src/ui/surfaces.js';
import { latelySeen } from '../model/lately-seen.js';
import { SightingOf } from './sightings.js';

/** On Today: the signs that are in, and a way to say that another one was seen. Not there while the list is empty. */
export function SignsBoard() {
  const { communityId } = useCurrentCommunity();
  const { data: signs } = useQuery(signsQuery(communityId));
  if (!signs || signs.length === 0) return null;
  return (
    <Suspense fallback={null}>
      <SignsIn communityId={communityId} signs={signs} />
    </Suspense>
  );
}

function SignsIn({ communityId, signs }: { communityId: string; signs: readonly Sign[] }) {
  const { t } = useTranslation('signs');
  const today = useVillageDay();
  const { mark } = useSeeing(communityId);
  const lately = latelySeen(signs, today);
  return (
    <Board title={t('board.title')}>
      <h3 className="text-body text-umber-soft">{t('board.areIn')}</h3>
      {lately.length === 0 ? (
        <p>{t('board.none')}</p>
      ) : (
        <ul className="grid gap-1">
          {lately.map(({ sign, seen }) => (
            <li key={sign.id}>
              <SightingOf sign={sign} seen={seen} />
            </li>
          ))}
        </ul>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <SeeSign
          mark={(signId, body) => mark.mutateAsync({ signId, body })}
          signs={signs}
          today={today}
          label={t('board.see')}
        />
        <Link to={paths.villageSigns()}>{t('board.all')}</Link>
      </div>
    </Board>
  );
}
