import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Pencil, Table2, Telescope } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { FigureDetail } from '#shared/contracts/figures.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { useGiverWords } from '#src/lib/giver-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { Mast, Page, ThumbBar } from '#src/ui/page.js';
import { Board, Well } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { chartQuery, figureQuery } from '../api/figures-queries.js';
import { viewAround } from '../model/chart-projection.js';
import { ChartTable } from './chart-table.js';
import { FigureUses } from './figure-uses.js';
import { StarChart } from './star-chart.js';
import { useChartNames } from './use-chart-names.js';

interface FigurePageProps {
  days: (markerKey: string) => ReactNode;
  /** Who may see it, and what else belongs to it. */
  about: (figure: FigureDetail) => ReactNode;
}

/** A figure to read: names, story, other tellings, where it is in the sky, and its four days. */
export function FigurePage({ days, about }: FigurePageProps) {
  const { t } = useTranslation('figures');
  const { figureId = '' } = useParams();
  const { communityId } = useCurrentCommunity();
  const mayWrite = useRoles().is('officer');
  const { data: figure } = useSuspenseQuery(figureQuery(communityId, figureId));
  const [own, ...others] = figure.names;
  usePageTitle(own?.name ?? '');
  return (
    <Page>
      <Mast
        title={<span lang={own?.tag}>{own?.name}</span>}
        under={others.length > 0 ? others.map(({ name }) => name).join(' · ') : t('page.under')}
        backTo={paths.villageFigures()}
      >
        {mayWrite && (
          <ThumbBar>
            <ButtonLink
              look="main"
              to={paths.changeFigure(figure.id)}
              icon={<Pencil aria-hidden size={22} />}
            >
              {t('page.change')}
            </ButtonLink>
          </ThumbBar>
        )}
      </Mast>
      <div className="grid gap-4 wide:grid-cols-[minmax(0,5fr)_minmax(0,7fr)] wide:items-start wide:gap-6">
        <div className="grid gap-4">
          <Story figure={figure} />
          <InTheSky figure={figure} />
          {mayWrite && <FigureUses figure={figure} />}
          {about(figure)}
        </div>
        <div className="grid gap-4">
          {days(figure.markerKey)}
          <div>
            <ButtonLink to={paths.star(figure.markerKey)} icon={<Telescope aria-hidden size={20} />}>
              {t('page.wholeYear')}
            </ButtonLink>
          </div>
        </div>
      </div>
    </Page>
  );
}

function Story({ figure }: { figure: FigureDetail }) {
  const { t } = useTranslation('figures');
  const lang = figure.names[0]?.tag;
  const giverWords = useGiverWords();
  return (
    <Board title={t('page.story')}>
      {figure.story === '' ? (
        <p className="text-umber-soft">{t('page.noStory')}</p>
      ) : (
        <p className="own-words text-lead whitespace-pre-line" lang={lang}>
          {figure.story}
        </p>
      )}
      {figure.variants.map(({ toldBy, text }, index) => (
        <Well key={index} className="mt-3">
          <p className="text-small text-umber-soft">
            {toldBy === '' ? t('page.toldAlso') : t('page.toldBy', { who: giverWords(toldBy) })}
          </p>
          <p className="own-words whitespace-pre-line" lang={lang}>
            {text}
          </p>
        </Well>
      ))}
    </Board>
  );
}

const PATCH_RADIUS_DEG = 22;

function InTheSky({ figure }: { figure: FigureDetail }) {
  const { t } = useTranslation(['figures', 'common']);
  const words = useProblemWords();
  const nameOf = useChartNames();
  const { data: chart, error, refetch } = useQuery(chartQuery());
  if (chart === undefined) {
    return (
      <Board title={t('page.sky')}>
        {error === null ? (
          <Skeleton lines={5} />
        ) : (
          <TroubleNote
            sentence={words.problem(error)}
            onRetry={() => {
              void refetch();
            }}
          />
        )}
      </Board>
    );
  }
  const { patch, memberHrs, indicatorHr, ownDepths } = figure;
  const members = chart.stars.filter(({ hr }) => memberHrs.includes(hr));
  const leader = members.find(({ hr }) => hr === indicatorHr);
  const view = patch ? { centre: patch, radiusDeg: PATCH_RADIUS_DEG } : viewAround(members);
  const sentence =
    patch === null
      ? t('page.starsSentence', {
          count: members.length,
          leader: leader === undefined ? '' : nameOf(leader),
        })
      : t(`patchClass.${patch.patchClass}.sentence`);
  return (
    <Board title={t('page.sky')}>
      {view !== null && (
        <StarChart
          stars={chart.stars}
          view={view}
          memberHrs={memberHrs}
          indicatorHr={indicatorHr}
          patch={patch}
          nameOf={nameOf}
          label={t('page.pictureLabel', { sentence })}
        />
      )}
      <p className="mt-2">{sentence}</p>
      {ownDepths !== null && <p className="text-small">{t('page.depths', { ...ownDepths })}</p>}
      <p className="text-small text-umber-soft">
        {t(patch === null ? 'page.pictureKey' : 'page.pictureKeyPatch')}
      </p>
      {patch === null ? (
        <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
          <ChartTable stars={members} memberHrs={memberHrs} nameOf={nameOf} onToggle={null} />
        </More>
      ) : (
        <p className="text-small" dir="ltr">
          {t('table.place', {
            rightAscension: patch.rightAscensionDeg,
            declination: patch.declinationDeg,
          })}
        </p>
      )}
    </Board>
  );
}
