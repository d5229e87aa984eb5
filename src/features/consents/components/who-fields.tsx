import { useTranslation } from 'react-i18next';
import { CONSENT_GIVERS } from '#shared/contracts/consents.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import { useRoles } from '#src/lib/community.js';
import { PersonSelect } from '#src/lib/sharing-fields.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import type { ConsentForm } from '../model/use-consent-form.js';

/** Who is asked: one person, or somebody who speaks for a group. */
export function WhoFields({ form: { draft, change, at } }: { form: ConsentForm }) {
  const { t } = useTranslation('consents');
  const isKept = draft.giverName === GIVER_BY_ROLE;
  const readsPeople = useRoles().is('steward', 'officer', 'elder');
  return (
    <Board title={t('form.who')}>
      <div className="grid gap-4">
        <PickGroup
          label={t('form.who')}
          labelForEars
          value={draft.givenAs}
          onChange={(givenAs) => {
            change({ givenAs });
          }}
          options={CONSENT_GIVERS.map((value) => ({ value, label: t(`form.${value}`) }))}
        />
        <div className="grid gap-4 mid:grid-cols-2">
          {readsPeople && (
            <PersonSelect
              label={t('form.giver')}
              nobody={t('form.giverNobody')}
              value={draft.giverId}
              problem={at('giverId')}
              onChange={(giverId) => {
                change({ giverId });
              }}
            />
          )}
          <TextField
            label={t('form.giverName')}
            value={isKept ? '' : draft.giverName}
            hint={isKept ? t('form.giverKept') : undefined}
            problem={at('giverName')}
            onChange={(event) => {
              change({ giverName: event.currentTarget.value });
            }}
          />
        </div>
        {draft.givenAs === 'group' && (
          <TextField
            label={t('form.spokeFor')}
            value={draft.spokeFor}
            problem={at('spokeFor')}
            onChange={(event) => {
              change({ spokeFor: event.currentTarget.value });
            }}
          />
        )}
      </div>
    </Board>
  );
}
