import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { leftOutQuery } from '../api/open-page-api.js';
import { awaitedGroups, type AwaitedGroup } from '../model/awaited-groups.js';
import { NamesFound } from './names-found.js';
import { NoNames } from './no-names.js';

/** What is open and does not stand on the page for everybody, why, and what can be done about it. */
export function LeftOut({ communityId }: { communityId: string }) {
  const { t } = useTranslation(['open', 'consents']);
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(leftOutQuery(communityId));
  const groups = awaitedGroups(data ?? []);
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
          {groups.length > 0 && (
            <p className="text-small">
              {t('board.leftOut.how', {
                write: t('consents:sheet.ask'),
                use: t('consents:use.open-page.name'),
              })}
            </p>
          )}
          {groups.map((group) => (
            <Awaited key={`${group.itemType} ${group.what}`} {...group} />
          ))}
          <NamesFound communityId={communityId} leftOut={data} />
          <NoNames communityId={communityId} leftOut={data} />
        </>
      )}
    </section>
  );
}

/** What is missing, once, then each thing with the way to it. */
function Awaited({ itemType, what, things }: AwaitedGroup) {
  const { t, i18n } = useTranslation('open');
  const list = new Intl.ListFormat(i18n.language);
  const isToAsk = what !== 'not-open';
  const label = itemType === 'entry' ? null : isToAsk ? 'board.leftOut.askFigure' : 'board.leftOut.seeFigure';
  return (
    <div className="border-t border-hairline pt-3">
      <p>{itemType === 'entry' ? t(`board.leftOut.entry.${what}`) : t(`board.leftOut.figure.${what}`)}</p>
      <ul className="mt-1 grid gap-1">
        {things.map(({ itemId, titles }) => (
          <li key={itemId}>
            <ButtonLink
              look="quiet"
              className="text-start"
              to={isToAsk ? paths.itemConsents(itemType, itemId) : paths.figure(itemId)}
            >
              {label === null
                ? t('board.leftOut.ask', { title: titles[0] ?? '' })
                : t(label, {
                    titles: list.format(titles.map((title) => t('board.leftOut.quoted', { title }))),
                  })}
            </ButtonLink>
          </li>
        ))}
      </ul>
    </div>
  );
}
