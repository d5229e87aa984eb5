import { Mic, Square } from 'lucide-react';
import { useEffect, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { VoiceClip } from '#src/lib/voice-clip.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { VoiceKey } from '#src/ui/voice-key.js';

/** Their yes in their own voice, recorded with the form and sent with it. */
export function ClipFields({ voice }: { voice: VoiceClip }) {
  const { t } = useTranslation('consents');
  const { isOn, clip, isRefused } = voice;
  return (
    <div className="grid gap-3">
      <p>{t('clip.lead')}</p>
      {isRefused && (
        <Care role="alert">
          <p>{t('clip.refused')}</p>
        </Care>
      )}
      <div className="flex flex-wrap gap-3">
        <Button
          icon={isOn ? <Square aria-hidden size={20} fill="currentColor" /> : <Mic aria-hidden size={22} />}
          onClick={() => {
            if (isOn) voice.stop();
            else void voice.start();
          }}
        >
          {t(isOn ? 'clip.stop' : clip === null ? 'clip.record' : 'clip.again')}
        </Button>
        {clip !== null && !isOn && <Heard clip={clip} />}
      </div>
      {clip !== null && !isOn && <p className="text-small text-umber-soft">{t('clip.goesAlong')}</p>}
    </div>
  );
}

function Heard({ clip }: { clip: Blob }) {
  const { t } = useTranslation('consents');
  const source = useMemo(() => URL.createObjectURL(clip), [clip]);
  useEffect(
    () => () => {
      URL.revokeObjectURL(source);
    },
    [source],
  );
  return <VoiceKey key={source} label={t('clip.listen')} source={source} />;
}
