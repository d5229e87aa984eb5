import { useQuery } from '@tanstack/react-query';
import { Copy, Globe, GlobeLock, Printer, QrCode } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PLACES_SHOWN, type OpenPageState, type PlaceShown } from '#shared/contracts/open-page.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { SureButton } from '#src/lib/sure-button.js';
import { useCommunityChoice } from '#src/lib/community.js';
import { Button, ButtonAnchor, ButtonLink } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import {
  openPageAddress,
  openPageCardUrl,
  openPageCodeUrl,
  openPageStateQuery,
  useSwitchOff,
  useSwitchOn,
} from '../api/open-page-api.js';
import { LeftOut } from './left-out.js';

/** For officer and steward: the page for everybody, switched on and off; its address and picture. */
export function OpenPageBoard({ communityId }: { communityId: string }) {
  const { isOfficer } = useRolesIn(communityId);
  const { memberships } = useCommunityChoice();
  const isSteward = memberships.some(
    (each) => each.communityId === communityId && each.roles.includes('steward'),
  );
  return isOfficer || isSteward ? <Switching communityId={communityId} /> : null;
}

function Switching({ communityId }: { communityId: string }) {
  const { t } = useTranslation('open');
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(openPageStateQuery(communityId));
  return (
    <Board title={t('board.title')}>
      <p className="text-small">{t('board.what')}</p>
      {data === undefined && error === null && <Skeleton lines={2} />}
      {data === undefined && error !== null && (
        <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
      {data && <Known key={`${data.key ?? ''} ${data.placeShown}`} communityId={communityId} state={data} />}
    </Board>
  );
}

function Known({ communityId, state }: { communityId: string; state: OpenPageState }) {
  const { t } = useTranslation('open');
  const words = useProblemWords();
  const say = useToast();
  const [placeShown, setPlaceShown] = useState<PlaceShown>(state.placeShown);
  const on = useSwitchOn(communityId);
  const isOn = state.key !== null;
  return (
    <div className="mt-3 grid gap-3">
      <p role="status">{t(isOn ? 'board.isOn' : 'board.isOff')}</p>
      <SelectField
        label={t('board.placeShown')}
        value={placeShown}
        onChange={(event) => {
          setPlaceShown(PLACES_SHOWN.find((each) => each === event.currentTarget.value) ?? 'name');
        }}
      >
        {PLACES_SHOWN.map((each) => (
          <option key={each} value={each}>
            {t(`board.shown.${each}`)}
          </option>
        ))}
      </SelectField>
      {(!isOn || placeShown !== state.placeShown) && (
        <Button
          icon={<Globe aria-hidden size={20} />}
          busy={on.isPending}
          onClick={() => {
            on.mutate(placeShown, {
              onSuccess: () => {
                say(t('board.saved'));
              },
            });
          }}
        >
          {t(isOn ? 'board.keep' : 'board.on')}
        </Button>
      )}
      {on.error !== null && <TroubleNote sentence={words.problem(on.error)} />}
      {state.key !== null && <Address communityId={communityId} pageKey={state.key} />}
      <LeftOut communityId={communityId} />
    </div>
  );
}

function Address({ communityId, pageKey }: { communityId: string; pageKey: string }) {
  const { t } = useTranslation('open');
  const off = useSwitchOff(communityId);
  const address = openPageAddress(pageKey);
  const picture = openPageCodeUrl(communityId, pageKey);
  return (
    <>
      <p className="break-all" translate="no" dir="ltr">
        <code>{address}</code>
      </p>
      <img className="max-w-48" src={picture} alt={t('board.code')} />
      <div className="flex flex-wrap gap-3">
        <ButtonLink to={paths.openPage(pageKey)} icon={<Globe aria-hidden size={20} />}>
          {t('board.look')}
        </ButtonLink>
        <Button
          icon={<Copy aria-hidden size={20} />}
          onClick={() => {
            void navigator.clipboard.writeText(address);
          }}
        >
          {t('board.copy')}
        </Button>
        <ButtonAnchor href={openPageCardUrl(communityId)} icon={<Printer aria-hidden size={20} />}>
          {t('board.card')}
        </ButtonAnchor>
        <ButtonAnchor href={picture} download="open-page.svg" icon={<QrCode aria-hidden size={20} />}>
          {t('board.picture')}
        </ButtonAnchor>
        <SureButton
          label={t('board.off')}
          icon={<GlobeLock aria-hidden size={20} />}
          question={t('board.offSure')}
          what={t('board.offWhat')}
          yes={t('board.offDo')}
          act={() => off.mutateAsync().then(() => undefined)}
        />
      </div>
    </>
  );
}
