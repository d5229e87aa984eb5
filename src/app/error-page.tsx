import { RotateCw } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { ApiProblem } from '#src/lib/api-problem.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';

/** Whatever a screen could not handle itself: what happened, what is safe, what to do. */
export function ErrorPage() {
  const cause = useRouteError();
  const isMissing = cause instanceof ApiProblem && cause.slug === 'not-found';
  const isNoAddress = isRouteErrorResponse(cause) && cause.status === 404;
  return isMissing || isNoAddress ? <NotFoundPage /> : <TroublePage cause={cause} />;
}

function TroublePage({ cause }: { cause: unknown }) {
  const { t } = useTranslation('common');
  const words = useProblemWords();
  usePageTitle(t('trouble.loadTitle'));
  return (
    <Page>
      <Mast title={t('trouble.loadTitle')} />
      <Board className="max-w-form">
        <p>{isOutdatedCode(cause) ? t('trouble.newVersion') : words.problem(cause)}</p>
        <p className="mt-2">{t('trouble.safe')}</p>
        {cause instanceof ApiProblem && cause.requestId !== undefined && (
          <p className="mt-2 text-small text-umber-soft">{t('trouble.reference', { id: cause.requestId })}</p>
        )}
        <div className="mt-4 flex flex-wrap gap-3">
          <Button
            icon={<RotateCw aria-hidden size={20} />}
            onClick={() => {
              location.reload();
            }}
          >
            {t('trouble.reload')}
          </Button>
          <ButtonLink look="quiet" to={paths.today()}>
            {t('notFound.toToday')}
          </ButtonLink>
        </div>
      </Board>
    </Page>
  );
}

export function NotFoundPage() {
  const { t } = useTranslation('common');
  usePageTitle(t('notFound.title'));
  return (
    <Page>
      <Mast title={t('notFound.title')} />
      <Board className="max-w-form">
        <p>{t('notFound.hint')}</p>
        <div className="mt-4">
          <ButtonLink to={paths.today()}>{t('notFound.toToday')}</ButtonLink>
        </div>
      </Board>
    </Page>
  );
}

/** A page that was open while the server got a new build asks for pieces that are gone. */
function isOutdatedCode(cause: unknown): boolean {
  return cause instanceof TypeError && /dynamically imported module|module script/iu.test(cause.message);
}
