import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useNavigate, useParams } from 'react-router-dom';
import type { FigureDetail } from '#shared/contracts/figures.js';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { useSaveFigure } from '../api/figure-mutations.js';
import { chartQuery, figureQuery } from '../api/figures-queries.js';
import { FigureEditor } from './figure-editor.js';

export function NewFigurePage() {
  const { t } = useTranslation('figures');
  usePageTitle(t('new.title'));
  return <EditorWhenReady figure={null} backTo={paths.villageFigures()} />;
}

export function ChangeFigurePage() {
  const { figureId = '' } = useParams();
  const { communityId } = useCurrentCommunity();
  const { data: figure } = useSuspenseQuery(figureQuery(communityId, figureId));
  usePageTitle(figure.names[0]?.name ?? '');
  return <EditorWhenReady key={figure.id} figure={figure} backTo={paths.figure(figure.id)} />;
}

function EditorWhenReady({ figure, backTo }: { figure: FigureDetail | null; backTo: string }) {
  const { t } = useTranslation('figures');
  const { communityId } = useCurrentCommunity();
  const mayWrite = useRoles().is('officer');
  const words = useProblemWords();
  const navigate = useNavigate();
  const say = useToast();
  const save = useSaveFigure(communityId);
  const community = useQuery(communityQuery(communityId));
  const chart = useQuery(chartQuery());
  if (!mayWrite || community.data === undefined || chart.data === undefined) {
    const trouble = community.error ?? chart.error;
    return (
      <Page>
        <Mast title={t(figure === null ? 'new.title' : 'change.title')} backTo={backTo} />
        <Board>
          {!mayWrite ? (
            <p>{t('readOnly')}</p>
          ) : trouble === null ? (
            <Skeleton lines={8} />
          ) : (
            <TroubleNote
              sentence={words.problem(trouble)}
              onRetry={() => {
                void community.refetch();
                void chart.refetch();
              }}
            />
          )}
        </Board>
      </Page>
    );
  }
  return (
    <FigureEditor
      figure={figure}
      communityId={communityId}
      languages={[community.data.villageLanguage, community.data.officerLanguage]}
      chart={chart.data}
      backTo={backTo}
      isSaving={save.isPending}
      save={(input, version) =>
        save.mutateAsync({
          input,
          saved: figure === null ? null : { figureId: figure.id, version: version ?? figure.version },
        })
      }
      onSaved={(saved) => {
        say(t('form.saved', { name: saved.names[0]?.name ?? '' }));
        void navigate(paths.figure(saved.id), { replace: true });
      }}
    />
  );
}
