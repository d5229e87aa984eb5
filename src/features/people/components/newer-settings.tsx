import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { CommunityInput, CommunityPerson } from '#shared/contracts/people.js';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { useSettingWords } from '../model/setting-words.js';
import { differingSettings, type SettingGroup } from '../model/settings-form.js';

/** Two people changed the settings: both texts of every line that differs, and a choice for each. */
export function NewerSettings({
  yours,
  theirs,
  elders,
  onChosen,
}: {
  yours: CommunityInput;
  theirs: CommunityInput;
  elders: readonly CommunityPerson[];
  onChosen: (settings: CommunityInput) => void;
}) {
  const { t } = useTranslation('people');
  const words = useSettingWords(elders);
  const [takeTheirs, setTakeTheirs] = useState<Partial<Record<SettingGroup, boolean>>>({});
  const take = () => {
    const taken = Object.fromEntries(
      differingSettings(yours, theirs)
        .filter((field) => takeTheirs[field])
        .map((field) => [field, theirs[field]]),
    );
    onChosen({ ...yours, ...taken });
  };
  return (
    <Board title={t('settings.newerTitle')} role="alert">
      <p className="mb-3">{t('settings.newerHint')}</p>
      <div className="grid gap-4">
        {differingSettings(yours, theirs).map((field) => (
          <PickGroup
            key={field}
            label={words.label(field)}
            stacked
            value={takeTheirs[field] ? 'theirs' : 'yours'}
            onChange={(choice) => {
              setTakeTheirs((before) => ({ ...before, [field]: choice === 'theirs' }));
            }}
            options={[
              { value: 'yours', label: words.value(field, yours), note: t('settings.yours') },
              { value: 'theirs', label: words.value(field, theirs), note: t('settings.theirs') },
            ]}
          />
        ))}
      </div>
      <div className="mt-4">
        <Button onClick={take}>{t('settings.takeChosen')}</Button>
      </div>
    </Board>
  );
}
