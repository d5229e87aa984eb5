import { useTranslation } from 'react-i18next';
import type { Community, CommunityPerson } from '#shared/contracts/people.js';
import { Board } from '#src/ui/surfaces.js';
import { useSettingWords } from '../model/setting-words.js';
import { settingsOf, SETTING_GROUPS } from '../model/settings-form.js';

/** The settings as words, for those who do not change them. */
export function SettingsView({
  community,
  elders,
}: {
  community: Community;
  elders: readonly CommunityPerson[];
}) {
  const { t } = useTranslation('people');
  const words = useSettingWords(elders);
  const settings = settingsOf(community);
  const shown = SETTING_GROUPS.filter((field) => field !== 'signOffRule' || elders.length > 0);
  return (
    <Board title={t('settings.title')}>
      <dl className="facts">
        {shown.map((field) => (
          <div key={field}>
            <dt>{words.label(field)}</dt>
            <dd>{words.value(field, settings)}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 text-umber-soft">{t('settings.readOnly')}</p>
    </Board>
  );
}
