import { Check } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import { useRoles } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import type { ItemRef } from '#src/lib/sharing-queries.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { Button } from '#src/ui/button.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { Well } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAgreeWider, useDropWider } from '../api/sharing-mutations.js';

/** A wider circle that was asked for: who has agreed to it, and what this person can say. */
export function AskedWider({ item, sharing }: { item: ItemRef; sharing: ItemSharing }) {
  const { t } = useTranslation('sharing');
  const levelWords = useSharingWords();
  if (sharing.asked === null) return null;
  const { asked } = sharing;
  const { level, ...details } = asked.sharing;
  return (
    <Well className="mt-3 grid gap-2">
      <h3>{t('asked.title')}</h3>
      <p>{t('asked.line', { name: asked.askedByName, level: levelWords(level, details) })}</p>
      <Word isGiven={asked.giverAgreed}>{t(asked.giverAgreed ? 'asked.giverYes' : 'asked.giverNo')}</Word>
      <Word isGiven={asked.stewardAgreed}>
        {t(asked.stewardAgreed ? 'asked.stewardYes' : 'asked.stewardNo')}
      </Word>
      <AskedButtons item={item} sharing={sharing} />
    </Well>
  );
}

function Word({ isGiven, children }: { isGiven: boolean; children: string }) {
  return (
    <p className="flex items-center gap-2">
      <StateIcon state={isGiven ? 'agreed' : 'waiting'} size={24} />
      <span>{children}</span>
    </p>
  );
}

export function AskedButtons({ item, sharing }: { item: ItemRef; sharing: ItemSharing }) {
  const { t } = useTranslation('sharing');
  const say = useToast();
  const words = useProblemWords();
  const me = useSession().person;
  const { is } = useRoles();
  const agree = useAgreeWider(item);
  const drop = useDropWider(item);
  const { asked, giverId, may } = sharing;
  if (asked === null) return null;
  const mayDrop =
    may.agreeWider || is('steward') || giverId === me?.id || asked.askedByName === me?.displayName;
  const tell = (cause: unknown) => {
    say(words.problem(cause));
  };
  return (
    <div className="flex flex-wrap gap-3">
      {may.agreeWider && (
        <Button
          busy={agree.isPending}
          icon={<Check aria-hidden size={22} />}
          onClick={() => {
            agree.mutate(undefined, {
              onSuccess: (saved) => {
                say(t(saved.asked === null ? 'panel.widened' : 'asked.agreed'));
              },
              onError: tell,
            });
          }}
        >
          {t('asked.agree')}
        </Button>
      )}
      {mayDrop && (
        <Button
          look="quiet"
          busy={drop.isPending}
          onClick={() => {
            drop.mutate(undefined, {
              onSuccess: () => {
                say(t('asked.dropped'));
              },
              onError: tell,
            });
          }}
        >
          {t('asked.drop')}
        </Button>
      )}
    </div>
  );
}
