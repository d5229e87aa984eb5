import { useTranslation } from 'react-i18next';
import type { Sighting } from '#shared/contracts/signs.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { useDateWords } from './date-words.js';
import { useProblemWords } from './problem-words.js';

interface OneSightingProps {
  /** What was seen. */
  name: string;
  seen: Sighting;
  takeBack: () => Promise<unknown>;
  isTakingBack: boolean;
}

/** A sign that was seen on a day; whoever marked it can take that back. */
export function OneSighting({ name, seen, takeBack, isTakingBack }: OneSightingProps) {
  const { t } = useTranslation('signs');
  const dates = useDateWords();
  const words = useProblemWords();
  const say = useToast();
  const day = dates.day(seen.day);
  const undo = async () => {
    try {
      await takeBack();
      say(t('see.takenBack'));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <span className="flex flex-wrap items-center justify-between gap-x-3">
      <span>{t('board.seenOn', { name, day, who: seen.who })}</span>
      {seen.mine && (
        <Button
          look="quiet"
          busy={isTakingBack}
          aria-label={t('see.takeBackAbout', { name, day })}
          onClick={() => void undo()}
        >
          {t('see.takeBack')}
        </Button>
      )}
    </span>
  );
}
