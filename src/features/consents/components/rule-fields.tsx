import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { AFTER_DEATH, CONSENT_WITHDRAWERS } from '#shared/contracts/consents.js';
import { NAMINGS } from '#shared/contracts/sharing.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { groupsQuery } from '#src/lib/sharing-queries.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import type { ConsentForm } from '../model/use-consent-form.js';
import { TickSet } from './tick-set.js';

/** What goes with a yes: the name, how long it holds, what comes after, who may take it back. */
export function RuleFields({ form: { draft, change, at } }: { form: ConsentForm }) {
  const { t } = useTranslation('consents');
  const { communityId } = useCurrentCommunity();
  const groups = useQuery(groupsQuery(communityId)).data ?? [];
  return (
    <Board title={t('form.rules')}>
      <div className="grid gap-4 mid:grid-cols-2">
        <PickGroup
          label={t('form.naming')}
          hint={t('form.namingHint')}
          stacked
          value={draft.naming}
          onChange={(naming) => {
            change({ naming });
          }}
          options={NAMINGS.map((value) => ({ value, label: t(`naming.${value}`) }))}
        />
        <TickSet
          label={t('form.mayWithdraw')}
          hint={t('form.mayWithdrawHint')}
          values={CONSENT_WITHDRAWERS}
          words={(who) => t(`withdrawer.${who}`)}
          chosen={draft.mayWithdraw}
          onChange={(mayWithdraw) => {
            const byGroup = mayWithdraw.includes('family') || mayWithdraw.includes('group');
            change({ mayWithdraw, ...(byGroup ? {} : { withdrawGroupId: null }) });
          }}
        />
        {(draft.mayWithdraw.includes('family') || draft.mayWithdraw.includes('group')) && (
          <SelectField
            label={t('form.withdrawGroup')}
            value={draft.withdrawGroupId ?? ''}
            problem={at('withdrawGroupId')}
            onChange={(event) => {
              const chosen = event.currentTarget.value;
              change({ withdrawGroupId: chosen === '' ? null : chosen });
            }}
          >
            <option value="">{t('form.withdrawGroupNone')}</option>
            {groups.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </SelectField>
        )}
        <TextField
          type="date"
          label={t('form.reviewBy')}
          hint={t('form.reviewByHint')}
          value={draft.reviewBy}
          problem={at('reviewBy')}
          onChange={(event) => {
            change({ reviewBy: event.currentTarget.value });
          }}
        />
        <TextField
          type="date"
          label={t('form.until')}
          hint={t('form.untilHint')}
          value={draft.until ?? ''}
          problem={at('until')}
          onChange={(event) => {
            change({ until: event.currentTarget.value === '' ? null : event.currentTarget.value });
          }}
        />
        <SelectField
          label={t('form.afterDeath')}
          value={draft.afterDeath ?? ''}
          problem={at('afterDeath')}
          onChange={(event) => {
            change({ afterDeath: AFTER_DEATH.find((one) => one === event.currentTarget.value) ?? null });
          }}
        >
          <option value="">{t('form.afterDeathNone')}</option>
          {AFTER_DEATH.map((value) => (
            <option key={value} value={value}>
              {t(`afterDeath.${value}`)}
            </option>
          ))}
        </SelectField>
        {draft.afterDeath === 'pass-to' && (
          <TextField
            label={t('form.passTo')}
            value={draft.passTo}
            problem={at('passTo')}
            onChange={(event) => {
              change({ passTo: event.currentTarget.value });
            }}
          />
        )}
        <TextField
          label={t('form.benefits')}
          value={draft.benefits}
          problem={at('benefits')}
          onChange={(event) => {
            change({ benefits: event.currentTarget.value });
          }}
        />
      </div>
    </Board>
  );
}
