import { CircleDot } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { WaitingItem } from '#shared/contracts/today.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { CountPegs } from '#src/ui/pegs.js';
import { Board } from '#src/ui/surfaces.js';
import { TaskList } from '#src/ui/task-list.js';
import { useWaitingWords } from '../model/waiting-words.js';

const ICONS: Record<WaitingItem['kind'], ReactNode> = {
  'answer-entries': <StateIcon state="in-review" size={24} />,
  'sign-as-elder': <StateIcon state="in-review" size={24} />,
  'sign-as-steward': <StateIcon state="in-review" size={24} />,
  'elder-asked-change': <StateIcon state="changes-asked" size={24} />,
  'elder-said-not-for-board': <StateIcon state="changes-asked" size={24} />,
  'review-progress': <StateIcon state="in-review" size={24} />,
  'ready-to-publish': <StateIcon state="signed-off" size={24} />,
  'go-on-with-draft': <StateIcon state="draft" size={24} />,
  'print-published': <CircleDot aria-hidden size={24} />,
};

/** What waits for this person: who and what in each line. */
export function WaitingBoard({ items }: { items: readonly WaitingItem[] }) {
  const { t } = useTranslation('today');
  const wordsOf = useWaitingWords();
  if (items.length === 0) return null;
  return (
    <Board title={t('waiting.title')}>
      <TaskList
        tasks={items.map((item) => ({
          key: `${item.kind} ${item.calendarId} ${item.entryId ?? ''} ${item.personName ?? ''}`,
          icon: ICONS[item.kind],
          ...wordsOf(item),
          ...(item.of > 0 &&
          item.of <= 24 &&
          (item.kind === 'answer-entries' || item.kind === 'review-progress')
            ? { extra: <CountPegs done={item.done} total={item.of} /> }
            : {}),
        }))}
      />
    </Board>
  );
}
