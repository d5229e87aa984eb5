import { FileInput } from 'lucide-react';
import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { Button } from '#src/ui/button.js';
import { useFileImport } from '../api/imports-api.js';
import { useStoppable } from '../model/use-stoppable.js';
import { LongWork } from './long-work.js';

interface FileImportStepsProps {
  calendar: Calendar;
  sent: { file: File; key: string };
  onDone: (added: number) => void;
}

/** A calendar's own file: what would come in and what stays out, then bringing it in. */
export function FileImportSteps({ calendar, sent, onDone }: FileImportStepsProps) {
  const { t } = useTranslation('imports');
  const look = useFileImport(calendar.id);
  const bring = useFileImport(calendar.id);
  const work = useStoppable();
  const isLooked = useRef(false);
  useEffect(() => {
    if (isLooked.current) return;
    isLooked.current = true;
    look.mutate({ ...sent, dryRun: true, signal: work.begin() });
  }, [look, sent, work]);
  const found = look.data;
  return (
    <div className="mt-3 grid gap-3">
      {found && (
        <div role="status">
          <p>
            {t('file.from', {
              place: found.from.placeName,
              year: found.from.year,
              issue: found.from.label ?? t('file.draft'),
            })}
          </p>
          <p className="mt-1">{t('file.adds', { count: found.added })}</p>
          {found.refused > 0 && <p className="mt-1">{t('file.refused', { count: found.refused })}</p>}
          {found.seasonAdded > 0 && <p className="mt-1">{t('file.season', { count: found.seasonAdded })}</p>}
          {found.seasonLeft > 0 && (
            <p className="mt-1">{t('file.seasonLeft', { count: found.seasonLeft })}</p>
          )}
          {found.mediaLeft > 0 && <p className="mt-1">{t('file.media', { count: found.mediaLeft })}</p>}
          <p className="mt-1 text-small">{t('file.levels')}</p>
        </div>
      )}
      <LongWork
        isPending={look.isPending || bring.isPending}
        problem={bring.error ?? look.error}
        doing={t(bring.isPending ? 'bring.sending' : 'bring.looking')}
        work={work}
      />
      {found && found.added > 0 && !bring.isPending && (
        <Button
          look="main"
          icon={<FileInput aria-hidden size={20} />}
          onClick={() => {
            bring.mutate(
              { ...sent, dryRun: false, signal: work.begin() },
              {
                onSuccess: ({ added }) => {
                  onDone(added);
                },
              },
            );
          }}
        >
          {t('lines.bring', { count: found.added })}
        </Button>
      )}
    </div>
  );
}
