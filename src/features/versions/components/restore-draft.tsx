import { History } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import {
  RESTORE_OUTCOMES,
  type RestoredDraft,
  type RestoredEntry,
} from '#shared/contracts/restored-draft.js';
import type { Version } from '#shared/contracts/versions.js';
import { paths } from '#src/lib/paths.js';
import { SureButton } from '#src/lib/sure-button.js';
import { ButtonLink } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { useRestore } from '../api/version-mutations.js';
import { useVersionName } from './use-version-name.js';

/** The officer sets the draft back to this version, and reads what became of each entry. */
export function RestoreDraft({ version }: { version: Version }) {
  const { t } = useTranslation('versions');
  const { calendarId, number } = version;
  const name = useVersionName()(version);
  const say = useToast();
  const restore = useRestore(calendarId, number);
  return (
    <div className="mt-3">
      <SureButton
        label={t('restore.begin')}
        look="quiet"
        icon={<History aria-hidden className="turns" size={20} />}
        question={t('restore.question', { name })}
        what={
          <div className="grid gap-2">
            <p>{t('restore.does', { name })}</p>
            <p>{t('restore.never')}</p>
            <p>{t('restore.nothingAgreed')}</p>
            <Link className="link-line" to={paths.compare(calendarId, { from: 'draft', to: number })}>
              {t('restore.look')}
            </Link>
          </div>
        }
        yes={t('restore.yes', { name })}
        act={async () => {
          await restore.mutateAsync();
          say(t('restore.done', { name }));
        }}
      />
      {restore.data && <RestoredReport report={restore.data} calendarId={calendarId} name={name} />}
    </div>
  );
}

interface RestoredReportProps {
  report: RestoredDraft;
  calendarId: string;
  name: string;
}

/** What it did, entry by entry; what stayed as it was is only counted. */
export function RestoredReport({ report, calendarId, name }: RestoredReportProps) {
  const { t } = useTranslation('versions');
  const { entries, withdrawnCount } = report;
  const groups = RESTORE_OUTCOMES.map((outcome) => ({
    outcome,
    entries: entries.filter((entry) => entry.outcome === outcome),
  })).filter((group) => group.entries.length > 0);
  const kept = entries.filter(({ sharingStays, outcome }) => sharingStays && outcome !== 'taken-out');
  return (
    <section className="mt-3" aria-label={t('restore.reportTitle', { name })}>
      <h3 className="text-body">{t('restore.reportTitle', { name })}</h3>
      <div className="mt-1 grid gap-2" role="status">
        {groups.map(({ outcome, entries: found }) => (
          <div key={outcome}>
            <p>{t(`restore.outcome.${outcome}`, { count: found.length })}</p>
            {outcome !== 'as-it-was' && <Names entries={found} />}
          </div>
        ))}
        {kept.length > 0 && (
          <div>
            <p>{t('restore.sharingStays', { count: kept.length })}</p>
            <Names entries={kept} />
          </div>
        )}
        {withdrawnCount > 0 && <p>{t('restore.withdrawn', { count: withdrawnCount })}</p>}
        <p>
          <ButtonLink to={paths.calendar(calendarId)}>{t('restore.open')}</ButtonLink>
        </p>
      </div>
    </section>
  );
}

function Names({ entries }: { entries: readonly RestoredEntry[] }) {
  const { t } = useTranslation('versions');
  return (
    <ul className="why-moved">
      {entries.map(({ entryId, titleOfficer, leftBecause }) => (
        <li key={entryId}>
          {leftBecause === null
            ? titleOfficer
            : t(`restore.leftBecause.${leftBecause}`, { title: titleOfficer })}
        </li>
      ))}
    </ul>
  );
}
