import { CircleDot, Feather, RotateCw } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { WaitingItem } from '#shared/contracts/today.js';
import { paths } from '#src/lib/paths.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { CountPegs } from '#src/ui/pegs.js';
import { Board } from '#src/ui/surfaces.js';
import { TaskList } from '#src/ui/task-list.js';
import { useWaitingWords } from '../model/waiting-words.js';

const ICONS: Record<WaitingItem['kind'], ReactNode> = {
  'answer-entries': <StateIcon state="in-review" size={24} />,
  'answer-own-entries': <StateIcon state="in-review" size={24} />,
  'sign-as-elder': <StateIcon state="in-review" size={24} />,
  'sign-as-steward': <StateIcon state="in-review" size={24} />,
  'elder-asked-change': <StateIcon state="changes-asked" size={24} />,
  'elder-said-not-for-board': <StateIcon state="changes-asked" size={24} />,
  'review-progress': <StateIcon state="in-review" size={24} />,
  'ready-to-publish': <StateIcon state="signed-off" size={24} />,
  'go-on-with-draft': <StateIcon state="draft" size={24} />,
  'print-published': <CircleDot aria-hidden size={24} />,
};

const COUNTED: ReadonlySet<WaitingItem['kind']> = new Set([
  'answer-entries',
  'answer-own-entries',
  'review-progress',
]);

/** What waits for this person: who and what in each line. */
export function WaitingBoard({
  items,
  consentsDue,
  heirsOpen,
}: {
  items: readonly WaitingItem[];
  /** Consents to be asked for again, without what they are about. */
  consentsDue: number;
  heirsOpen: number;
}) {
  const { t } = useTranslation('today');
  const wordsOf = useWaitingWords();
  if (items.length === 0 && consentsDue === 0 && heirsOpen === 0) return null;
  const askAgain = {
    key: 'consents-due',
    icon: <RotateCw aria-hidden size={24} />,
    title: t('waiting.consents-due.title', { count: consentsDue }),
    detail: t('waiting.consents-due.detail'),
    to: paths.villageConsents(),
  };
  const passOn = {
    key: 'heirs-open',
    icon: <Feather aria-hidden size={24} />,
    title: t('waiting.heirs-open.title', { count: heirsOpen }),
    detail: t('waiting.heirs-open.detail'),
    to: paths.villagePeople(),
  };
  return (
    <Board title={t('waiting.title')}>
      <TaskList
        tasks={[
          ...items.map((item) => ({
            key: `${item.kind} ${item.calendarId} ${item.entryId ?? ''} ${item.personName ?? ''}`,
            icon: ICONS[item.kind],
            ...wordsOf(item),
            ...(item.of > 0 && item.of <= 24 && COUNTED.has(item.kind)
              ? { extra: <CountPegs done={item.done} total={item.of} /> }
              : {}),
          })),
          ...(consentsDue > 0 ? [askAgain] : []),
          ...(heirsOpen > 0 ? [passOn] : []),
        ]}
      />
    </Board>
  );
}
