import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { useCommunityChoice, useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useCreatePlace } from '../api/place-mutations.js';
import { PlaceEditor } from './place-editor.js';

/** A new place. Once it is saved it is the place on screen, so that its stars are one tap away. */
export function NewPlacePage() {
  const { t } = useTranslation('places');
  const { communityId, communityName } = useCurrentCommunity();
  const { choosePlace } = useCommunityChoice();
  const mayWrite = useRoles().is('officer');
  const navigate = useNavigate();
  const say = useToast();
  const create = useCreatePlace(communityId);
  usePageTitle(t('newTitle'));
  if (!mayWrite) {
    return (
      <Page>
        <Mast title={t('newTitle')} backTo={paths.villagePlaces()} />
        <Board>
          <p>{t('readOnly')}</p>
        </Board>
      </Page>
    );
  }
  return (
    <PlaceEditor
      place={null}
      communityId={communityId}
      communityName={communityName}
      backTo={paths.villagePlaces()}
      isSaving={create.isPending}
      save={(input) => create.mutateAsync(input)}
      onSaved={(place) => {
        choosePlace(place.id);
        say(t('created', { name: place.name }));
        void navigate(paths.place(place.id), { replace: true });
      }}
    />
  );
}
