import { Mic, Send, Trash2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Attachment } from '#shared/contracts/attachments.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { useToast } from '#src/ui/toast.js';
import { useLookAgain } from '../api/attachments-api.js';
import { sendRecording } from '../model/send-recording.js';
import type { Recorder } from '../model/use-recorder.js';
import { useSending } from '../model/use-sending.js';
import { SendingLine } from './sending-line.js';
import { keptSources, VoicePlayer } from './voice-player.js';

/** The speaker listens; then it is kept with the village, goes on, or is thrown away. */
export function ListenStep({
  recorder,
  onDone,
  onKept,
}: {
  recorder: Recorder;
  onDone: () => void;
  onKept?: ((attachment: Attachment) => void) | undefined;
}) {
  const { t } = useTranslation('attachments');
  const say = useToast();
  const lookAgain = useLookAgain();
  const { recording, parts } = recorder;
  const [title, setTitle] = useState(recording?.title ?? '');
  const sending = useSending(async (watch) => {
    if (recording === null) throw new Error('Nothing was recorded');
    return sendRecording({ ...recording, title: title.trim() }, watch);
  });
  const spoken = parts.filter(({ part }) => part > 0);
  const keepIt = async () => {
    await recorder.setTitle(title.trim());
    const kept = await sending.send();
    if (kept === null) return;
    await lookAgain();
    say(t('sending.done'));
    onDone();
    onKept?.(kept);
  };
  if (recording === null) return null;
  const isSending = sending.share !== null;
  return (
    <div className="grid gap-4">
      <p>{t('listen.lead')}</p>
      <VoicePlayer
        key={`${recording.clientId} ${spoken.length}`}
        name={t('player.name', { speaker: recording.speaker })}
        parts={keptSources(spoken)}
      />
      <TextField
        label={t('listen.about')}
        value={title}
        maxLength={120}
        autoComplete="off"
        onChange={(event) => {
          setTitle(event.currentTarget.value);
        }}
      />
      <SendingLine sending={sending} stoppedWords={t('sending.stopped')} />
      {!isSending && (
        <>
          <Button look="main" full icon={<Send aria-hidden size={22} />} onClick={() => void keepIt()}>
            {sending.trouble === null && !sending.wasStopped ? t('listen.keep') : t('sending.again')}
          </Button>
          <div className="flex flex-wrap justify-between gap-2">
            <Button
              look="quiet"
              icon={<Mic aria-hidden size={20} />}
              onClick={() => {
                recorder.goTo('voice');
              }}
            >
              {t('listen.more')}
            </Button>
            <ThrowAway recorder={recorder} onDone={onDone} />
          </div>
        </>
      )}
    </div>
  );
}

export function ThrowAway({ recorder, onDone }: { recorder: Recorder; onDone: () => void }) {
  const { t } = useTranslation('attachments');
  const say = useToast();
  const throwAway = async () => {
    await recorder.throwAway();
    say(t('listen.thrownAway'));
    onDone();
  };
  return (
    <Button look="quiet" icon={<Trash2 aria-hidden size={20} />} onClick={() => void throwAway()}>
      {t('listen.throwAway')}
    </Button>
  );
}
