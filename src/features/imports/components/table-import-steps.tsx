import { ListChecks } from 'lucide-react';
import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { ImportColumn, TableInput } from '#shared/contracts/imports.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { keep, readKept } from '#src/lib/device-storage.js';
import { Button } from '#src/ui/button.js';
import { useTableImport } from '../api/imports-api.js';
import {
  guessColumns,
  keptMatching,
  matchAnew,
  matchedLines,
  type Matching,
} from '../model/match-columns.js';
import type { SavedTable } from '../model/read-table.js';
import { wordsNobodyKnows } from '../model/unknown-words.js';
import { isExample } from '../model/template.js';
import { tableLanguageOf, wordsOfTables } from '../model/table-languages.js';
import { useStoppable } from '../model/use-stoppable.js';
import { LongWork } from './long-work.js';
import { MatchFields } from './match-fields.js';
import { NatureSigns } from './nature-signs.js';
import { ReadLines } from './read-lines.js';

interface TableImportStepsProps {
  calendar: Calendar;
  /** The same for all that is sent of this table. */
  importKey: string;
  table: SavedTable;
  onDone: (added: number) => void;
}

/** A table: which column is what, what each line becomes, then bringing all of them in. */
export function TableImportSteps({ calendar, importKey, table, onDone }: TableImportStepsProps) {
  const { t, i18n } = useTranslation('imports');
  const own = i18n.resolvedLanguage ?? DEFAULT_LANGUAGE;
  const { titles, examples, titleOf } = useMemo(
    () => wordsOfTables(tableLanguageOf(table.titles, own)),
    [table.titles, own],
  );
  const keptAt = `import-columns.${table.titles.join('|')}`;
  const [matching, setMatching] = useState<Matching>(
    () => keptMatching(readKept(keptAt), table.titles) ?? guessColumns(table.titles, titles),
  );
  const [dayOrder, setDayOrder] = useState<TableInput['dayOrder']>(null);
  /** Words that no list knows, as they came up when the lines were looked at; and which of them are signs of nature. */
  const [unknownWords, setUnknownWords] = useState<readonly string[]>([]);
  const [natureSigns, setNatureSigns] = useState<readonly string[]>([]);
  const look = useTableImport(calendar.id);
  const bring = useTableImport(calendar.id);
  const work = useStoppable();

  const all = matchedLines(table, matching);
  const lines = all.filter((line) => !isExample(line, examples));
  const send = { key: importKey, dayOrder, lines, natureSigns: [...natureSigns] };
  /** As the table itself calls it, where it has the column. */
  const columnName = (column: ImportColumn) => {
    const title = table.titles[matching.indexOf(column)] ?? '';
    return title === '' ? titleOf(column) : title;
  };
  const changed = (change: () => void) => {
    change();
    look.reset();
    bring.reset();
  };
  return (
    <div className="mt-4 grid gap-4">
      <MatchFields
        table={table}
        matching={matching}
        dayOrder={dayOrder}
        onMatch={(index, column) => {
          changed(() => {
            const next = matchAnew(matching, index, column);
            setMatching(next);
            keep(keptAt, next);
          });
        }}
        onOrder={(order) => {
          changed(() => {
            setDayOrder(order);
          });
        }}
      />
      <NatureSigns
        words={unknownWords}
        chosen={natureSigns}
        onChoose={(next) => {
          changed(() => {
            setNatureSigns(next);
          });
        }}
      />
      {all.length > lines.length && <p>{t('match.examples', { count: all.length - lines.length })}</p>}
      <Button
        icon={<ListChecks aria-hidden size={20} />}
        busy={look.isPending}
        closedBecause={lines.length === 0 ? t('bring.noLines') : undefined}
        onClick={() => {
          look.mutate(
            { ...send, dryRun: true, signal: work.begin() },
            {
              onSuccess: (read) => {
                setUnknownWords([...new Set([...natureSigns, ...wordsNobodyKnows(lines, read.lines)])]);
              },
            },
          );
        }}
      >
        {t('match.look')}
      </Button>
      <LongWork
        isPending={look.isPending || bring.isPending}
        problem={bring.error ?? look.error}
        doing={t(bring.isPending ? 'bring.sending' : 'bring.looking')}
        work={work}
      />
      {look.data && (
        <ReadLines
          lines={look.data.lines}
          columnName={columnName}
          calendar={calendar}
          isBusy={bring.isPending}
          onBring={() => {
            bring.mutate(
              { ...send, dryRun: false, signal: work.begin() },
              {
                onSuccess: ({ added }) => {
                  onDone(added);
                },
              },
            );
          }}
        />
      )}
    </div>
  );
}
