import { useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, Navigate, useLocation, useNavigate } from 'react-router-dom';
import { ARRIVED } from '#src/lib/arrival.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { RailIcon } from '#src/ui/icons/rail-icon.js';
import { Board } from '#src/ui/surfaces.js';
import { useOpenCard } from '../api/cards-api.js';
import { scannedCode } from '../model/scanned-code.js';
import { CodeStep } from './code-step.js';
import { PinStep } from './pin-step.js';

/** The door for a printed card: its code, then its PIN. */
export function CardPage() {
  const { t } = useTranslation(['cards', 'common']);
  const { person } = useSession();
  const words = useProblemWords();
  const open = useOpenCard();
  const { hash } = useLocation();
  const navigate = useNavigate();
  const [fromAddress] = useState(() => scannedCode(hash));
  const [code, setCode] = useState(fromAddress);
  const { mutate } = open;
  // A scanned card brings its code behind the hash. It is taken out of the address: phones are lent.
  useEffect(() => {
    if (fromAddress === null) return;
    void navigate(paths.card(), { replace: true });
    mutate(fromAddress);
  }, [fromAddress, mutate, navigate]);
  const openCard = (next: string) => {
    setCode(next);
    mutate(next);
  };
  usePageTitle(t('cards:door.title'));

  if (person !== null) return <Navigate to={paths.today()} state={ARRIVED} replace />;
  return (
    <main id="content" tabIndex={-1} className="door">
      <p className="door-brand">
        <RailIcon place="mark" size={44} />
        {t('common:productName')}
      </p>
      <h1>{t('cards:door.title')}</h1>
      <Board>
        <div className="pt-2">
          {code !== null && open.data !== undefined ? (
            <PinStep
              key={code}
              code={code}
              isNew={open.data.next === 'choose-pin'}
              onOther={() => {
                setCode(null);
                open.reset();
              }}
            />
          ) : (
            <CodeStep
              busy={open.isPending}
              problem={open.error === null ? undefined : words.problem(open.error)}
              onCode={openCard}
            />
          )}
        </div>
      </Board>
      <div>
        <Link className="link-line" to={paths.signIn()}>
          {t('cards:door.password')}
        </Link>
      </div>
    </main>
  );
}
