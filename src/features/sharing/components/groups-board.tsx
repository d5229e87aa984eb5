import { useQuery } from '@tanstack/react-query';
import { Pencil, Users } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Group } from '#shared/contracts/sharing.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { listWords } from '#src/lib/list-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { groupsQuery } from '#src/lib/sharing-queries.js';
import { IconButton } from '#src/ui/button.js';
import { Chip } from '#src/ui/chip.js';
import { Dialog } from '#src/ui/dialog.js';
import { Columns } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { ChangeGroupForm, FoundGroupForm } from './group-forms.js';

/** The groups of the village that keep things to themselves. Who belongs to one is for its own people. */
export function GroupsBoard() {
  const { t } = useTranslation('sharing');
  const { communityId } = useCurrentCommunity();
  const mayFound = useRoles().is('steward', 'elder');
  const words = useProblemWords();
  const groups = useQuery(groupsQuery(communityId));
  const [openId, setOpenId] = useState<string | null>(null);
  const open = groups.data?.find(({ id, isMember }) => id === openId && isMember) ?? null;
  const close = () => {
    setOpenId(null);
  };

  const list = (
    <Board title={t('groups.title')}>
      <p className="mb-2">{t('groups.lead')}</p>
      {groups.isPending && <Skeleton lines={4} />}
      {groups.error !== null && (
        <TroubleNote sentence={words.problem(groups.error)} onRetry={() => void groups.refetch()} />
      )}
      {groups.data?.length === 0 && (
        <EmptyState title={t('groups.none')}>
          {mayFound ? t('groups.noneFounder') : t('groups.noneOthers')}
        </EmptyState>
      )}
      {groups.data && groups.data.length > 0 && (
        <ul className="rows">
          {groups.data.map((group) => (
            <GroupRow key={group.id} group={group} onChange={setOpenId} />
          ))}
        </ul>
      )}
    </Board>
  );
  return (
    <>
      {mayFound ? (
        <Columns wider="first">
          {list}
          <Board title={t('groups.found')}>
            <FoundGroupForm communityId={communityId} />
          </Board>
        </Columns>
      ) : (
        list
      )}
      {open !== null && (
        <Dialog title={t('groups.change', { name: open.name })} isOpen onClose={close} closesBeside={false}>
          <ChangeGroupForm communityId={communityId} group={open} onDone={close} />
        </Dialog>
      )}
    </>
  );
}

function GroupRow({ group, onChange }: { group: Group; onChange: (groupId: string) => void }) {
  const { t, i18n } = useTranslation('sharing');
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-hairline py-3 first:border-t-0">
      <div className="min-w-0 flex-1 basis-56">
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <strong className="min-w-0 break-words">{group.name}</strong>
          {group.isMember && <Chip icon={<Users aria-hidden size={18} />}>{t('groups.yours')}</Chip>}
        </p>
        <p className="text-umber-soft">{t('groups.count', { count: group.memberCount })}</p>
        {group.members !== null && (
          <p>
            {listWords(
              group.members.map(({ displayName }) => displayName),
              i18n.language,
            )}
          </p>
        )}
      </div>
      {group.isMember && (
        <IconButton
          label={t('groups.change', { name: group.name })}
          icon={<Pencil aria-hidden size={22} />}
          onClick={() => {
            onChange(group.id);
          }}
        />
      )}
    </li>
  );
}
