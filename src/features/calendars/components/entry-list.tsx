import { ArrowDownUp, Check, Plus } from 'lucide-react';
import { useEffect, useMemo, useRef, useState, type RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { KeptLine } from '#src/lib/kept-line.js';
import { MoreOfThem } from '#src/lib/shown-part.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { kindsIn, ofKind } from '../model/kind-filter.js';
import { FIRST_PART, foundBy, LIST_PART, partWith } from '../model/list-part.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import { thingsToLookAt } from '../model/advice-of-all.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { yearSpan } from '../model/year-span.js';
import { EntryRow } from './entry-row.js';
import { KindFilter, WarnedFilter } from './list-filters.js';
import { OrderList } from './order-list.js';

/** So many are looked through without a choice of kinds. */
const FEW_ENTRIES = 7;

/** The entries in their order; on a wide screen beside the form, on a phone the first view. */
export function EntryList({ editor, actions }: { editor: Editor; actions: EntryActions }) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const [isOrdering, setIsOrdering] = useState(false);
  const { calendar, shown, selected, selection, canWrite, answers, advice } = editor;
  const [isOnlyWarned, setIsOnlyWarned] = useState(false);
  const warningsOf = (entry: ShownEntry) => thingsToLookAt(entry, advice.get(entry.id));
  const warned = shown.filter((entry) => warningsOf(entry) > 0);
  const kinds = useMemo(() => kindsIn(shown), [shown]);
  const [wantedKind, setWantedKind] = useState<string | null>(null);
  const onlyKind = kinds.some(({ key }) => key === wantedKind) ? wantedKind : null;
  const ofThisKind = ofKind(shown, onlyKind, selected?.id ?? null);
  // The open one stays, so that its last warning does not take it away under somebody's hands.
  const listed = isOnlyWarned
    ? ofThisKind.filter((entry) => warningsOf(entry) > 0 || entry.id === selected?.id)
    : ofThisKind;
  const { isWide } = selection;
  const span = useMemo(() => yearSpan(calendar.year), [calendar.year]);
  const list = useOpenRowInSight(selected?.id ?? null);
  const months = useMemo(() => dates.months(calendar.year), [dates, calendar.year]);
  const monthStarts = useMemo(() => months.slice(1).map(({ dayNumber }) => dayNumber), [months]);
  const [wanted, setWanted] = useState('');
  const found = foundBy(listed, wanted);
  const [drawn, setDrawn] = useState(FIRST_PART);
  const part = partWith(
    drawn,
    found.findIndex(({ id }) => id === selected?.id),
  );
  const left = found.length - part.to;
  return (
    <section aria-label={t('editor.list')}>
      {!isOrdering && (
        <div className="mb-3 grid gap-3 empty:hidden">
          {(warned.length > 0 || isOnlyWarned) && (
            <WarnedFilter
              count={warned.length}
              isOn={isOnlyWarned}
              onChange={(isOn) => {
                setIsOnlyWarned(isOn);
                setDrawn(FIRST_PART);
              }}
            />
          )}
          {kinds.length > 1 && shown.length > FEW_ENTRIES && (
            <KindFilter
              kinds={kinds}
              chosen={onlyKind}
              onChange={(key) => {
                setWantedKind(key);
                setDrawn(FIRST_PART);
              }}
            />
          )}
        </div>
      )}
      {!isOrdering && shown.length > LIST_PART && (
        <div className="mb-3">
          <TextField
            type="search"
            label={t('editor.search')}
            value={wanted}
            onChange={(event) => {
              setWanted(event.target.value);
              setDrawn(FIRST_PART);
            }}
          />
          <p className="text-small text-umber-soft" role="status">
            {wanted.trim() !== '' && t('editor.found', { count: found.length, total: listed.length })}
          </p>
        </div>
      )}
      {!isOrdering && part.from > 0 && (
        <Button
          className="mb-3"
          onClick={() => {
            setDrawn({ from: Math.max(0, part.from - LIST_PART), to: part.to });
          }}
        >
          {t('editor.before', { count: part.from })}
        </Button>
      )}
      {!isWide && !isOrdering && (
        <div className="entry-scale">
          <MonthScale span={span} months={months} />
        </div>
      )}
      {isOrdering ? (
        <OrderList editor={editor} actions={actions} />
      ) : (
        <ol ref={list} className="entry-list" start={part.from + 1}>
          {found.slice(part.from, part.to).map((entry) => (
            <li key={entry.id}>
              <EntryRow
                entry={entry}
                calendarId={calendar.id}
                year={calendar.year}
                isOpen={entry.id === selected?.id}
                isWide={isWide}
                answers={answers.get(entry.id)}
                warnings={warningsOf(entry)}
                span={span}
                monthStarts={monthStarts}
              />
            </li>
          ))}
        </ol>
      )}
      {!isOrdering && left > 0 && (
        <MoreOfThem
          left={left}
          more={() => {
            setDrawn({ from: part.from, to: part.to + LIST_PART });
          }}
        />
      )}
      <KeptLine keptCount={editor.keptCount} />
      {canWrite && (
        <div className="mt-3 flex flex-wrap gap-3">
          {isWide && (
            <Button icon={<Plus aria-hidden size={20} />} onClick={selection.openNew}>
              {t(editor.isKeeper ? 'editor.addOwn' : 'editor.add')}
            </Button>
          )}
          {editor.canOrder && shown.length > 1 && (
            <Button
              icon={isOrdering ? <Check aria-hidden size={20} /> : <ArrowDownUp aria-hidden size={20} />}
              aria-pressed={isOrdering}
              onClick={() => {
                setIsOrdering(!isOrdering);
              }}
            >
              {t(isOrdering ? 'order.done' : 'order.change')}
            </Button>
          )}
        </div>
      )}
    </section>
  );
}

/** Brings the row of the open entry into the list's own view; the page itself stays where it is. */
function useOpenRowInSight(openId: string | null): RefObject<HTMLOListElement | null> {
  const list = useRef<HTMLOListElement>(null);
  useEffect(() => {
    const box = list.current;
    const row = box?.querySelector('[aria-current]')?.closest('li');
    if (!box || !row || openId === null) return;
    const { top, bottom } = row.getBoundingClientRect();
    const view = box.getBoundingClientRect();
    if (top < view.top) box.scrollTop -= view.top - top;
    else if (bottom > view.bottom) box.scrollTop += bottom - view.bottom;
  }, [openId]);
  return list;
}
