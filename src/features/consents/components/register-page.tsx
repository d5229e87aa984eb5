import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { ConsentLine } from '#shared/contracts/consents.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { consentsQuery } from '../api/consents-api.js';
import { RegisterRow } from './register-row.js';

/** What was agreed in the village, next to be asked again first. `tabs` comes from the village's pages. */
export function RegisterPage({ tabs }: { tabs: ReactNode }) {
  const { t } = useTranslation('consents');
  const { communityId, communityName } = useCurrentCommunity();
  const { is } = useRoles();
  const words = useProblemWords();
  const { data, error, isPending, refetch } = useQuery(consentsQuery(communityId));
  const keeps = is('steward', 'officer', 'elder');
  const due = (data ?? []).filter(({ isDue }) => isDue);
  const rest = (data ?? []).filter(({ isDue }) => !isDue);
  usePageTitle(t('title'));
  return (
    <Page>
      <Mast title={communityName} under={t('title')} />
      {tabs}
      <Board className="mt-4">
        <p className="text-umber-soft">{t('lead')}</p>
        {is('steward') && <p className="mt-2 text-umber-soft">{t('forSteward')}</p>}
        {isPending && <Skeleton lines={6} />}
        {error !== null && <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />}
        {data?.length === 0 && (
          <EmptyState title={t(keeps ? 'empty' : 'noneOfMine')}>
            {t(keeps ? 'emptyHint' : 'noneOfMineHint')}
          </EmptyState>
        )}
      </Board>
      <Lines title={t('dueTitle')} lines={due} />
      <Lines title={t(due.length === 0 ? 'allTitle' : 'restTitle')} lines={rest} />
    </Page>
  );
}

function Lines({ title, lines }: { title: string; lines: readonly ConsentLine[] }) {
  if (lines.length === 0) return null;
  return (
    <Board className="mt-4" title={`${title} (${lines.length})`}>
      <ul>
        {lines.map((line) => (
          <RegisterRow key={line.id} line={line} />
        ))}
      </ul>
    </Board>
  );
}
