import { useTranslation } from 'react-i18next';
import { CONSENT_USES, type ConsentUse } from '#shared/contracts/consents.js';
import { FieldNotes, TickField } from '#src/ui/field.js';

/** Each use is its own tick, with one sentence why it matters. What was said last time is told, never ticked. */
export function UseTicks({
  chosen,
  before,
  problem,
  onChange,
}: {
  chosen: readonly ConsentUse[];
  before: readonly ConsentUse[];
  problem: string | undefined;
  onChange: (uses: ConsentUse[]) => void;
}) {
  const { t } = useTranslation('consents');
  return (
    <fieldset>
      <legend className="field-label">{t('form.uses')}</legend>
      <p className="mb-3 text-small text-umber-soft">{t('form.usesHint')}</p>
      {before.length > 0 && (
        <p className="mb-3">
          {t('form.lastTime', { uses: before.map((use) => t(`use.${use}.short`)).join(' · ') })}
        </p>
      )}
      <div className="grid gap-3 mid:grid-cols-2">
        {CONSENT_USES.map((use) => (
          <TickField
            key={use}
            label={t(`use.${use}.name`)}
            hint={t(`use.${use}.why`)}
            checked={chosen.includes(use)}
            onChange={(event) => {
              const others = chosen.filter((one) => one !== use);
              onChange(event.currentTarget.checked ? [...others, use] : others);
            }}
          />
        ))}
      </div>
      <FieldNotes inputId="consent-uses" problem={problem} />
    </fieldset>
  );
}
