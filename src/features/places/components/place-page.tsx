import { useSuspenseQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import { useCommunityChoice } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useToast } from '#src/ui/toast.js';
import { useUpdatePlace } from '../api/place-mutations.js';
import { placeQuery } from '../api/places-queries.js';
import { PlaceEditor } from './place-editor.js';
import { PlaceView } from './place-view.js';

/** A place: to change for an officer of its village, to read for everybody else there. */
export function PlacePage() {
  const { placeId = '' } = useParams();
  const { data: place } = useSuspenseQuery(placeQuery(placeId));
  const { memberships } = useCommunityChoice();
  usePageTitle(place.name);
  const village = memberships.find((each) => each.communityId === place.communityId);
  const communityName = village?.communityName ?? '';
  return village?.roles.includes('officer') === true ? (
    <KeptPlaceEditor key={place.id} place={place} communityName={communityName} />
  ) : (
    <PlaceView place={place} communityName={communityName} />
  );
}

function KeptPlaceEditor({ place, communityName }: { place: Place; communityName: string }) {
  const { t } = useTranslation('places');
  const say = useToast();
  const update = useUpdatePlace(place.id);
  return (
    <PlaceEditor
      place={place}
      communityId={place.communityId}
      communityName={communityName}
      backTo={paths.villagePlaces()}
      isSaving={update.isPending}
      save={(input, version) => update.mutateAsync({ input, version: version ?? place.version })}
      onSaved={(saved) => {
        say(t('saved', { name: saved.name }));
      }}
    />
  );
}
