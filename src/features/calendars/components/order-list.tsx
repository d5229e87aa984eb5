import { ArrowDown, ArrowUp, CalendarArrowDown, GripVertical } from 'lucide-react';
import { useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { classNames } from '#src/ui/class-names.js';
import { Button, IconButton } from '#src/ui/button.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { moved } from '../model/entry-order.js';
import { placeUnder } from '../model/drop-place.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';

interface Drag {
  id: string;
  from: number;
  to: number;
}

/** The entries to be put in order: by dragging, with the arrow keys on the grip, or step by step. */
export function OrderList({ editor, actions }: { editor: Editor; actions: EntryActions }) {
  const { t } = useTranslation('calendars');
  const list = useRef<HTMLOListElement>(null);
  const [drag, setDrag] = useState<Drag | null>(null);
  const [said, setSaid] = useState('');
  const saved = editor.shown.filter((entry) => entry.saved !== null);
  const entries = drag === null ? saved : moved(saved, drag.from, drag.to);
  const title = (entry: ShownEntry) => entry.content.titleOfficer || t('editor.untitled');

  const move = (entry: ShownEntry, from: number, to: number) => {
    if (to < 0 || to >= saved.length) return;
    actions.move(from, to);
    setSaid(t('order.movedTo', { title: title(entry), position: to + 1, total: saved.length }));
  };
  const grip = (entry: ShownEntry, index: number) => ({
    onKeyDown: (event: KeyboardEvent) => {
      const step = event.key === 'ArrowUp' ? -1 : event.key === 'ArrowDown' ? 1 : 0;
      if (step === 0) return;
      event.preventDefault();
      move(entry, index, index + step);
    },
    onPointerDown: (event: PointerEvent) => {
      event.currentTarget.setPointerCapture(event.pointerId);
      setDrag({ id: entry.id, from: index, to: index });
    },
    onPointerMove: (event: PointerEvent) => {
      if (drag === null || list.current === null) return;
      const to = placeUnder(event.clientY, rowMiddles(list.current));
      if (to !== drag.to) setDrag({ ...drag, to });
    },
    onPointerUp: () => {
      if (drag !== null && drag.to !== drag.from) move(entry, drag.from, drag.to);
      setDrag(null);
    },
    onPointerCancel: () => {
      setDrag(null);
    },
  });

  return (
    <>
      <p className="mb-2 text-small text-umber-soft">{t('order.hint')}</p>
      <p className="for-ears" role="status">
        {said}
      </p>
      <ol ref={list} className="entry-list">
        {entries.map((entry, index) => (
          <li key={entry.id} className={classNames('order-row', drag?.id === entry.id && 'dragged')}>
            <button
              type="button"
              className="order-grip"
              aria-label={t('order.drag', { title: title(entry) })}
              {...grip(entry, index)}
            >
              <GripVertical aria-hidden size={24} />
            </button>
            <SignIcon sign={entry.content.icon} size={28} />
            <span className="min-w-0">{title(entry)}</span>
            <span className="flex gap-1">
              <IconButton
                label={t('order.up', { title: title(entry) })}
                icon={<ArrowUp aria-hidden size={20} />}
                closed={index === 0}
                onClick={() => {
                  move(entry, index, index - 1);
                }}
              />
              <IconButton
                label={t('order.down', { title: title(entry) })}
                icon={<ArrowDown aria-hidden size={20} />}
                closed={index === entries.length - 1}
                onClick={() => {
                  move(entry, index, index + 1);
                }}
              />
            </span>
          </li>
        ))}
      </ol>
      <Button
        className="mt-3"
        icon={<CalendarArrowDown aria-hidden size={20} />}
        onClick={actions.sortByDate}
      >
        {t('order.byDate')}
      </Button>
    </>
  );
}

function rowMiddles(list: HTMLElement): number[] {
  return [...list.children].map((row) => {
    const { top, height } = row.getBoundingClientRect();
    return top + height / 2;
  });
}
