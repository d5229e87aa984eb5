import { useEffect, useMemo, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords, type NamesByKey } from '#src/lib/entry-words.js';
import { MoreOfThem, useShownPart } from '#src/lib/shown-part.js';
import { Table } from '#src/ui/table.js';
import { OFFSETS } from '../model/offsets.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { StripRowFields, type StripRowWays } from './strip-row-fields.js';

const COLUMNS = ['entry', 'lead', 'earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;
const DAYS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;

interface StripTableProps {
  entries: readonly ShownEntry[];
  year: number;
  markers: NamesByKey;
  /** Names and days can be written here; null where they are only read. */
  ways: (StripRowWays & { mayWrite: (entry: ShownEntry) => boolean }) | null;
}

/** The strip as a table, which can be written in. */
export function StripTable({ entries, year, markers, ways }: StripTableProps) {
  const { t } = useTranslation(['calendars', 'strip']);
  const dates = useDateWords();
  const words = useEntryWords();
  const steady = useSteady(ways);
  const part = useShownPart(entries);
  const days = ({ content, dates: found }: ShownEntry) =>
    found?.window ? (
      DAYS.map((day) => (
        <td key={day} className="whitespace-nowrap">
          {found.window && dates.day(found.window[day], 'short')}
        </td>
      ))
    ) : (
      <td colSpan={DAYS.length}>{words.window(content, null, year)}</td>
    );
  return (
    <>
      <Table caption={t('strip.tableCaption', { year })} middle>
        <thead>
          <tr>
            <th scope="col">{t('strip.column.entry')}</th>
            {ways &&
              [...OFFSETS, 'save' as const].map((column) => (
                <th key={column} scope="col">
                  {t(`strip:column.${column}`)}
                </th>
              ))}
            {COLUMNS.slice(1).map((column) => (
              <th key={column} scope="col">
                {t(`strip.column.${column}`)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {part.shown.map((entry) => (
            <tr key={entry.id}>
              {ways?.mayWrite(entry) === true ? (
                <StripRowFields
                  entryId={entry.id}
                  title={entry.content.titleOfficer}
                  offsets={entry.content.offsets}
                  unsaved={entry.unsaved}
                  ways={steady}
                />
              ) : (
                <>
                  <th scope="row">{entry.content.titleOfficer || t('editor.untitled')}</th>
                  {ways && <td colSpan={OFFSETS.length + 1} />}
                </>
              )}
              <td className="min-w-56">{words.leadAlone(entry.content, markers)}</td>
              {days(entry)}
            </tr>
          ))}
        </tbody>
      </Table>
      <MoreOfThem {...part} />
    </>
  );
}

/** The same functions at every drawing, so that a row is drawn again only where it changed. */
function useSteady(ways: StripRowWays | null): StripRowWays {
  const latest = useRef(ways);
  useEffect(() => {
    latest.current = ways;
  });
  return useMemo(
    () => ({
      rename: (entryId, title) => latest.current?.rename(entryId, title),
      setOffset: (entryId, name, days) => latest.current?.setOffset(entryId, name, days),
      save: (entryId) => latest.current?.save(entryId),
    }),
    [],
  );
}
