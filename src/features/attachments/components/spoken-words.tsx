import { Mic } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { DEFAULT_SHARING, type AttachmentSubject } from '#shared/contracts/attachments.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { useKeptRecordings, type Unsent } from '../model/use-kept-recordings.js';
import { KeptAttachments } from './kept-attachments.js';
import { UnsentNotice } from './unsent-notice.js';
import { VoiceRecorder } from './voice-recorder.js';

interface SpokenWordsProps {
  communityId: string;
  subject: AttachmentSubject;
  /** Whoever reads what it is said to hears it, or the elders among them. */
  level: 'village' | 'elders';
  /** How many there are; none are asked for where there are none. */
  count: number;
  /** Opens the recorder at once. */
  begins: boolean;
  maySpeak: boolean;
  onSaid: () => void;
}

/** Voices that belong to a remark: listen to them, and say something. Who hears them is said by the remark. */
export function SpokenWords({
  communityId,
  subject,
  level,
  count,
  begins,
  maySpeak,
  onSaid,
}: SpokenWordsProps) {
  const { t } = useTranslation('attachments');
  const personId = useSession().person?.id ?? '';
  const { seesDrafts: mayAdd } = useRolesIn(communityId);
  const [found, setFound] = useState<Unsent | null>(null);
  const [opened, setOpened] = useState<boolean | null>(null);
  const isOn = opened ?? begins;
  const { unsent, lookAgain } = useKeptRecordings(personId, subject);
  const circle = {
    sharingLevel: level,
    sharing: DEFAULT_SHARING.recording.details,
    giverId: null,
  };
  const speaks = mayAdd && maySpeak;
  return (
    <div className="grid gap-3">
      {count > 0 && <KeptAttachments communityId={communityId} subject={subject} isQuiet />}
      {speaks &&
        !isOn &&
        unsent.map((each) => (
          <UnsentNotice
            key={each.recording.clientId}
            unsent={each}
            onOpen={() => {
              setFound(each);
              setOpened(true);
            }}
          />
        ))}
      {speaks && isOn && (
        <VoiceRecorder
          communityId={communityId}
          subject={subject}
          circle={circle}
          found={found}
          onDone={() => {
            setOpened(false);
            setFound(null);
            void lookAgain();
            onSaid();
          }}
        />
      )}
      {speaks && !isOn && (
        <div>
          <Button
            look="quiet"
            icon={<Mic aria-hidden size={20} />}
            onClick={() => {
              setOpened(true);
            }}
          >
            {t('speak')}
          </Button>
        </div>
      )}
    </div>
  );
}
