import { useTranslation } from 'react-i18next';
import type { RainDay } from '#shared/contracts/weather.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { useWeather } from '../api/weather-mutations.js';

/** Rain of one day; whoever wrote it down, and officers, can take it out again. */
export function RainLine({ communityId, rain }: { communityId: string; rain: RainDay }) {
  const { t } = useTranslation('weather');
  const dates = useDateWords();
  const problems = useProblemWords();
  const say = useToast();
  const { removeRain } = useWeather(communityId);
  const { mm, words, writtenBy } = rain;
  const day = dates.day(rain.day);
  const way = mm === null ? 'rain.words' : words === '' ? 'rain.mm' : 'rain.both';
  const takeOut = async () => {
    try {
      await removeRain.mutateAsync(rain.id);
      say(t('rain.takenOut'));
    } catch (cause) {
      say(problems.problem(cause));
    }
  };
  return (
    <span className="flex flex-wrap items-center justify-between gap-x-3">
      <span>
        {t(way, { day, mm: mm ?? 0, words })}
        {writtenBy !== '' && (
          <span className="block text-small text-umber-soft">{t('rain.by', { name: writtenBy })}</span>
        )}
      </span>
      {rain.mine && (
        <Button
          look="quiet"
          busy={removeRain.isPending}
          aria-label={t('rain.takeOutAbout', { day })}
          onClick={() => void takeOut()}
        >
          {t('rain.takeOut')}
        </Button>
      )}
    </span>
  );
}
