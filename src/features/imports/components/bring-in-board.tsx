import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { CALENDAR_ARCHIVE_MAX_BYTES } from '#shared/contracts/calendar-archive.js';
import { CALENDAR_FILE_MAX_BYTES } from '#shared/contracts/calendar-file.js';
import { IMPORT_LINES_MAX } from '#shared/contracts/imports.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { FieldFrame } from '#src/ui/field.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { ARCHIVE_BEGINNING_BYTES, beginsAsArchive } from '../model/archive-beginning.js';
import { readTable, utf8TextOf, type SavedTable } from '../model/read-table.js';
import { FileImportSteps } from './file-import-steps.js';
import { TableImportSteps } from './table-import-steps.js';
import { TemplateChoice } from './template-choice.js';

type Chosen =
  | { kind: 'file'; key: string; file: File }
  | { kind: 'table'; key: string; table: SavedTable }
  | { kind: 'problem'; key: string; sentence: string };

/** Brings a table or a calendar's own file into the draft: chosen, looked at, then brought in whole. */
export function BringInBoard({ calendar }: { calendar: Calendar }) {
  const { t } = useTranslation('imports');
  const fileId = useId();
  const [chosen, setChosen] = useState<Chosen | null>(null);
  const [added, setAdded] = useState<number | null>(null);
  if (calendar.locked) {
    return (
      <Board title={t('bring.title')}>
        <p>{t('bring.locked')}</p>
      </Board>
    );
  }
  const choose = async (file: File | undefined) => {
    if (file === undefined) return;
    setAdded(null);
    const found = await look(file);
    setChosen(
      'problem' in found ? { ...found.problem, sentence: t(found.problem.word, found.problem) } : found,
    );
  };
  const steps = { calendar, onDone: setAdded };
  return (
    <Board title={t('bring.title')}>
      <p className="text-small">{t('bring.what')}</p>
      <TemplateChoice />
      <FieldFrame inputId={fileId} label={t('bring.file')} hint={t('bring.fileHint')} className="mt-3">
        <input
          id={fileId}
          className="inp file-input"
          type="file"
          accept=".csv,.tsv,.txt,.json,.zip,text/csv,application/json,application/zip"
          aria-describedby={`${fileId}-hint`}
          onChange={(event) => void choose(event.currentTarget.files?.[0])}
          onClick={(event) => {
            // The same file, put right in the spreadsheet, may be chosen again.
            event.currentTarget.value = '';
          }}
        />
      </FieldFrame>
      {added !== null ? (
        <div className="mt-3 grid gap-3" role="status">
          <p>{t('bring.done', { count: added })}</p>
          <ButtonLink look="main" to={paths.calendar(calendar.id)}>
            {t('bring.open')}
          </ButtonLink>
        </div>
      ) : (
        <>
          {chosen?.kind === 'problem' && (
            <Care role="alert" className="mt-3">
              <p>{chosen.sentence}</p>
            </Care>
          )}
          {chosen?.kind === 'file' && (
            <FileImportSteps key={chosen.key} sent={{ file: chosen.file, key: chosen.key }} {...steps} />
          )}
          {chosen?.kind === 'table' && (
            <TableImportSteps key={chosen.key} importKey={chosen.key} table={chosen.table} {...steps} />
          )}
        </>
      )}
    </Board>
  );
}

type Unfit = {
  problem: {
    kind: 'problem';
    key: string;
    word: 'bring.notUtf8' | 'bring.noLines' | 'bring.tooMany' | 'bring.tooLarge' | 'bring.zipTooLarge';
    count: number;
  };
};

/** By its beginning, for names of files say little. */
async function look(file: File): Promise<Exclude<Chosen, { kind: 'problem' }> | Unfit> {
  const key = crypto.randomUUID();
  const unfit = (word: Unfit['problem']['word'], count = 0): Unfit => ({
    problem: { kind: 'problem', key, word, count },
  });
  if (beginsAsArchive(await file.slice(0, ARCHIVE_BEGINNING_BYTES).arrayBuffer())) {
    // It is sent as it lies on the device: nobody's telephone holds it whole in memory.
    return file.size > CALENDAR_ARCHIVE_MAX_BYTES ? unfit('bring.zipTooLarge') : { kind: 'file', key, file };
  }
  if (file.size > CALENDAR_FILE_MAX_BYTES) return unfit('bring.tooLarge');
  const text = utf8TextOf(await file.arrayBuffer());
  if (text === null) return unfit('bring.notUtf8');
  if (/^\s*[{[]/u.test(text.replace(/^\ufeff/u, ''))) return { kind: 'file', key, file };
  const table = readTable(text);
  if (table.lines.length === 0) return unfit('bring.noLines');
  if (table.lines.length > IMPORT_LINES_MAX) return unfit('bring.tooMany', table.lines.length);
  return { kind: 'table', key, table };
}
