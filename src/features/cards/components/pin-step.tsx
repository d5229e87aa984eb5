import { LogIn } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { newPin, pin as anyPin } from '#shared/contracts/cards.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { useCardSignIn } from '../api/cards-api.js';
import { PinPad } from './pin-pad.js';

type Asking = 'enter' | 'choose' | 'again';

/** The PIN of a card in use; for a new card it is chosen, and typed a second time. */
export function PinStep({ code, isNew, onOther }: { code: string; isNew: boolean; onOther: () => void }) {
  const { t } = useTranslation('cards');
  const words = useProblemWords();
  const signIn = useCardSignIn();
  const [asking, setAsking] = useState<Asking>(isNew ? 'choose' : 'enter');
  const [pin, setPin] = useState('');
  const [chosen, setChosen] = useState('');
  const [problem, setProblem] = useState<string | undefined>(undefined);

  const ask = (next: Asking, said?: string) => {
    setAsking(next);
    setPin('');
    setProblem(said);
  };
  const submit = () => {
    if (signIn.isPending) return;
    const issue = (asking === 'choose' ? newPin : anyPin).safeParse(pin).error?.issues[0];
    if (issue !== undefined) {
      setProblem(words.field(issue.message));
      return;
    }
    if (asking === 'choose') {
      setChosen(pin);
      ask('again');
      return;
    }
    if (asking === 'again' && pin !== chosen) {
      ask('choose', t('door.differs'));
      return;
    }
    signIn.mutate(
      { code, pin, isNew },
      {
        onError: (cause) => {
          ask(isNew ? 'choose' : 'enter', words.problem(cause));
        },
      },
    );
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <h2>{t(TITLES[asking])}</h2>
      {asking === 'choose' && <p>{t('door.chooseLead')}</p>}
      <PinPad
        value={pin}
        problem={problem}
        onChange={(next) => {
          setPin(next);
          setProblem(undefined);
        }}
      />
      <Button
        type="submit"
        look="main"
        full
        busy={signIn.isPending}
        icon={<LogIn aria-hidden className="turns" size={22} />}
      >
        {asking === 'choose' ? t('door.go') : t('door.submit')}
      </Button>
      <Button look="quiet" onClick={onOther}>
        {t('door.other')}
      </Button>
    </form>
  );
}

const TITLES = {
  enter: 'door.pinTitle',
  choose: 'door.chooseTitle',
  again: 'door.againTitle',
} as const satisfies Record<Asking, string>;
