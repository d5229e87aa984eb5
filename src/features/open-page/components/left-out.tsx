import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { LEFT_OUT_REASONS, type LeftOutOfOpenPage } from '#shared/contracts/open-page.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { leftOutQuery } from '../api/open-page-api.js';

/** What is open and does not stand on the page for everybody, why, and what can be done about it. */
export function LeftOut({ communityId }: { communityId: string }) {
  const { t } = useTranslation('open');
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(leftOutQuery(communityId));
  return (
    <section className="grid gap-2">
      <h3>{t('board.leftOut.title')}</h3>
      {data === undefined && error === null && <Skeleton lines={2} />}
      {data === undefined && error !== null && (
        <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
      {data?.length === 0 && <p>{t('board.leftOut.none')}</p>}
      {data && data.length > 0 && (
        <>
          <p className="text-small">{t('board.leftOut.what')}</p>
          {LEFT_OUT_REASONS.map((reason) => (
            <Things key={reason} reason={reason} things={data.filter((thing) => thing.reason === reason)} />
          ))}
        </>
      )}
    </section>
  );
}

interface ThingsProps {
  reason: LeftOutOfOpenPage['reason'];
  things: readonly LeftOutOfOpenPage[];
}

/** The reason once, then each with the way to ask, or with the names that were found. */
function Things({ reason, things }: ThingsProps) {
  const { t } = useTranslation('open');
  if (things.length === 0) return null;
  return (
    <div className="border-t border-hairline pt-3">
      <p>{t(`board.leftOut.${reason}`)}</p>
      <ul className="mt-1 grid gap-1">
        {things.map(({ entryId, title, found }) => (
          <li key={entryId}>
            {found.length > 0 ? (
              <NamesFound title={title} found={found} />
            ) : (
              <ButtonLink look="quiet" to={paths.itemConsents('entry', entryId)}>
                {t('board.leftOut.ask', { title })}
              </ButtonLink>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

function NamesFound({ title, found }: Pick<LeftOutOfOpenPage, 'title' | 'found'>) {
  const { t, i18n } = useTranslation('open');
  const list = new Intl.ListFormat(i18n.language);
  return (
    <>
      <p>
        <strong>{title}</strong>
      </p>
      {found.map(({ word, names }) => (
        <p key={word}>
          {t('board.leftOut.found', {
            word: t(`board.leftOut.word.${word}`),
            names: list.format(names),
          })}
        </p>
      ))}
      <p className="text-small">{t('board.leftOut.rewrite')}</p>
    </>
  );
}
