import { Mic, Square } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { secondsOf } from '../model/length-words.js';
import type { Microphone } from '../model/use-microphone.js';
import type { Recorder } from '../model/use-recorder.js';
import { LiveVoice } from './live-voice.js';
import { keptSources, VoicePlayer } from './voice-player.js';

/** The spoken agreement comes first, as a clip of its own. */
export function ConsentStep({ recorder }: { recorder: Recorder }) {
  const { t } = useTranslation('attachments');
  const { microphone, parts } = recorder;
  const clip = parts.filter(({ part }) => part === 0);
  const isThere = clip.length > 0 && !microphone.isOn;
  return (
    <div className="grid gap-4">
      {isThere ? (
        <>
          <p>{t('consent.heard')}</p>
          <VoicePlayer
            key={clip[0]?.content.size}
            name={t('consent.clip')}
            parts={keptSources(clip)}
            isClip
          />
          <Button
            look="main"
            full
            onClick={() => {
              recorder.goTo('voice');
            }}
          >
            {t('consent.next')}
          </Button>
          <Button look="quiet" onClick={() => void recorder.againConsent()}>
            {t('consent.again')}
          </Button>
        </>
      ) : (
        <>
          <p>{t('consent.lead')}</p>
          <p className="text-lead">{t('consent.say')}</p>
          <p className="text-umber-soft">{t('consent.freely')}</p>
          <RecordKey recorder={recorder} words={t('consent.record')} before={0} />
        </>
      )}
    </div>
  );
}

/** Record and stop; nothing else. */
export function VoiceStep({ recorder }: { recorder: Recorder }) {
  const { t } = useTranslation('attachments');
  return (
    <div className="grid gap-4">
      <p>{t('voice.lead')}</p>
      <p className="text-umber-soft">{t('voice.kept')}</p>
      <RecordKey recorder={recorder} words={t('voice.record')} before={secondsOf(recorder.parts)} />
    </div>
  );
}

function RecordKey({ recorder, words, before }: { recorder: Recorder; words: string; before: number }) {
  const { t } = useTranslation('attachments');
  const { isOn, stream, part } = recorder.microphone;
  return (
    <>
      <Trouble microphone={recorder.microphone} />
      {isOn && stream !== null && <LiveVoice stream={stream} before={before} part={part} />}
      {/* One button that changes its words: the focus stays on it, and "stop" is where "record" was. */}
      <Button
        look="main"
        full
        className="record-key"
        icon={isOn ? <Square aria-hidden size={24} fill="currentColor" /> : <Mic aria-hidden size={26} />}
        onClick={() => {
          void (isOn ? recorder.stop() : recorder.record());
        }}
      >
        {isOn ? t('voice.stop') : words}
      </Button>
    </>
  );
}

function Trouble({ microphone: { trouble } }: { microphone: Microphone }) {
  const { t } = useTranslation('attachments');
  if (trouble === null) return null;
  return (
    <Care role="alert">
      <p>{t(`trouble.${trouble}`)}</p>
    </Care>
  );
}
