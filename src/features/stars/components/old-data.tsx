import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { StaleLine } from '#src/ui/waiting.js';

/** What is shown could not be brought up to date: since when it stands, and trying again. */
export function OldData({ updatedAt, refetch }: { updatedAt: number; refetch: () => Promise<unknown> }) {
  const { t } = useTranslation('common');
  const words = useDateWords();
  return (
    <div className="mb-3">
      <StaleLine
        onRetry={() => {
          void refetch();
        }}
      >
        {t('offline.stale', { when: words.moment(new Date(updatedAt)) })}
      </StaleLine>
    </div>
  );
}
