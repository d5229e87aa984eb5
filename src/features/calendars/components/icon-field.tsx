import { useTranslation } from 'react-i18next';
import { ENTRY_ICONS } from '#shared/contracts/calendars.js';
import { More } from '#src/ui/fold.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { PickGroup } from '#src/ui/pick.js';
import type { FormState } from '../model/form-state.js';

/** The picture that stands for the entry on the board; the others come out on demand. */
export function IconField({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at } = form;
  return (
    <div>
      <p className="field-label">{t('form.icon')}</p>
      <p className="flex items-center gap-3">
        <SignIcon sign={draft.icon} size={40} />
        {t(`icon.${draft.icon}`)}
      </p>
      <More label={t('form.changeIcon')}>
        <PickGroup
          className="icon-picks"
          label={t('form.icon')}
          labelForEars
          value={draft.icon}
          problem={at('icon')}
          onChange={(icon) => {
            change({ icon });
          }}
          options={ENTRY_ICONS.map((icon) => ({
            value: icon,
            label: t(`icon.${icon}`),
            icon: <SignIcon sign={icon} size={32} />,
          }))}
        />
      </More>
    </div>
  );
}
