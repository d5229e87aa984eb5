import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { privacyQuery } from '../api/privacy-api.js';

/** For everybody, signed in or not: what is kept about people, why, how long, and who sees it. */
export function PrivacyPage() {
  const { t } = useTranslation('privacy');
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(privacyQuery);
  usePageTitle(t('title'));
  return (
    <Page>
      <Mast title={t('title')} backTo={paths.account()} />
      <Board>
        <p>{t('lead')}</p>
        {data === undefined && error === null && <Skeleton lines={8} />}
        {data === undefined && error !== null && (
          <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
        )}
        {data?.purposes.map(({ purpose }) => (
          <section key={purpose} className="mt-4 border-t border-hairline pt-3">
            <h2 className="text-body">{t(`purpose.${purpose}.name`)}</h2>
            <p>{t(`purpose.${purpose}.what`)}</p>
            <p className="text-umber-soft">{t(`purpose.${purpose}.until`, KEPT_DAYS)}</p>
          </section>
        ))}
        {data !== undefined && (
          <div className="mt-4 grid gap-2 border-t border-hairline pt-3">
            <p>{t('who')}</p>
            <p>{data.hosting === null ? t('hostingUnknown') : t('hosting', { where: data.hosting })}</p>
            <p>{t(data.sendsLetters ? 'post' : 'noPost')}</p>
          </div>
        )}
      </Board>
    </Page>
  );
}
