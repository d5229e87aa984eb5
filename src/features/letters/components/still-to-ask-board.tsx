import { useQuery } from '@tanstack/react-query';
import { Footprints } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { StillToAsk } from '#shared/contracts/letters.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Chip } from '#src/ui/chip.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { stillToAskQuery } from '../api/letters-api.js';

/** For whom a submission still waits: whom to visit, and what became of the letter. */
export function StillToAskBoard() {
  const { t } = useTranslation('letters');
  const words = useProblemWords();
  const { communityId } = useCurrentCommunity();
  const asked = useQuery(stillToAskQuery(communityId));
  return (
    <Board title={t('asking.title')}>
      <p className="mb-3 text-umber-soft">{t('asking.lead')}</p>
      {asked.isPending && <Skeleton lines={4} />}
      {asked.error !== null && (
        <TroubleNote sentence={words.problem(asked.error)} onRetry={() => void asked.refetch()} />
      )}
      {asked.data?.length === 0 && <p>{t('asking.empty')}</p>}
      <ul className="rows">
        {asked.data?.map((one) => (
          <AskRow key={`${one.calendarId} ${one.personId}`} one={one} />
        ))}
      </ul>
    </Board>
  );
}

function AskRow({ one }: { one: StillToAsk }) {
  const { t } = useTranslation('letters');
  const words = useDateWords();
  const when = one.letterAt === null ? '' : words.moment(one.letterAt);
  return (
    <li className="border-t border-hairline py-3 first:border-t-0">
      <p>
        <strong>{one.personName}</strong> {t(`asking.${one.does}`)}
      </p>
      <p className="text-umber-soft">
        {t('asking.calendar', { place: one.placeName, year: one.year, number: one.number })}
      </p>
      <p className="mt-1 flex flex-wrap gap-2">
        {one.visitMe && (
          <Chip tone="ochre" icon={<Footprints aria-hidden size={18} />}>
            {t('asking.visitMe')}
          </Chip>
        )}
        <Chip>{t(`asking.${one.letter}`, { when })}</Chip>
      </p>
    </li>
  );
}
