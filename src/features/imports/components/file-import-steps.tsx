import { FileInput } from 'lucide-react';
import { useCallback, useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { megabytes } from '#src/lib/megabytes.js';
import { Button } from '#src/ui/button.js';
import { useFileImport } from '../api/imports-api.js';
import { useStoppable } from '../model/use-stoppable.js';
import { FoundInFile } from './found-in-file.js';
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
  const [onItsWay, setOnItsWay] = useState({ sent: '', of: '', isWhole: true });
  const onProgress = useCallback((sentBytes: number, ofBytes: number) => {
    setOnItsWay({ sent: megabytes(sentBytes), of: megabytes(ofBytes), isWhole: sentBytes >= ofBytes });
  }, []);
  const isOnItsWay = !onItsWay.isWhole;
  useEffect(() => {
    if (isLooked.current) return;
    isLooked.current = true;
    look.mutate({ ...sent, dryRun: true, signal: work.begin(), onProgress });
  }, [look, sent, work, onProgress]);
  const found = look.data;
  return (
    <div className="mt-3 grid gap-3">
      {found && <FoundInFile found={found} />}
      <LongWork
        isPending={look.isPending || bring.isPending}
        problem={bring.error ?? look.error}
        doing={t(bring.isPending ? 'bring.sending' : 'bring.looking')}
        detail={isOnItsWay ? t('bring.onItsWay', onItsWay) : null}
        work={work}
      />
      {found && found.added > 0 && found.unfit.length === 0 && !bring.isPending && (
        <Button
          look="main"
          icon={<FileInput aria-hidden size={20} />}
          onClick={() => {
            bring.mutate(
              { ...sent, dryRun: false, signal: work.begin(), onProgress },
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
