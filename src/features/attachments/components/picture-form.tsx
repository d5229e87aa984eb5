import { ImagePlus, Send } from 'lucide-react';
import { useEffect, useId, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  DEFAULT_SHARING,
  PICTURE_MAX_BYTES,
  type AttachmentSubject,
  type ConsentWay,
} from '#shared/contracts/attachments.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { describedBy, FieldNotes, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { beginAttachment } from '../api/attachment-uploads.js';
import { useLookAgain } from '../api/attachments-api.js';
import type { SharingOfAttachment } from '../model/kept-recordings.js';
import { newId } from '#src/lib/new-id.js';
import { useChosenPicture } from '../model/use-chosen-picture.js';
import { useSending } from '../model/use-sending.js';
import { CircleFields } from './circle-fields.js';
import { SendingLine } from './sending-line.js';

interface PictureFormProps {
  communityId: string;
  subject: AttachmentSubject;
  onDone: () => void;
}

interface Problems {
  picture?: string | undefined;
  title?: string | undefined;
  consent?: string | undefined;
  group?: string | undefined;
}

const MEGABYTE = 1024 * 1024;
const ANSWERS = ['asked', 'nobody-shown'] as const satisfies ConsentWay[];

/** Choose a picture, say what it shows, and that everybody in it agreed. */
export function PictureForm({ communityId, subject, onDone }: PictureFormProps) {
  const { t } = useTranslation(['attachments', 'common']);
  const words = useProblemWords();
  const say = useToast();
  const lookAgain = useLookAgain();
  const inputId = useId();
  const { picture, choose, previewUrl, problem } = useChosenPicture();
  // Sent again after a broken line it is the same picture.
  const [clientId] = useState(newId);
  const [title, setTitle] = useState('');
  const [consent, setConsent] = useState<(typeof ANSWERS)[number] | null>(null);
  const [circle, setCircle] = useState<SharingOfAttachment>({
    sharingLevel: DEFAULT_SHARING.picture.level,
    sharing: DEFAULT_SHARING.picture.details,
    giverId: null,
  });
  const [isChecked, setIsChecked] = useState(false);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus({ preventScroll: true });
  }, []);
  const sending = useSending(async (watch) => {
    if (picture === null || consent === null) return null;
    const input = { clientId, kind: 'picture', title, speaker: '', language: null, consent } as const;
    return beginAttachment(communityId, { ...input, ...circle, ...subject }, picture, watch);
  });
  const megabytes = PICTURE_MAX_BYTES / MEGABYTE;
  const problems: Problems = {
    picture:
      problem === 'tooLarge'
        ? t('picture.tooLarge', { size: ((picture?.size ?? 0) / MEGABYTE).toFixed(1), megabytes })
        : problem === 'notAPicture'
          ? t('picture.notAPicture')
          : picture === null
            ? t('picture.needed')
            : undefined,
    title: title.trim() === '' ? words.field('required') : undefined,
    consent: consent === null ? t('picture.chooseOne') : undefined,
    group:
      circle.sharingLevel === 'group' && circle.sharing.groupId === null
        ? words.field('choose-group')
        : undefined,
  };
  const isWhole = Object.values(problems).every((each) => each === undefined);
  const shown: Problems = isChecked ? problems : { picture: problem === null ? undefined : problems.picture };
  const keep = async () => {
    setIsChecked(true);
    if (!isWhole || (await sending.send()) === null) return;
    await lookAgain();
    say(t('sending.done'));
    onDone();
  };
  const hint = t('picture.chooseHint', { megabytes });
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void keep();
      }}
    >
      <h3 ref={heading} tabIndex={-1}>
        {t('picture.title')}
      </h3>
      <div className="field">
        {previewUrl !== null && (
          <img className="chosen-picture" src={previewUrl} alt={t('picture.preview')} />
        )}
        <label className="btn file-key" htmlFor={inputId}>
          <ImagePlus aria-hidden size={22} />
          {picture === null ? t('picture.choose') : t('picture.another')}
        </label>
        <input
          id={inputId}
          type="file"
          className="for-ears"
          accept="image/jpeg,image/png,image/webp"
          aria-invalid={shown.picture !== undefined || undefined}
          aria-describedby={describedBy(inputId, { label: '', hint, problem: shown.picture })}
          onChange={(event) => {
            choose(event.currentTarget.files?.[0] ?? null);
          }}
        />
        <FieldNotes inputId={inputId} hint={hint} problem={shown.picture} />
      </div>
      <TextField
        label={t('picture.what')}
        hint={t('picture.whatHint')}
        value={title}
        maxLength={120}
        autoComplete="off"
        problem={shown.title}
        onChange={(event) => {
          setTitle(event.currentTarget.value);
        }}
      />
      <Care>
        <p>{t('picture.faces')}</p>
      </Care>
      <PickGroup
        label={t('picture.consent')}
        stacked
        value={consent}
        problem={shown.consent}
        options={ANSWERS.map((value) => ({
          value,
          label: t(value === 'asked' ? 'picture.asked' : 'picture.nobodyShown'),
        }))}
        onChange={setConsent}
      />
      <CircleFields
        label={t('picture.level')}
        value={circle}
        groupProblem={shown.group}
        onChange={setCircle}
      />
      <SendingLine sending={sending} stoppedWords={t('sending.stoppedPicture')} />
      {sending.share === null && (
        <>
          <Button type="submit" look="main" full icon={<Send aria-hidden size={22} />}>
            {sending.trouble === null && !sending.wasStopped ? t('picture.keep') : t('sending.again')}
          </Button>
          <Button look="quiet" onClick={onDone}>
            {t('common:cancel')}
          </Button>
        </>
      )}
    </form>
  );
}
