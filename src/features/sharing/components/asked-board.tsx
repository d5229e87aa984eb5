import { useQuery } from '@tanstack/react-query';
import { Suspense } from 'react';
import { useTranslation } from 'react-i18next';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { askedSharingQuery } from '#src/lib/sharing-queries.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { Board } from '#src/ui/surfaces.js';
import { AskedWider } from './asked-wider.js';

/** For giver and steward: wider circles that wait for their word. The steward reads levels and people, not the thing. */
export function AskedBoard() {
  const { communityId } = useCurrentCommunity();
  const { data: asked } = useQuery(askedSharingQuery(communityId));
  if (!asked || asked.length === 0) return null;
  // Most days nothing waits: the words are fetched only when something does, and nobody waits for them.
  return (
    <Suspense fallback={null}>
      <AskedList communityId={communityId} asked={asked} />
    </Suspense>
  );
}

function AskedList({ communityId, asked }: { communityId: string; asked: readonly ItemSharing[] }) {
  const { t } = useTranslation('sharing');
  return (
    <Board title={t('waiting.title')}>
      <ul className="grid gap-4">
        {asked.map((sharing) => (
          <li key={`${sharing.itemType} ${sharing.itemId}`}>
            <AskedLine communityId={communityId} sharing={sharing} />
          </li>
        ))}
      </ul>
    </Board>
  );
}

function AskedLine({ communityId, sharing }: { communityId: string; sharing: ItemSharing }) {
  const { t } = useTranslation('sharing');
  const levelWords = useSharingWords();
  const { itemType, itemId } = sharing;
  const { level, ...details } = sharing.sharing;
  return (
    <>
      <p>
        <strong>{t(`waiting.thing.${itemType}`)}</strong>
      </p>
      <p className="text-umber-soft">
        {t('waiting.now', { level: levelWords(level, details) })}
        {/* Whoever may narrow a thing sees it. */}
        {!sharing.may.tighten && <> · {t('waiting.unseen')}</>}
      </p>
      <AskedWider item={{ communityId, itemType, itemId }} sharing={sharing} />
    </>
  );
}
