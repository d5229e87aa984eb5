import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { CONSENT_ITEMS, type Consent, type ItemConsents } from '#shared/contracts/consents.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { Button } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { itemConsentsQuery } from '../api/consents-api.js';
import { ConsentForm } from './consent-form.js';
import { ConsentView } from './consent-view.js';

/** The consent sheet of one thing. `proofs` shows recordings and pictures that belong to a consent. */
export function ItemConsentsPage({ proofs }: { proofs: (consentId: string) => ReactNode }) {
  const { t } = useTranslation('consents');
  const words = useProblemWords();
  const { communityId } = useCurrentCommunity();
  const { itemType: wanted = '', itemId = '' } = useParams();
  const itemType = CONSENT_ITEMS.find((one) => one === wanted) ?? 'entry';
  const { data, error, refetch } = useQuery(itemConsentsQuery({ communityId, itemType, itemId }));
  usePageTitle(t('sheet.title'));
  return (
    <Page>
      <Mast
        title={t('sheet.title')}
        under={data === undefined ? undefined : <About thing={data} />}
        backTo={paths.villageConsents()}
      />
      {error !== null && <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />}
      {data === undefined && error === null && <Skeleton lines={6} />}
      {data !== undefined && <Sheet key={itemId} thing={data} proofs={proofs} />}
    </Page>
  );
}

function About({ thing: { itemType, title, level } }: { thing: ItemConsents }) {
  const { t } = useTranslation('consents');
  const levelOf = useSharingWords();
  const item = t(`item.${itemType}`);
  return (
    <>
      {title === null ? t('keptLine', { item }) : t('sheet.about', { item, title })} · {levelOf(level)}
    </>
  );
}

/** Which consent is written over: one that stands, or null for a new one. */
type Writing = { over: Consent | null } | null;

function Sheet({ thing, proofs }: { thing: ItemConsents; proofs: (consentId: string) => ReactNode }) {
  const { t } = useTranslation('consents');
  const personId = useSession().person?.id ?? '';
  const [writing, setWriting] = useState<Writing>(null);
  const done = () => {
    setWriting(null);
  };
  if (writing !== null) return <ConsentForm thing={thing} over={writing.over} onDone={done} />;
  const isHidden = thing.items.some(({ state }) => ['refused', 'withdrawn', 'lapsed'].includes(state));
  const isGiver = thing.giverId === personId && !thing.items.some(({ isMine }) => isMine);
  return (
    <div className="grid gap-4">
      {isHidden && (
        <Care>
          <p>{t('sheet.hidden')}</p>
        </Care>
      )}
      {thing.mayAsk && thing.whomToAsk === 'nobody' && (
        <Care>
          <p>{t('sheet.whomToAsk')}</p>
        </Care>
      )}
      {thing.items.length === 0 && (
        <Board>
          <EmptyState title={t('sheet.nobody')}>
            {t('sheet.nobodyHint')} {thing.itemType === 'entry' && t('sheet.nobodyBelief')}
          </EmptyState>
        </Board>
      )}
      {thing.items.map((consent) => (
        <ConsentView
          key={consent.id}
          consent={consent}
          proofs={proofs(consent.id)}
          onChange={() => {
            setWriting({ over: consent });
          }}
        />
      ))}
      {thing.mayAsk && (
        <div>
          <Button
            look={thing.items.length === 0 ? 'main' : 'plain'}
            onClick={() => {
              setWriting({ over: null });
            }}
          >
            {t(isGiver ? 'sheet.askMine' : thing.items.length === 0 ? 'sheet.ask' : 'sheet.askAnother')}
          </Button>
        </div>
      )}
    </div>
  );
}
