import { useQuery } from '@tanstack/react-query';
import { EyeOff } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useCommunityChoice } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { paths } from '#src/lib/paths.js';
import { Board } from '#src/ui/surfaces.js';
import { TaskList } from '#src/ui/task-list.js';
import { pausedQuery } from '../api/withdrawals-api.js';

/** What this person may bring back; nothing at all while nothing is hidden. */
export function HiddenBoard() {
  const { community } = useCommunityChoice();
  return community === null ? null : <Hidden communityId={community.communityId} />;
}

function Hidden({ communityId }: { communityId: string }) {
  const { t } = useTranslation('withdrawals');
  const dates = useDateWords();
  const { data = [] } = useQuery(pausedQuery(communityId));
  if (data.length === 0) return null;
  return (
    <Board title={t('hidden.title')}>
      <p className="mb-2 text-umber-soft">{t('hidden.lead')}</p>
      <TaskList
        tasks={data.map(({ itemType, itemId, title, pausedAt, othersUntil }) => ({
          key: `${itemType} ${itemId}`,
          icon: <EyeOff aria-hidden size={24} />,
          title: title ?? t('hidden.unseen'),
          detail: t('hidden.line', { type: t(`type.${itemType}`), when: dates.moment(pausedAt) }),
          extra: (
            <span className="task-detail">
              {t('hidden.others', { day: dates.day(othersUntil.slice(0, 10)) })}
            </span>
          ),
          to: paths.takeBack(communityId, itemType, itemId),
        }))}
      />
    </Board>
  );
}
