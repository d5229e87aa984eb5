import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import type { Attachment, AttachmentSubject } from '#shared/contracts/attachments.js';
import { useActing } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import type { SharingOfAttachment } from '../model/kept-recordings.js';
import type { Unsent } from '../model/use-kept-recordings.js';
import { recordingClosed } from '../model/use-microphone.js';
import { useRecorder, type RecorderStep } from '../model/use-recorder.js';
import { AboutStep } from './about-step.js';
import { ListenStep, ThrowAway } from './listen-step.js';
import { ConsentStep, VoiceStep } from './recording-steps.js';

interface VoiceRecorderProps {
  communityId: string;
  subject: AttachmentSubject;
  /** One that was found on this device; null to begin anew. */
  found: Unsent | null;
  /** Who hears it, where that is not to be chosen. */
  circle?: SharingOfAttachment | undefined;
  /** Sent, thrown away, or left for later. */
  onDone: () => void;
  /** It is with the village now. */
  onKept?: ((attachment: Attachment) => void) | undefined;
}

const TITLES = {
  about: 'about.title',
  consent: 'consent.title',
  voice: 'voice.title',
  listen: 'listen.title',
} as const satisfies Record<RecorderStep, string>;

/** Who speaks – the agreement – record – stop – listen – keep. One step at a time. */
export function VoiceRecorder({ communityId, subject, circle, found, onDone, onKept }: VoiceRecorderProps) {
  const { t } = useTranslation(['attachments', 'common']);
  const personId = useActing().id;
  const recorder = useRecorder({ ...subject, communityId, personId, found });
  const { step, microphone } = recorder;
  const heading = useFocusOnStep(step);
  const closed = recordingClosed();
  const isReady = !microphone.isOn && step !== 'listen';
  return (
    <section className="grid gap-3" aria-labelledby="recorder-title">
      <h3 id="recorder-title" ref={heading} tabIndex={-1}>
        {t(`attachments:${TITLES[step]}`)}
      </h3>
      {closed !== null && step !== 'listen' ? (
        <Care>
          <p>{t(`attachments:trouble.${closed}`)}</p>
        </Care>
      ) : (
        <>
          {step === 'about' && <AboutStep recorder={recorder} communityId={communityId} fixed={circle} />}
          {step === 'consent' && <ConsentStep recorder={recorder} />}
          {step === 'voice' && <VoiceStep recorder={recorder} />}
        </>
      )}
      {step === 'listen' && <ListenStep recorder={recorder} onDone={onDone} onKept={onKept} />}
      {isReady && (
        <div className="flex flex-wrap justify-between gap-2">
          <Button look="quiet" onClick={onDone}>
            {t('common:cancel')}
          </Button>
          {recorder.recording !== null && <ThrowAway recorder={recorder} onDone={onDone} />}
        </div>
      )}
    </section>
  );
}

/** Each step is read from its title. */
function useFocusOnStep(step: RecorderStep) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus();
  }, [step]);
  return heading;
}
