import { Lock } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { VersionState } from '#shared/contracts/versions.js';
import { paths } from '#src/lib/paths.js';
import { Well } from '#src/ui/surfaces.js';

/** Why the draft cannot be written to, and the way out. */
export function LockedNote({
  calendar,
  state,
  unsavedCount,
  action,
}: {
  calendar: Calendar;
  /** Of the submission that is out; null while it is not known. */
  state: VersionState | null;
  unsavedCount: number;
  action: ReactNode;
}) {
  const { t } = useTranslation('calendars');
  const number = calendar.outNumber;
  const reason = state === 'in-review' || state === 'signed-off' ? state : 'out';
  return (
    <Well className="mb-4 flex gap-3">
      <Lock aria-hidden size={24} />
      <div>
        <h2 className="text-lead">{t('locked.title')}</h2>
        {number !== null && <p>{t(`locked.${reason}`, { number })}</p>}
        {unsavedCount > 0 && <p className="text-small">{t('locked.unsavedWait')}</p>}
        <div className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-2">
          {action}
          {number !== null && (
            <Link className="link-line" to={paths.version(calendar.id, number)}>
              {t('locked.see', { number })}
            </Link>
          )}
        </div>
      </div>
    </Well>
  );
}
