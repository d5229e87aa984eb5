import { useQuery } from '@tanstack/react-query';
import { FileArchive, FileJson } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { CALENDAR_ARCHIVE_MAX_BYTES } from '#shared/contracts/calendar-archive.js';
import { exportsEndpoints } from '#shared/contracts/exports.js';
import { apiUrl } from '#src/lib/api-client.js';
import { megabytes } from '#src/lib/megabytes.js';
import { ButtonAnchor } from '#src/ui/button.js';
import { takeAlongQuery } from '../api/exports-api.js';

/** The calendar whole: alone, or with the voices and pictures that may go along, with their size beforehand. */
export function TakeWhole({ params }: { params: { calendarId: string; number: string } }) {
  const { t } = useTranslation('exports');
  const { data: along } = useQuery(takeAlongQuery(params.calendarId, params.number));
  const hasFiles = along !== undefined && along.voices + along.pictures > 0;
  return (
    <>
      <ButtonAnchor
        href={apiUrl(exportsEndpoints.json, { params })}
        download
        icon={<FileJson aria-hidden size={20} />}
      >
        {t('along.json')}
      </ButtonAnchor>
      {along && (hasFiles || along.stays > 0) && (
        <div className="grid gap-2">
          {hasFiles && (
            <ButtonAnchor
              href={apiUrl(exportsEndpoints.archive, { params })}
              download
              icon={<FileArchive aria-hidden size={20} />}
            >
              {t('along.zip', { size: megabytes(along.bytes) })}
            </ButtonAnchor>
          )}
          <div className="grid gap-1 text-small">
            {along.voices > 0 && <p>{t('along.voices', { count: along.voices })}</p>}
            {along.pictures > 0 && <p>{t('along.pictures', { count: along.pictures })}</p>}
            {along.stays > 0 && <p>{t('along.stays', { count: along.stays })}</p>}
            {along.bytes > CALENDAR_ARCHIVE_MAX_BYTES && <p>{t('along.tooLarge')}</p>}
          </div>
        </div>
      )}
    </>
  );
}
