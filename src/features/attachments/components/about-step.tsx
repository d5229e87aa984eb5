import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { ATTACHMENT_LEVELS, DEFAULT_LEVEL, type AttachmentLevel } from '#shared/contracts/attachments.js';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import type { Recorder } from '../model/use-recorder.js';

/** Who speaks, in which language, and who may hear it. */
export function AboutStep({ recorder, communityId }: { recorder: Recorder; communityId: string }) {
  const { t } = useTranslation('attachments');
  const words = useProblemWords();
  const { data: community } = useQuery(communityQuery(communityId));
  const languages = community ? [community.villageLanguage, community.officerLanguage] : [];
  const [speaker, setSpeaker] = useState(useSession().person?.displayName ?? '');
  const [language, setLanguage] = useState<string | null>(null);
  const [level, setLevel] = useState<AttachmentLevel>(DEFAULT_LEVEL.recording);
  const [isMissing, setIsMissing] = useState(false);
  const chosen = language ?? languages[0]?.tag ?? '';
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setIsMissing(speaker.trim() === '');
        if (speaker.trim() !== '' && chosen !== '') {
          void recorder.tellAbout({ speaker: speaker.trim(), language: chosen, level });
        }
      }}
    >
      <TextField
        label={t('about.speaker')}
        hint={t('about.speakerHint')}
        value={speaker}
        maxLength={80}
        autoComplete="off"
        problem={isMissing ? words.field('required') : undefined}
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
      <PickGroup
        label={t('about.level')}
        stacked
        value={level}
        options={ATTACHMENT_LEVELS.map((value) => ({
          value,
          label: t(`level.${value}`),
          note: t(`level.${value}Note`),
        })).reverse()}
        onChange={setLevel}
      />
      <Button type="submit" look="main" full>
        {t('about.next')}
      </Button>
    </form>
  );
}
