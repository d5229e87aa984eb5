import { useQuery } from '@tanstack/react-query';
import { ChevronRight, Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Figure } from '#shared/contracts/figures.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { figuresQuery } from '../api/figures-queries.js';

/** The village's own figures; officers add one. A part of the village's page. */
export function FiguresList() {
  const { t } = useTranslation('figures');
  const { communityId } = useCurrentCommunity();
  const mayAdd = useRoles().is('officer');
  const words = useProblemWords();
  const { data: figures, error, refetch } = useQuery(figuresQuery(communityId));
  const add = (
    <ButtonLink to={paths.newFigure()} icon={<Plus aria-hidden size={20} />}>
      {t('list.add')}
    </ButtonLink>
  );
  if (figures === undefined) {
    return error === null ? (
      <Board>
        <Skeleton lines={4} />
      </Board>
    ) : (
      <TroubleNote
        sentence={words.problem(error)}
        onRetry={() => {
          void refetch();
        }}
      />
    );
  }
  if (figures.length === 0) {
    return (
      <Board>
        <EmptyState title={t('list.none')} action={mayAdd ? add : undefined}>
          {t('list.noneHint')} {!mayAdd && t('list.noneHintOthers')}
        </EmptyState>
      </Board>
    );
  }
  return (
    <div className="grid gap-4">
      <p className="text-small text-umber-soft">{t('list.lead')}</p>
      <ul className="grid gap-4 mid:grid-cols-2">
        {figures.map((figure) => (
          <li key={figure.id}>
            <FigureCard figure={figure} />
          </li>
        ))}
      </ul>
      {mayAdd && <div>{add}</div>}
    </div>
  );
}

function FigureCard({ figure }: { figure: Figure }) {
  const { t } = useTranslation('figures');
  const [own, ...others] = figure.names;
  return (
    <Link
      to={paths.figure(figure.id)}
      className="board block h-full text-umber no-underline hover:bg-lime-deep"
    >
      <span className="flex items-center justify-between gap-3">
        <span className="own-words text-lead underline decoration-edge underline-offset-4" lang={own?.tag}>
          {own?.name}
        </span>
        <ChevronRight aria-hidden className="turns" size={24} />
      </span>
      {others.length > 0 && (
        <span className="own-words block">{others.map(({ name }) => name).join(' · ')}</span>
      )}
      <span className="mt-1 block text-small text-umber-soft">
        {figure.patch === null
          ? t('list.stars', { count: figure.memberHrs.length })
          : t(`patchClass.${figure.patch.patchClass}.short`)}
      </span>
    </Link>
  );
}
