import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import type { Advised } from '../model/use-advice.js';
import type { Way } from '../model/warning-ways.js';

type PlainWay = Exclude<Way, { phenomenon: unknown }>['kind'];

const WAYS: Readonly<Record<Advised['advice'], readonly PlainWay[]>> = {
  'same-people': ['changeDays', 'otherPeople'],
  'crop-not-ripe': ['changeDays'],
  'crop-long-ripe': ['changeDays'],
  'cloudy-season': ['writeSigns', 'otherStar'],
  moonlit: ['writeSigns'],
  drifted: ['otherStar'],
  'no-safety-line': ['writeCaution'],
};

interface AdviceLineProps {
  advised: Advised;
  /** What the leading star is called. */
  marker: string;
  onWay: (way: Way) => void;
}

/** One thing to look at besides the days: why, and ways out. */
export function AdviceLine({ advised, marker, onWay }: AdviceLineProps) {
  const { t } = useTranslation('calendars');
  const say = useAdviceWords(marker);
  return (
    <>
      <p>{say(advised)}</p>
      <div className="ways flex flex-wrap">
        {WAYS[advised.advice].map((kind) => (
          <Button
            key={kind}
            look="quiet"
            onClick={() => {
              onWay({ kind });
            }}
          >
            {t(`warning.way.${kind}`)}
          </Button>
        ))}
        {advised.advice === 'drifted' && (
          <ButtonLink look="quiet" to={paths.drift(advised.markerKey)}>
            {t('warning.way.seeDrift')}
          </ButtonLink>
        )}
      </div>
    </>
  );
}

function useAdviceWords(marker: string): (advised: Advised) => string {
  const { t, i18n } = useTranslation('calendars');
  const dates = useDateWords();
  const titled = (title: string) => (title === '' ? t('editor.untitled') : title);
  return (advised) => {
    switch (advised.advice) {
      case 'same-people': {
        const titles = advised.others.map(({ content }) => titled(content.titleOfficer));
        return t('advice.same-people', {
          others: listWords(titles, i18n.language),
          people: advised.people,
        });
      }
      case 'crop-not-ripe':
      case 'crop-long-ripe': {
        const { sowing, fromDays, toDays, days } = advised.clash;
        const sown = titled(sowing.shown.content.titleOfficer);
        return t(`advice.${advised.advice}`, { sown, from: fromDays, to: toDays, count: days });
      }
      case 'moonlit':
        return t('advice.moonlit', { marker, day: dates.day(advised.day) });
      case 'drifted': {
        const { since, days } = advised;
        const way = days > 0 ? 'advice.driftedLater' : 'advice.driftedEarlier';
        return t(way, { marker, year: since, count: Math.abs(days) });
      }
      default:
        return t(`advice.${advised.advice}`, { marker });
    }
  };
}
