import { Square, Volume2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import { PACES, useReader, type Pace } from '../model/use-reader.js';

/** Offered only where this device has a voice for the language. */
export function ReadAloud({ language, sentences }: { language: string; sentences: readonly string[] }) {
  const { t } = useTranslation('reviews');
  const reader = useReader(language);
  if (!reader.canRead) return null;
  return (
    <div className="grid gap-2">
      <Button
        full
        icon={
          reader.isReading ? (
            <Square aria-hidden size={22} fill="currentColor" />
          ) : (
            <Volume2 aria-hidden size={24} className="turns" />
          )
        }
        onClick={() => {
          if (reader.isReading) reader.stop();
          else reader.read(sentences);
        }}
      >
        {reader.isReading ? t('aloud.stop') : t('aloud.read')}
      </Button>
      <PickGroup
        label={t('aloud.pace')}
        labelForEars
        value={reader.pace}
        onChange={reader.choosePace}
        options={(Object.keys(PACES) as Pace[]).map((value) => ({ value, label: t(`aloud.${value}`) }))}
      />
    </div>
  );
}
