import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import type { FigureDetail } from '#shared/contracts/figures.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { usePutBackFigure, useTakeOutFigure } from '../api/figure-mutations.js';

/** Which drafts go by the figure, and taking it out where none does. */
export function FigureUses({ figure }: { figure: FigureDetail }) {
  const { t, i18n } = useTranslation('figures');
  const words = useProblemWords();
  const navigate = useNavigate();
  const say = useToast();
  const takeOut = useTakeOutFigure(figure.communityId);
  const putBack = usePutBackFigure(figure.communityId);
  const [refusal, setRefusal] = useState<string | null>(null);
  const name = figure.names[0]?.name ?? '';
  const isUsed = figure.usedBy.length > 0;

  const remove = async () => {
    try {
      await takeOut.mutateAsync(figure.id);
      say(t('out.done', { name }), {
        onUndo: () => {
          putBack.mutate(figure.id, {
            onSuccess: () => {
              say(t('out.back', { name }));
            },
          });
        },
      });
      void navigate(paths.villageFigures(), { replace: true });
    } catch (cause) {
      const names = cause instanceof ApiProblem ? cause.names : [];
      setRefusal(
        names.length > 0
          ? t('out.usedBy', { entries: listWords(names, i18n.language) })
          : words.problem(cause),
      );
    }
  };
  return (
    <Board title={t('out.title')}>
      {isUsed ? (
        <>
          <p>{t('out.goBy', { count: figure.usedBy.length })}</p>
          <ul className="my-2 grid gap-1">
            {figure.usedBy.map(({ calendarId, entryId, title, placeName, year }) => (
              <li key={entryId}>
                <Link to={paths.calendar(calendarId, { entry: entryId })}>
                  {t('out.entry', { title, place: placeName, year })}
                </Link>
              </li>
            ))}
          </ul>
        </>
      ) : (
        <p>{t('out.unused')}</p>
      )}
      {refusal !== null && (
        <Care blocked role="alert" className="mt-2">
          <p>{refusal}</p>
        </Care>
      )}
      <div className="mt-3">
        <Button
          busy={takeOut.isPending}
          closedBecause={isUsed ? t('out.closed') : undefined}
          onClick={() => {
            void remove();
          }}
        >
          {t('out.take')}
        </Button>
      </div>
      <p className="mt-2 text-small text-umber-soft">{isUsed ? t('out.closed') : t('out.stays')}</p>
    </Board>
  );
}
