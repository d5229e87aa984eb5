import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { RecordSign } from '#shared/contracts/event-record.js';
import { OneSighting } from './one-sighting.js';
import { SeeSign } from './see-sign.js';
import { ownSeenQuery, useOwnSeeing, type SignHome } from './sign-queries.js';
import { useVillageDay } from './village-day.js';

interface OwnSignsSeenProps {
  communityId: string;
  home: SignHome;
  /** Signs of the entry; those of the village's list are marked there. */
  list: readonly RecordSign[];
}

/** Signs in an entry's own words: when they were seen, and a way to say that one was. */
export function OwnSignsSeen({ communityId, home, list }: OwnSignsSeenProps) {
  const { t } = useTranslation('signs');
  const today = useVillageDay();
  const { data: known } = useQuery(ownSeenQuery(communityId));
  const { mark, takeBack } = useOwnSeeing(communityId, home);
  const own = list.flatMap(({ sharedId, ownId, name, look }) =>
    sharedId === undefined && ownId !== undefined ? [{ id: ownId, name, look }] : [],
  );
  if (own.length === 0) return null;
  const sightings = own.flatMap(({ id, name }) =>
    (known ?? [])
      .filter(({ entryId, ownId }) => entryId === home.entryId && ownId === id)
      .flatMap(({ seen }) => seen.map((one) => ({ ownId: id, name, seen: one }))),
  );
  return (
    <div className="ways">
      {sightings.length > 0 && (
        <ul className="grid gap-1 text-small">
          {sightings.map(({ ownId, name, seen }) => (
            <li key={seen.id}>
              <OneSighting
                name={name}
                seen={seen}
                takeBack={() => takeBack.mutateAsync({ ownId, seenId: seen.id })}
                isTakingBack={takeBack.isPending}
              />
            </li>
          ))}
        </ul>
      )}
      <SeeSign
        look="quiet"
        mark={(ownId, body) => mark.mutateAsync({ ownId, body })}
        signs={own}
        today={today}
        label={t('in.see')}
      />
    </div>
  );
}
