import { ChevronRight, Plus } from 'lucide-react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import { placesQuery, useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { VillageList } from '#src/lib/village-list.js';
import { ButtonLink } from '#src/ui/button.js';
import { SkylinePicture } from '#src/ui/pictures/skyline.js';
import { writeCoordinate } from '../model/coordinate.js';
import { degreesText } from '../model/degrees.js';
import { heightScale, turnView } from '../model/skyline-edit.js';

/** The watching places of the village on screen; officers add one. A part of the village's page. */
export function PlacesList() {
  const { t } = useTranslation('places');
  const { communityId } = useCurrentCommunity();
  const mayAdd = useRoles().is('officer');
  const query = useQuery(placesQuery(communityId));
  return (
    <VillageList
      query={query}
      add={
        mayAdd ? (
          <ButtonLink to={paths.newPlace()} icon={<Plus aria-hidden size={20} />}>
            {t('list.add')}
          </ButtonLink>
        ) : null
      }
      none={{
        title: t('list.none'),
        hint: (
          <>
            {t('list.noneHint')} {!mayAdd && t('list.noneHintOthers')}
          </>
        ),
      }}
      card={(place) => <PlaceCard place={place} />}
    />
  );
}

function PlaceCard({ place }: { place: Place }) {
  const { t, i18n } = useTranslation('places');
  const { topDeg, bottomDeg } = heightScale(place.skyline);
  const highestDeg = Math.max(0, ...place.skyline.map((point) => point.altitudeDeg));
  return (
    <Link to={paths.place(place.id)} className="board block text-umber no-underline hover:bg-lime-deep">
      <span className="flex items-center justify-between gap-3">
        <span className="own-words text-lead underline decoration-edge underline-offset-4">{place.name}</span>
        <ChevronRight aria-hidden className="turns" size={24} />
      </span>
      <span className="mt-1 block text-small text-umber-soft">
        <bdi dir="ltr">
          {writeCoordinate(place.latitudeDeg, 'latitude')}, {writeCoordinate(place.longitudeDeg, 'longitude')}
        </bdi>
        <span className="block">
          {highestDeg === 0
            ? t('list.flat')
            : t('list.highest', { degrees: degreesText(highestDeg, i18n.language) })}
        </span>
      </span>
      <span aria-hidden className="mt-2 block">
        <SkylinePicture
          points={place.skyline}
          view={{ ...turnView(null), topDeg, bottomDeg }}
          height={48}
          label=""
        />
      </span>
    </Link>
  );
}
