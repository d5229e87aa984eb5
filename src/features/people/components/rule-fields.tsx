import { Controller, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { CommunityPerson } from '#shared/contracts/people.js';
import { TickField } from '#src/ui/field.js';
import { Stepper } from '#src/ui/stepper.js';
import { Board, Care } from '#src/ui/surfaces.js';
import type { SettingsPartProps } from './settings-fields.js';

/** Who has to sign. Elders who are named one by one cannot leave the village unnoticed. */
export function RuleFields({ form, at, elders }: SettingsPartProps & { elders: readonly CommunityPerson[] }) {
  const { t } = useTranslation('people');
  const said = at('signOffRule');
  return (
    <Board title={t('settings.rule')}>
      <div className="grid gap-4">
        <p className="text-umber-soft">{t('settings.ruleHint')}</p>
        {said !== undefined && (
          <Care blocked>
            <p>{said}</p>
          </Care>
        )}
        <Controller
          control={form.control}
          name="signOffRule.minElders"
          render={({ field }) => (
            <Stepper
              label={t('settings.minElders')}
              value={field.value}
              onChange={field.onChange}
              min={1}
              max={Math.max(1, elders.length)}
            />
          )}
        />
        {elders.length === 0 ? (
          <p>{t('settings.noElders')}</p>
        ) : (
          <>
            <ElderTicks
              form={form}
              name="signOffRule.mustSign"
              label={t('settings.mustSign')}
              elders={elders}
            />
            <ElderTicks form={form} name="signOffRule.oneOf" label={t('settings.oneOf')} elders={elders} />
          </>
        )}
        <TickField {...form.register('signOffRule.steward')} label={t('settings.steward')} />
      </div>
    </Board>
  );
}

function ElderTicks({
  form,
  name,
  label,
  elders,
}: {
  form: SettingsPartProps['form'];
  name: 'signOffRule.mustSign' | 'signOffRule.oneOf';
  label: string;
  elders: readonly CommunityPerson[];
}) {
  const chosen = useWatch({ control: form.control, name });
  return (
    <fieldset>
      <legend className="field-label">{label}</legend>
      {elders.map(({ id, displayName }) => (
        <TickField
          key={id}
          label={displayName}
          checked={chosen.includes(id)}
          onChange={(event) => {
            const { checked } = event.currentTarget;
            const next = checked ? [...chosen, id] : chosen.filter((each) => each !== id);
            form.setValue(name, next, { shouldDirty: true });
          }}
        />
      ))}
    </fieldset>
  );
}
