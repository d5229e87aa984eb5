import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import { WORD_LISTS, type ListedWord } from '#shared/contracts/word-lists.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { wordListsQuery } from '#src/lib/word-lists.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import type { OneListProps } from '../model/one-list.js';
import { NEW_WORD } from '../model/word-changes.js';
import { WordForm } from './word-form.js';
import { WordRows } from './word-rows.js';

/** What the village calls kinds of events, kinds of work, and crops. Everybody reads it, officers change it. */
export function WordLists() {
  const { t } = useTranslation('words');
  const { communityId } = useCurrentCommunity();
  const mayWrite = useRoles().is('officer');
  const words = useProblemWords();
  const { data: lists, error, refetch } = useQuery(wordListsQuery(communityId));
  const [search, setSearch] = useSearchParams();
  const list = WORD_LISTS.find((one) => one === search.get('list')) ?? 'kinds';
  return (
    <div className="grid gap-4">
      <p className="text-small text-umber-soft">{t('lead')}</p>
      <PickGroup
        label={t('list.label')}
        value={list}
        options={WORD_LISTS.map((value) => ({ value, label: t(`list.${value}`) }))}
        onChange={(value) => {
          setSearch({ list: value }, { replace: true });
        }}
      />
      {lists === undefined ? (
        error === null ? (
          <Board>
            <Skeleton lines={6} />
          </Board>
        ) : (
          <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
        )
      ) : (
        <OneList key={list} communityId={communityId} list={list} stored={lists[list]} mayWrite={mayWrite} />
      )}
    </div>
  );
}

function OneList(props: OneListProps) {
  const { list, stored, mayWrite } = props;
  const { t } = useTranslation('words');
  const [written, setWritten] = useState<ListedWord | null>(null);
  const close = () => {
    setWritten(null);
  };
  const add = (
    <Button
      icon={<Plus aria-hidden size={20} />}
      onClick={() => {
        setWritten(NEW_WORD);
      }}
    >
      {t(list === 'crops' ? 'addCrop' : 'add')}
    </Button>
  );
  return (
    <>
      <Board title={t(`list.${list}`)}>
        <div className="mb-3 grid gap-1 text-small">
          <p>{t(`about.${list}`)}</p>
          <p>{mayWrite ? t('everybody') : t('readOnly')}</p>
          {mayWrite && <p>{t(`asks.${list}`)}</p>}
        </div>
        {stored.items.length === 0 ? (
          <EmptyState title={t('none')} action={mayWrite ? add : undefined}>
            {t('noneHint')}
          </EmptyState>
        ) : (
          <>
            <WordRows {...props} onChange={setWritten} />
            {mayWrite && <div className="mt-3">{add}</div>}
          </>
        )}
      </Board>
      <Dialog
        title={
          written === null || written.key !== ''
            ? t('form.rename')
            : t(list === 'crops' ? 'form.newCrop' : 'form.new')
        }
        isOpen={written !== null}
        onClose={close}
        closesBeside={false}
      >
        {written !== null && <WordForm {...props} word={written} onDone={close} />}
      </Dialog>
    </>
  );
}
