import { useQueryClient } from '@tanstack/react-query';
import { Check } from 'lucide-react';
import { useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PIN_MAX } from '#shared/contracts/cards.js';
import { offerElderPin } from '#src/lib/elder-pin.js';
import { SESSION_KEY } from '#src/lib/query-client.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { useEndHelping } from '../api/helping-api.js';

/** On every screen while somebody types for somebody else: for whom, and the way out. */
export function HelpingBar() {
  const { t } = useTranslation('helping');
  const { helping } = useSession();
  const end = useEndHelping();
  const client = useQueryClient();
  const until = helping?.until;
  useEffect(() => {
    if (until === undefined) return undefined;
    // The server has ended it by then: the screen asks anew, and shows nothing of the other one any more.
    const timer = setTimeout(
      () => {
        client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] });
        void client.invalidateQueries();
      },
      Math.max(0, new Date(until).getTime() - Date.now()),
    );
    return () => {
      clearTimeout(timer);
    };
  }, [until, client]);
  if (helping === undefined) return null;
  return (
    <section className="helping-bar" aria-label={t('label')}>
      <span>{t(helping.shownPin ? 'typing' : 'typingBlind', { name: helping.displayName })}</span>
      <Button
        busy={end.isPending}
        icon={<Check aria-hidden size={22} />}
        onClick={() => {
          end.mutate(helping.communityId);
        }}
      >
        {t('done')}
      </Button>
      <AskPin name={helping.displayName} />
    </section>
  );
}

type Answered = (pin: string | null) => void;

/** What the helped person agrees to is proved by their PIN once more. */
function AskPin({ name }: { name: string }) {
  const { t } = useTranslation(['helping', 'common']);
  const [answer, setAnswer] = useState<{ give: Answered } | null>(null);
  const [pin, setPin] = useState('');
  useEffect(
    () =>
      offerElderPin(
        () =>
          new Promise((resolve) => {
            setAnswer({ give: resolve });
          }),
      ),
    [],
  );
  const give = (typed: string | null) => {
    answer?.give(typed);
    setAnswer(null);
    setPin('');
  };
  return (
    <Dialog
      title={t('helping:ask.title', { name })}
      isOpen={answer !== null}
      closesBeside={false}
      onClose={() => {
        give(null);
      }}
    >
      <form
        className="grid gap-4"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          give(pin === '' ? null : pin);
        }}
      >
        <p>{t('helping:ask.lead', { name })}</p>
        <TextField
          label={t('helping:pin')}
          type="password"
          inputMode="numeric"
          autoComplete="off"
          maxLength={PIN_MAX}
          value={pin}
          onChange={(event) => {
            setPin(event.currentTarget.value.replace(/\D/gu, ''));
          }}
        />
        <Button type="submit" look="main" full>
          {t('helping:ask.give')}
        </Button>
      </form>
    </Dialog>
  );
}
