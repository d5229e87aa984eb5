import { useTranslation } from 'react-i18next';
import type { Sign } from '#shared/contracts/signs.js';
import { useDateWords } from '#src/lib/date-words.js';
import { KeptChip } from '#src/lib/level-chip.js';
import { SeeSign } from '#src/lib/see-sign.js';
import { useSeeing } from '#src/lib/sign-queries.js';
import { SureButton } from '#src/lib/sure-button.js';
import { TakeBackLink } from '#src/lib/take-back-link.js';
import { useVillageDay } from '#src/lib/village-day.js';
import { Button } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSignChanges } from '../api/sign-mutations.js';
import { SightingOf } from './sightings.js';

/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;
const SHOWN_SIGHTINGS = 3;

/** One sign: what to look for, where, when it usually comes, and when it was seen. */
export function SignCard({ sign, onChange }: { sign: Sign; onChange: (() => void) | null }) {
  const { t } = useTranslation(['signs', 'record']);
  const dates = useDateWords();
  const today = useVillageDay();
  const { mark } = useSeeing(sign.communityId);
  const { name, type, look, where, usual, seen, communityId } = sign;
  const monthDay = (day: { month: number; day: number }) => dates.day({ year: PLAIN_YEAR, ...day });
  const said = [
    t(`record:signs.type.${type}`),
    where,
    usual ? t('list.usual', { from: monthDay(usual.from), to: monthDay(usual.to) }) : '',
    sign.stillSeen === null || sign.stillSeen === 'yes' ? '' : t(`record:signs.stillSeen.${sign.stillSeen}`),
  ];
  return (
    <Board title={<span className="own-words">{name}</span>}>
      <KeptChip level={sign.sharingLevel} details={sign.sharing} />
      {look !== '' && <p>{look}</p>}
      <p className="text-small text-umber-soft">{said.filter((one) => one !== '').join(' · ')}</p>
      {seen.length === 0 ? (
        <p className="mt-2">{t('list.notSeen')}</p>
      ) : (
        <ul className="mt-2 grid gap-1">
          {seen.slice(0, SHOWN_SIGHTINGS).map((one) => (
            <li key={one.id}>
              <SightingOf sign={sign} seen={one} />
            </li>
          ))}
        </ul>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-x-3 gap-y-2">
        <SeeSign
          mark={(signId, body) => mark.mutateAsync({ signId, body })}
          signs={[sign]}
          today={today}
          label={t('list.seen')}
          about={t('list.seenAbout', { name })}
        />
        {onChange !== null && (
          <Button look="quiet" aria-label={t('list.changeAbout', { name })} onClick={onChange}>
            {t('list.change')}
          </Button>
        )}
        {onChange !== null && <TakeOut sign={sign} />}
        <TakeBackLink communityId={communityId} itemType="sign" itemId={sign.id} about={name} />
      </div>
    </Board>
  );
}

function TakeOut({ sign: { id, name, communityId } }: { sign: Sign }) {
  const { t } = useTranslation('signs');
  const say = useToast();
  const { takeOut, putBack } = useSignChanges(communityId);
  return (
    <SureButton
      label={t('list.takeOut')}
      look="quiet"
      question={t('list.takeOutSure', { name })}
      what={<p>{t('list.takeOutWhat')}</p>}
      yes={t('list.takeOutYes')}
      act={async () => {
        await takeOut.mutateAsync(id);
        say(t('list.takenOut', { name }), {
          onUndo: () => {
            putBack.mutate(id);
          },
        });
      }}
    />
  );
}
