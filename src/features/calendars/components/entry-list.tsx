import { ArrowDownUp, Check, Plus } from 'lucide-react';
import { useEffect, useRef, useState, type RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { KeptLine } from '#src/lib/kept-line.js';
import { Button } from '#src/ui/button.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import { yearSpan } from '../model/year-span.js';
import { EntryRow } from './entry-row.js';
import { OrderList } from './order-list.js';

/** The entries in their order; on a wide screen beside the form, on a phone the first view. */
export function EntryList({ editor, actions }: { editor: Editor; actions: EntryActions }) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const [isOrdering, setIsOrdering] = useState(false);
  const { calendar, shown, selected, selection, canWrite, answers } = editor;
  const { isWide } = selection;
  const span = yearSpan(calendar.year);
  const list = useOpenRowInSight(selected?.id ?? null);
  const months = dates.months(calendar.year);
  return (
    <section aria-label={t('editor.list')}>
      {!isWide && !isOrdering && (
        <div className="entry-scale">
          <MonthScale span={span} months={months} />
        </div>
      )}
      {isOrdering ? (
        <OrderList editor={editor} actions={actions} />
      ) : (
        <ol ref={list} className="entry-list">
          {shown.map((entry) => (
            <li key={entry.id}>
              <EntryRow
                entry={entry}
                calendarId={calendar.id}
                year={calendar.year}
                isOpen={entry.id === selected?.id}
                isWide={isWide}
                answers={answers.get(entry.id)}
                span={span}
                monthStarts={months.slice(1).map(({ dayNumber }) => dayNumber)}
              />
            </li>
          ))}
        </ol>
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
