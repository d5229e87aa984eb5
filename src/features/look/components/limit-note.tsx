import { useTranslation } from 'react-i18next';
import type { Look } from '#shared/contracts/look.js';
import { Care } from '#src/ui/surfaces.js';

/** When to stop, or to begin, in the largest letters of the page. */
export function LimitNote({ look: { side, limitAt, sunCourse } }: { look: Look }) {
  const { t } = useTranslation('look');
  if (sunCourse === 'stays-up') return null;
  return (
    <Care>
      <p className="text-page wide:text-date">
        {limitAt === null ? t('limit.polarNight') : t(`limit.${side}`, { time: limitAt })}
      </p>
      <p>{t('limit.neverSun')}</p>
    </Care>
  );
}
