import { useTranslation } from 'react-i18next';
import type { EntryOffsets } from '#shared/contracts/calendars.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { useLaneWords } from '#src/lib/lane-words.js';
import { listWords } from '#src/lib/list-words.js';
import { markerName, type NamesByKey } from '#src/lib/marker-names.js';
import { More } from '#src/ui/fold.js';
import { useSignLanes } from '#src/lib/sign-lanes.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { LaneKey, WindowKey } from '#src/ui/pictures/lane-key.js';
import { YearBoard } from '#src/ui/pictures/year-board.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { barsOf, besideOf, lanesOf, pairingOf, undatedOf, unledOf } from '../model/strip-model.js';
import type { Editor } from '../model/use-editor.js';
import type { DraftChange } from '../model/use-entry-edits.js';
import type { SaveEntry } from '../model/use-save-entry.js';
import { useStrip } from '../model/use-strip.js';
import { changeEntry, mayWriteHere, useStripMoves } from '../model/use-strip-moves.js';
import { ScaleTable } from './scale-table.js';
import { StripTable } from './strip-table.js';
import { StripSettings, StripTools } from './strip-tools.js';

const NO_NAMES: NamesByKey = new Map();

/** The year above the list and the form: every star in use as a lane, every entry as a bar. */
export function EditorStrip({ editor, saving }: { editor: Editor; saving: SaveEntry }) {
  const { t, i18n } = useTranslation(['calendars', 'sky', 'strip']);
  const words = useEntryWords();
  const laneWords = useLaneWords();
  const today = useToday(editor);
  const { calendar, shown, selected, markers, selection, canWrite } = editor;
  const { year } = calendar;
  const strip = useStrip(editor);
  const moves = useStripMoves(editor, strip.zoomBy);
  const byKey = markers.data?.byKey ?? null;
  const signLanes = useSignLanes(shown, byKey ?? NO_NAMES);
  const nameOf = (entry: ShownEntry) => entry.content.titleOfficer || t('editor.untitled');
  const without = [
    ['strip.unled', unledOf(shown)],
    ['strip.undated', undatedOf(shown)],
    ['strip:beside', besideOf(shown, strip.whole)],
  ] as const;
  const inTable = (entryId: string, change: DraftChange) => {
    const entry = shown.find(({ id }) => id === entryId);
    if (entry) changeEntry(editor, entry, change);
  };
  const ways = {
    mayWrite: (entry: ShownEntry) => mayWriteHere(editor, entry),
    rename: (entryId: string, titleOfficer: string) => {
      inTable(entryId, { titleOfficer });
    },
    setOffset: (entryId: string, name: keyof EntryOffsets, days: number) => {
      inTable(entryId, ({ offsets }) => ({ offsets: { ...offsets, [name]: days } }));
    },
    save: (entryId: string) => void saving.saveOne(entryId),
  };
  const label =
    selected === null
      ? t('strip.picture', { year, count: shown.length })
      : t('strip.pictureChosen', {
          year,
          count: shown.length,
          title: nameOf(selected),
          lead: words.lead(selected.content, byKey ?? NO_NAMES),
        });
  return (
    <section className="board mb-4" aria-label={t('strip.label')}>
      <StripTools
        strip={strip}
        unsavedCount={editor.unsavedIds.length}
        isSaving={saving.isSaving}
        onSaveAll={() => void saving.saveAll()}
      />
      <YearBoard
        span={strip.span}
        months={strip.months}
        secondScale={strip.second ?? undefined}
        lanes={[
          ...lanesOf(shown, byKey).map((row) => ({
            key: row.markerKey,
            name: markerName(row),
            icon: <MarkerIcon markerKey={row.markerKey} size={20} />,
            segments: row.strip,
            label: laneWords(markerName(row), row.strip),
          })),
          ...signLanes,
        ]}
        bars={barsOf(shown, nameOf)}
        barsName={t('strip.work')}
        label={label}
        today={today}
        chosen={selected?.id ?? null}
        pairing={pairingOf(selected)}
        onChoose={selection.open}
        moves={canWrite ? moves : undefined}
      />
      {markers.isError && <p className="text-small">{t('editor.stripTrouble')}</p>}
      {without.map(
        ([key, entries]) =>
          entries.length > 0 && (
            <p key={key} className="text-small text-umber-soft">
              {t(key, {
                year,
                count: entries.length,
                titles: listWords(entries.map(nameOf), i18n.language),
              })}
            </p>
          ),
      )}
      <div className="flex flex-wrap gap-x-6">
        <More label={t('strip.howToRead')}>
          {canWrite && <p>{t('strip:howToMove')}</p>}
          <LaneKey />
          <div className="mt-2">
            <WindowKey kinds={['best', 'margin', 'watch', 'fixed']} />
          </div>
        </More>
        <More lazy label={t('strip.asTable')}>
          <StripTable entries={shown} year={year} markers={byKey ?? NO_NAMES} ways={canWrite ? ways : null} />
        </More>
        <More label={t('strip:tools')}>
          <StripSettings strip={strip} community={editor.community} />
        </More>
        {strip.second && <ScaleTable {...strip.second} />}
      </div>
    </section>
  );
}

/** Today at the calendar's place. */
function useToday({ calendar }: Editor): number {
  const { places } = useCurrentPlace();
  const place = places.find((each) => each.id === calendar.placeId);
  return dayNumberOf(todayIn(place?.timeZone ?? null));
}
