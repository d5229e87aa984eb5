import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { DEFAULT_SHARING } from '#shared/contracts/attachments.js';
import type { Language } from '#shared/contracts/people.js';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useActing } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import type { SharingOfAttachment } from '../model/kept-recordings.js';
import type { Recorder } from '../model/use-recorder.js';
import { CircleFields } from './circle-fields.js';

interface AboutStepProps {
  recorder: Recorder;
  /** Who hears it, where that is not to be chosen. */
  fixed: SharingOfAttachment | undefined;
}

/** Who speaks, in which language, and who may hear it; as soon as the village's languages are known. */
export function AboutStep({ communityId, ...props }: AboutStepProps & { communityId: string }) {
  const words = useProblemWords();
  const { data: community, error, refetch } = useQuery(communityQuery(communityId));
  if (community) {
    return <AboutForm {...props} languages={[community.villageLanguage, community.officerLanguage]} />;
  }
  if (error === null) return <Skeleton lines={4} />;
  return <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />;
}

function AboutForm({
  recorder,
  languages,
  fixed,
}: AboutStepProps & { languages: readonly [Language, ...Language[]] }) {
  const { t } = useTranslation('attachments');
  const words = useProblemWords();
  const [speaker, setSpeaker] = useState(useActing().displayName);
  const [language, setLanguage] = useState(languages[0].tag);
  const [circle, setCircle] = useState<SharingOfAttachment>(
    fixed ?? {
      sharingLevel: DEFAULT_SHARING.recording.level,
      sharing: DEFAULT_SHARING.recording.details,
      giverId: null,
    },
  );
  const [isChecked, setIsChecked] = useState(false);
  const needsGroup = circle.sharingLevel === 'group' && circle.sharing.groupId === null;
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setIsChecked(true);
        if (speaker.trim() !== '' && !needsGroup) {
          void recorder.tellAbout({ speaker: speaker.trim(), language, ...circle });
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
        value={language}
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
