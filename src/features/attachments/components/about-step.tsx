import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { DEFAULT_SHARING } from '#shared/contracts/attachments.js';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useActing } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import type { SharingOfAttachment } from '../model/kept-recordings.js';
import type { Recorder } from '../model/use-recorder.js';
import { CircleFields } from './circle-fields.js';

/** Who speaks, in which language, and who may hear it. */
export function AboutStep({
  recorder,
  communityId,
  fixed,
}: {
  recorder: Recorder;
  communityId: string;
  /** Who hears it, where that is not to be chosen. */
  fixed: SharingOfAttachment | undefined;
}) {
  const { t } = useTranslation('attachments');
  const words = useProblemWords();
  const { data: community } = useQuery(communityQuery(communityId));
  const languages = community ? [community.villageLanguage, community.officerLanguage] : [];
  const [speaker, setSpeaker] = useState(useActing().displayName);
  const [language, setLanguage] = useState<string | null>(null);
  const [circle, setCircle] = useState<SharingOfAttachment>(
    fixed ?? {
      sharingLevel: DEFAULT_SHARING.recording.level,
      sharing: DEFAULT_SHARING.recording.details,
      giverId: null,
    },
  );
  const [isChecked, setIsChecked] = useState(false);
  const needsGroup = circle.sharingLevel === 'group' && circle.sharing.groupId === null;
  const chosen = language ?? languages[0]?.tag ?? '';
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setIsChecked(true);
        if (speaker.trim() !== '' && chosen !== '' && !needsGroup) {
          void recorder.tellAbout({ speaker: speaker.trim(), language: chosen, ...circle });
        }
      }}
    >
      <TextField
        label={t('about.speaker')}
        hint={t('about.speakerHint')}
        value={speaker}
        maxLength={80}
        autoComplete="off"
        problem={isChecked && speaker.trim() === '' ? words.field('required') : undefined}
        onChange={(event) => {
          setSpeaker(event.currentTarget.value);
        }}
      />
      <SelectField
        label={t('about.language')}
        value={chosen}
        onChange={(event) => {
          setLanguage(event.currentTarget.value);
        }}
      >
        {languages.map(({ tag, name }) => (
          <option key={tag} value={tag}>
            {name}
          </option>
        ))}
      </SelectField>
      {fixed === undefined ? (
        <CircleFields
          label={t('about.level')}
          value={circle}
          groupProblem={isChecked && needsGroup ? words.field('choose-group') : undefined}
          onChange={setCircle}
        />
      ) : (
        <p className="text-umber-soft">{t('about.sameCircle')}</p>
      )}
      <Button type="submit" look="main" full>
        {t('about.next')}
      </Button>
    </form>
  );
}
