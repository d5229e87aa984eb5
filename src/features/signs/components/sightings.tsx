import { useTranslation } from 'react-i18next';
import type { Sighting, Sign } from '#shared/contracts/signs.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSeeing } from '#src/lib/sign-queries.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';

/** A sign that was seen on a day; whoever marked it can take that back. */
export function OneSighting({ sign, seen }: { sign: Sign; seen: Sighting }) {
  const { t } = useTranslation('signs');
  const dates = useDateWords();
  const words = useProblemWords();
  const say = useToast();
  const { takeBack } = useSeeing(sign.communityId);
  const day = dates.day(seen.day);
  const undo = async () => {
    try {
      await takeBack.mutateAsync({ signId: sign.id, seenId: seen.id });
      say(t('see.takenBack'));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <span className="flex flex-wrap items-center justify-between gap-x-3">
      <span>{t('board.seenOn', { name: sign.name, day, who: seen.who })}</span>
      {seen.mine && (
        <Button
          look="quiet"
          busy={takeBack.isPending}
          aria-label={t('see.takeBackAbout', { name: sign.name, day })}
          onClick={() => void undo()}
        >
          {t('see.takeBack')}
        </Button>
      )}
    </span>
  );
}
