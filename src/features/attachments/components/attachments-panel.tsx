import { ImagePlus, Mic } from 'lucide-react';
import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { useActing } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { classNames } from '#src/ui/class-names.js';
import { useKeptRecordings, type Unsent } from '../model/use-kept-recordings.js';
import { KeptAttachments } from './kept-attachments.js';
import { PictureForm } from './picture-form.js';
import { UnsentNotice } from './unsent-notice.js';
import { VoiceRecorder } from './voice-recorder.js';

interface AttachmentsPanelProps {
  communityId: string;
  subject: AttachmentSubject;
  /** A board of its own, or a part of the page that it stands on. */
  look?: 'board' | 'plain' | undefined;
}

type Doing = { kind: 'record'; found: Unsent | null } | { kind: 'picture' } | null;

/** Voices and pictures of one thing: what is there, what waits on this device, and the ways to add more. */
export function AttachmentsPanel({ communityId, subject, look = 'board' }: AttachmentsPanelProps) {
  const { t } = useTranslation('attachments');
  const headingId = useId();
  const personId = useActing().id;
  // Whoever sees drafts may add: officers, elders and stewards.
  const { seesDrafts: mayAdd } = useRolesIn(communityId);
  const [doing, setDoing] = useState<Doing>(null);
  const { unsent, lookAgain } = useKeptRecordings(personId, subject);
  const done = () => {
    setDoing(null);
    void lookAgain();
  };
  return (
    <section
      className={classNames('attachments', look === 'board' && 'board', doing !== null && 'busy')}
      aria-labelledby={headingId}
    >
      <h2 id={headingId}>{t('title')}</h2>
      {doing === null &&
        mayAdd &&
        unsent.map((each) => (
          <UnsentNotice
            key={each.recording.clientId}
            unsent={each}
            onOpen={() => {
              setDoing({ kind: 'record', found: each });
            }}
          />
        ))}
      {doing?.kind === 'record' && (
        <VoiceRecorder communityId={communityId} subject={subject} found={doing.found} onDone={done} />
      )}
      {doing?.kind === 'picture' && <PictureForm communityId={communityId} subject={subject} onDone={done} />}
      {doing === null && mayAdd && (
        <div className="flex flex-wrap gap-3">
          <Button
            icon={<Mic aria-hidden size={22} />}
            onClick={() => {
              setDoing({ kind: 'record', found: null });
            }}
          >
            {t('record')}
          </Button>
          <Button
            icon={<ImagePlus aria-hidden size={22} />}
            onClick={() => {
              setDoing({ kind: 'picture' });
            }}
          >
            {t('addPicture')}
          </Button>
        </div>
      )}
      <KeptAttachments communityId={communityId} subject={subject} isQuiet={doing !== null} />
    </section>
  );
}
