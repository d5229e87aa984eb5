import { Check, Printer, X } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { CONSENT_USES, type Consent, type ConsentUse } from '#shared/contracts/consents.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { Button, ButtonAnchor } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { Board } from '#src/ui/surfaces.js';
import { consentCardUrl } from '../api/consents-api.js';
import { useConsentFacts } from '../model/consent-facts.js';
import { ConsentChips } from './consent-chips.js';
import { Withdraw } from './withdraw.js';

/** What one person or group said about the thing: the answer, each use by itself, and what was agreed besides. */
export function ConsentView({
  consent,
  proofs,
  onChange,
}: {
  consent: Consent;
  proofs: ReactNode;
  onChange: () => void;
}) {
  const { t } = useTranslation('consents');
  const { communityId } = useCurrentCommunity();
  const dates = useDateWords();
  const writer = useWriterWords();
  const facts = useConsentFacts()(consent);
  const { content, isMine, may, uses } = consent;
  const yes = CONSENT_USES.filter((use) => uses?.includes(use) === true);
  const no = CONSENT_USES.filter((use) => uses?.includes(use) !== true);
  return (
    <Board
      title={<span className="own-words">{writer(content.giverName)}</span>}
      beside={<ConsentChips {...consent} />}
    >
      {yes.length > 0 && (
        <div className="grid gap-x-6 gap-y-3 mid:grid-cols-2">
          <Uses label={t('sheet.yesTo')} uses={yes} icon={<Check aria-hidden size={20} />} />
          <Uses label={t('sheet.noTo')} uses={no} icon={<X aria-hidden size={20} />} />
        </div>
      )}
      <dl className="mt-3 grid gap-y-2">
        {facts.map(({ name, value }) => (
          <div key={name} className="border-t border-hairline pt-2">
            <dt className="text-small text-umber-soft">{name}</dt>
            <dd className="whitespace-pre-line">{value}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 text-small text-umber-soft">
        {t('sheet.recorded', { name: writer(consent.recordedByName), day: dates.moment(consent.recordedAt) })}
      </p>
      <div className="mt-3 flex flex-wrap gap-3">
        {may.change && <Button onClick={onChange}>{t(isMine ? 'sheet.changeMine' : 'sheet.change')}</Button>}
        <ButtonAnchor href={consentCardUrl(communityId, consent.id)} icon={<Printer aria-hidden size={20} />}>
          {t('sheet.card')}
        </ButtonAnchor>
        {may.withdraw && <Withdraw line={consent} />}
      </div>
      <div className="mt-3">
        <More label={t('sheet.proofs')}>{proofs}</More>
      </div>
    </Board>
  );
}

function Uses({ label, uses, icon }: { label: string; uses: readonly ConsentUse[]; icon: ReactNode }) {
  const { t } = useTranslation('consents');
  return (
    <div>
      <h3 className="text-body font-bold">{label}</h3>
      <ul>
        {uses.map((use) => (
          <li key={use} className="flex items-start gap-2 py-1">
            <span className="mt-1 flex-none">{icon}</span>
            <span>{t(`use.${use}.name`)}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}
