import { useTranslation } from 'react-i18next';
import type { Notice } from '#shared/contracts/weather.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { NoticesAbove } from '#src/lib/notices-above.js';
import { SureButton } from '#src/lib/sure-button.js';
import { useToast } from '#src/ui/toast.js';
import { useWeather } from '../api/weather-mutations.js';

/** The notices on Today, where officer and steward can take one down that the office took back. */
export function NoticesToday() {
  const mayTell = useRoles().is('officer', 'steward');
  return <NoticesAbove about={mayTell ? (notice) => <TakeDown notice={notice} /> : undefined} />;
}

function TakeDown({ notice: { id } }: { notice: Notice }) {
  const { t } = useTranslation('weather');
  const say = useToast();
  const { removeNotice } = useWeather(useCurrentCommunity().communityId);
  return (
    <SureButton
      label={t('notice.takeDown')}
      look="quiet"
      question={t('notice.takeDownSure')}
      what={<p>{t('notice.takeDownWhat')}</p>}
      yes={t('notice.takeDownYes')}
      act={async () => {
        await removeNotice.mutateAsync(id);
        say(t('notice.takenDown'));
      }}
    />
  );
}
