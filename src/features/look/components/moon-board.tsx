import { useTranslation } from 'react-i18next';
import type { Look } from '#shared/contracts/look.js';
import { Board } from '#src/ui/surfaces.js';
import { useLookWords } from '../model/use-look-words.js';

/** Whether the Moon is up then, what it looks like, and what its light does. */
export function MoonBoard({ look: { moon } }: { look: Look }) {
  const { t } = useTranslation('look');
  const words = useLookWords();
  if (moon === null) return null;
  const shape = t(`moon.shape.${moon.shape}`);
  return (
    <Board title={t('moon.title')}>
      <p>
        {moon.isUp
          ? t('moon.up', {
              shape,
              compass: words.compass(moon.azimuthDeg),
              hands: words.hands(moon.aboveSkylineDeg),
            })
          : t('moon.down', { shape })}
      </p>
      {moon.isUp && <p className="mt-1">{t(`moon.light.${moon.moonlight}`)}</p>}
    </Board>
  );
}
