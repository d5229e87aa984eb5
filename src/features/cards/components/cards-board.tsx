import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { MadeCard } from '#shared/contracts/cards.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { cardsQuery, useEndCard, useMakeCard } from '../api/cards-api.js';
import { HolderRow } from './holder-row.js';
import { MadeCardDialog } from './made-card-dialog.js';

/** The steward makes and ends cards; everybody else sees, and may end, their own. */
export function CardsBoard() {
  const { t } = useTranslation('cards');
  const { communityId } = useCurrentCommunity();
  const isSteward = useRoles().is('steward');
  const words = useProblemWords();
  const say = useToast();
  const cards = useQuery(cardsQuery(communityId));
  const make = useMakeCard(communityId);
  const end = useEndCard(communityId);
  const [made, setMade] = useState<MadeCard | null>(null);
  const tell = (cause: unknown) => {
    say(words.problem(cause));
  };
  return (
    <Board title={isSteward ? t('list') : t('yours')}>
      <p className="mb-3 text-umber-soft">{t('lead')}</p>
      {cards.isPending && <Skeleton lines={5} />}
      {cards.error !== null && (
        <TroubleNote sentence={words.problem(cards.error)} onRetry={() => void cards.refetch()} />
      )}
      <ul className="rows">
        {cards.data?.map((holder) => (
          <HolderRow
            key={holder.personId}
            holder={holder}
            busy={make.isPending || end.isPending}
            onMake={
              isSteward
                ? () => {
                    make.mutate(holder.personId, { onSuccess: setMade, onError: tell });
                  }
                : null
            }
            onEnd={() => {
              end.mutate(holder.personId, {
                onSuccess: () => {
                  say(t('endedNow'));
                },
                onError: tell,
              });
            }}
          />
        ))}
      </ul>
      {made !== null && (
        <MadeCardDialog
          communityId={communityId}
          made={made}
          onClose={() => {
            setMade(null);
          }}
        />
      )}
    </Board>
  );
}
