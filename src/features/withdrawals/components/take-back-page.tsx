import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useLocation, useParams } from 'react-router-dom';
import { withdrawalsEndpoints, type ItemState } from '#shared/contracts/withdrawals.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths, safeNext } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { itemStateQuery, type Item } from '../api/withdrawals-api.js';
import { CorrectBoard } from './correct-board.js';
import { HideBoard } from './hide-board.js';
import { NameBoard } from './name-board.js';
import { SoundBoard } from './sound-board.js';
import { WithdrawBoard } from './withdraw-board.js';

const params = withdrawalsEndpoints.readState.params;

/** A calm page: what can be done about a thing that was given, and what will then happen. */
export function TakeBackPage() {
  const { t } = useTranslation(['withdrawals', 'common']);
  const parsed = params.safeParse(useParams());
  const [isGone, setIsGone] = useState(false);
  const backTo = useWayBack();
  usePageTitle(t('title'));
  if (isGone) return <GonePage />;
  return (
    <Page>
      {parsed.success ? (
        <Choices
          item={parsed.data}
          backTo={backTo}
          onGone={() => {
            setIsGone(true);
          }}
        />
      ) : (
        <>
          <Mast title={t('title')} backTo={backTo} />
          <NotYours />
        </>
      )}
    </Page>
  );
}

function Choices({ item, backTo, onGone }: { item: Item; backTo: string; onGone: () => void }) {
  const { t } = useTranslation(['withdrawals', 'common']);
  const words = useProblemWords();
  const { data: state, error, refetch } = useQuery(itemStateQuery(item));
  return (
    <>
      <Mast title={t('title')} under={state?.title ?? t(`type.${item.itemType}`)} backTo={backTo} />
      {state === undefined && error === null && <Skeleton lines={8} />}
      {state === undefined && error !== null && (
        <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
      {state !== undefined && !mayDoAnything(state) && <NotYours />}
      {state !== undefined && mayDoAnything(state) && (
        <div className="grid gap-4">
          <p>{t('lead')}</p>
          <HideBoard item={item} state={state} />
          <CorrectBoard item={item} state={state} />
          {state.may.removeSound && <SoundBoard item={item} state={state} />}
          {state.may.takeNameOff && <NameBoard item={item} />}
          {state.may.withdraw && <WithdrawBoard item={item} state={state} onGone={onGone} />}
        </div>
      )}
    </>
  );
}

function mayDoAnything({ may }: ItemState): boolean {
  return Object.values(may).some(Boolean);
}

function NotYours() {
  const { t } = useTranslation('withdrawals');
  return (
    <Board>
      <EmptyState title={t('notYours')}>{t('notYoursHint')}</EmptyState>
    </Board>
  );
}

function GonePage() {
  const { t } = useTranslation('withdrawals');
  return (
    <Page>
      <Mast title={t('gone.doneTitle')} />
      <Board>
        <p role="status">{t('gone.done')}</p>
        <p className="mt-2">{t('gone.doneWalls')}</p>
        <div className="mt-4">
          <ButtonLink look="main" to={paths.today()}>
            {t('gone.toToday')}
          </ButtonLink>
        </div>
      </Board>
    </Page>
  );
}

/** Where the person came from; a page of ours, or Today. */
function useWayBack(): string {
  const { state } = useLocation() as { state: unknown };
  const from = typeof state === 'object' && state !== null && 'from' in state ? state.from : null;
  return safeNext(typeof from === 'string' ? from : null);
}
