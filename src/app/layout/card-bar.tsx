import { DoorOpen } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { dropEverythingOf, hasKeptRecordings } from '#src/features/attachments/model/kept-recordings.js';
import { useSignOut } from '#src/features/session/api/session-mutations.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';

/** Whoever came in by a card sees the way out on every screen; nobody's phone keeps what they did. */
export function CardBar() {
  const { t } = useTranslation('common');
  const { person, card } = useSession();
  const signOut = useSignOut();
  const [asks, setAsks] = useState(false);
  const personId = person?.id ?? '';
  const leave = async () => {
    const unsent = await hasKeptRecordings(personId).catch(() => false);
    if (unsent) setAsks(true);
    else signOut.mutate();
  };
  const leaveAll = async () => {
    setAsks(false);
    await dropEverythingOf(personId).catch(() => undefined);
    signOut.mutate();
  };
  useIdle(card === null ? null : card.leaveAfterMinutes, () => {
    signOut.mutate();
  });
  if (card === null || person === null) return null;
  return (
    <section className="card-bar" aria-label={t('byCard.label')}>
      <span>{t('byCard.who', { name: person.displayName })}</span>
      <Button
        busy={signOut.isPending}
        icon={<DoorOpen aria-hidden size={22} className="turns" />}
        onClick={() => void leave()}
      >
        {t('byCard.leave')}
      </Button>
      <Dialog
        title={t('byCard.unsentTitle')}
        isOpen={asks}
        onClose={() => {
          setAsks(false);
        }}
      >
        <div className="grid gap-3">
          <p>{t('byCard.unsent')}</p>
          <Button
            look="main"
            full
            onClick={() => {
              setAsks(false);
            }}
          >
            {t('byCard.stay')}
          </Button>
          <Button full onClick={() => void leaveAll()}>
            {t('byCard.leaveAll')}
          </Button>
        </div>
      </Dialog>
    </section>
  );
}

/** The server ends such a session by itself; the screen must not go on showing what was on it. */
function useIdle(minutes: number | null, onIdle: () => void): void {
  const act = useRef(onIdle);
  useEffect(() => {
    act.current = onIdle;
  }, [onIdle]);
  useEffect(() => {
    if (minutes === null) return undefined;
    let timer: ReturnType<typeof setTimeout>;
    const begin = () => {
      clearTimeout(timer);
      timer = setTimeout(() => {
        act.current();
      }, minutes * 60_000);
    };
    begin();
    const signs = ['pointerdown', 'keydown'] as const;
    for (const sign of signs) window.addEventListener(sign, begin);
    return () => {
      clearTimeout(timer);
      for (const sign of signs) window.removeEventListener(sign, begin);
    };
  }, [minutes]);
}
