import { useTranslation } from 'react-i18next';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { useLaneWords } from '#src/lib/lane-words.js';
import { listWords } from '#src/lib/list-words.js';
import { markerName, type NamesByKey } from '#src/lib/marker-names.js';
import { More } from '#src/ui/fold.js';
import { useSignLanes } from '#src/lib/sign-lanes.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { LaneKey, WindowKey } from '#src/ui/pictures/lane-key.js';
import type { MovePart } from '#src/ui/pictures/day-handles.js';
import { YearBoard } from '#src/ui/pictures/year-board.js';
import type { FormState } from '../model/form-state.js';
import { endMoved, shifted, startMoved } from '../model/offsets.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { barsOf, lanesOf, pairingOf, undatedOf } from '../model/strip-model.js';
import type { Editor } from '../model/use-editor.js';
import { yearSpan } from '../model/year-span.js';
import { StripTable } from './strip-table.js';

const NO_NAMES: NamesByKey = new Map();

/** The year above the list and the form: every star in use as a lane, every entry as a bar. */
export function EditorStrip({ editor, form }: { editor: Editor; form: FormState | null }) {
  const { t, i18n } = useTranslation(['calendars', 'sky']);
  const dates = useDateWords();
  const words = useEntryWords();
  const laneWords = useLaneWords();
  const today = useToday(editor);
  const { calendar, shown, selected, markers, selection, canWriteSelected } = editor;
  const { year } = calendar;
  const byKey = markers.data?.byKey ?? null;
  const signLanes = useSignLanes(shown, byKey ?? NO_NAMES);
  const nameOf = (entry: ShownEntry) => entry.content.titleOfficer || t('editor.untitled');
  const undated = undatedOf(shown);
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
      <YearBoard
        span={yearSpan(year)}
        months={dates.months(year)}
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
        onMove={
          canWriteSelected && form && !editor.stale ? (part, days) => moveDays(form, part, days) : undefined
        }
        handleWords={selected ? handleWords(selected) : undefined}
      />
      {markers.isError && <p className="text-small">{t('editor.stripTrouble')}</p>}
      {undated.length > 0 && shown.length > 0 && (
        <p className="text-small text-umber-soft">
          {t('strip.undated', {
            year,
            count: undated.length,
            titles: listWords(undated.map(nameOf), i18n.language),
          })}
        </p>
      )}
      <div className="flex flex-wrap gap-x-6">
        <More label={t('strip.howToRead')}>
          <LaneKey />
          <div className="mt-2">
            <WindowKey kinds={['best', 'margin', 'watch', 'fixed']} />
          </div>
        </More>
        <More label={t('strip.asTable')}>
          <StripTable entries={shown} year={year} markers={byKey ?? new Map()} />
        </More>
      </div>
    </section>
  );

  function handleWords(entry: ShownEntry) {
    const title = nameOf(entry);
    const { window } = entry.dates ?? { window: null };
    return {
      label: {
        all: t('strip.move.all', { title }),
        start: t('strip.move.start', { title }),
        end: t('strip.move.end', { title }),
      },
      value: {
        all: window ? words.windowSentence(window) : '',
        start: window ? dates.day(window.earliest) : '',
        end: window ? dates.day(window.lastAdvised) : '',
      },
    };
  }
}

function moveDays(form: FormState, part: MovePart, days: number): void {
  const change = { all: shifted, start: startMoved, end: endMoved }[part];
  form.change(({ offsets }) => ({ offsets: change(offsets, days) }));
}

/** Today at the calendar's place. */
function useToday({ calendar }: Editor): number {
  const { places } = useCurrentPlace();
  const place = places.find((each) => each.id === calendar.placeId);
  return dayNumberOf(todayIn(place?.timeZone ?? null));
}
