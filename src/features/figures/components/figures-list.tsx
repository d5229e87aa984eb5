import { useQuery } from '@tanstack/react-query';
import { ChevronRight, Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Figure } from '#shared/contracts/figures.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { VillageList } from '#src/lib/village-list.js';
import { ButtonLink } from '#src/ui/button.js';
import { figuresQuery } from '../api/figures-queries.js';

/** The village's own figures; officers add one. A part of the village's page. */
export function FiguresList() {
  const { t } = useTranslation('figures');
  const { communityId } = useCurrentCommunity();
  const mayAdd = useRoles().is('officer');
  const query = useQuery(figuresQuery(communityId));
  return (
    <VillageList
      query={query}
      add={
        mayAdd ? (
          <ButtonLink to={paths.newFigure()} icon={<Plus aria-hidden size={20} />}>
            {t('list.add')}
          </ButtonLink>
        ) : null
      }
      none={{
        title: t('list.none'),
        hint: (
          <>
            {t('list.noneHint')} {!mayAdd && t('list.noneHintOthers')}
          </>
        ),
      }}
      lead={t('list.lead')}
      card={(figure) => <FigureCard figure={figure} />}
    />
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
