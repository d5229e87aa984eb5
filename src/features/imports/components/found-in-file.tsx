import { useTranslation } from 'react-i18next';
import type { FileImport } from '#shared/contracts/imports.js';
import { Care } from '#src/ui/surfaces.js';

/** What would come in with a calendar's own file, what stays out, and what of its voices and pictures does not fit. */
export function FoundInFile({ found }: { found: FileImport }) {
  const { t } = useTranslation('imports');
  const { from, unfit } = found;
  const issue = from.label ?? t('file.draft');
  const said = [
    ...(found.refused > 0 ? [t('file.refused', { count: found.refused })] : []),
    ...(found.seasonAdded > 0 ? [t('file.season', { count: found.seasonAdded })] : []),
    ...(found.seasonLeft > 0 ? [t('file.seasonLeft', { count: found.seasonLeft })] : []),
    ...(found.voices > 0 ? [t('file.voices', { count: found.voices })] : []),
    ...(found.pictures > 0 ? [t('file.pictures', { count: found.pictures })] : []),
    ...(found.mediaLeft > 0 ? [t('file.media', { count: found.mediaLeft })] : []),
  ];
  return (
    <>
      <div role="status" className="grid gap-1">
        <p>{t('file.from', { place: from.placeName, year: from.year, issue })}</p>
        <p>{t('file.adds', { count: found.added })}</p>
        {said.map((sentence) => (
          <p key={sentence}>{sentence}</p>
        ))}
        <p className="text-small">{t('file.levels')}</p>
      </div>
      {unfit.length > 0 && (
        <Care role="alert">
          <p>{t('file.unfitTitle')}</p>
          <ul className="mt-1 list-disc ps-5">
            {unfit.map(({ title, fault }, index) => (
              <li key={`${String(index)} ${title}`}>{t(`file.unfit.${fault}`, { title })}</li>
            ))}
          </ul>
          <p className="mt-1">{t('file.unfitWhat')}</p>
        </Care>
      )}
    </>
  );
}
