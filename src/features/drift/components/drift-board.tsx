import { Download, Table2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { driftEndpoints, type DriftAnswer } from '#shared/contracts/drift.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { apiUrl } from '#src/lib/api-client.js';
import { useDateWords } from '#src/lib/date-words.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { ButtonAnchor } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { DriftPicture } from '#src/ui/pictures/drift-picture.js';
import { Board } from '#src/ui/surfaces.js';
import { driftRuns, driftScale, plainDate, type DriftPoint } from '../model/drift-line.js';
import { DriftTable } from './drift-table.js';
import { DriftTurns } from './drift-turns.js';
import { usePaceWords } from './use-pace-words.js';

/** Names of days and months are those of any year. */
const PLAIN_YEAR = 2027;

export interface DriftBoardProps {
  drift: DriftAnswer;
  star: string;
  placeId: string;
  phenomenon: Phenomenon;
  /** The year on screen; it carries the peg where it lies within the years shown. */
  yearInUse: number;
}

/** The day through the centuries as a picture with its range, a sentence, a table and a file. */
export function DriftBoard(props: DriftBoardProps) {
  const { drift, star, placeId, phenomenon, yearInUse } = props;
  const { t } = useTranslation(['drift', 'sky', 'common']);
  const dates = useDateWords();
  const paces = usePaceWords();
  const isWide = useWideScreen();
  const runs = driftRuns(drift.epochs, phenomenon);
  const pace = paces.sentence(drift.daysPerCentury[phenomenon]);
  const words = {
    star,
    phenomenon: t(`sky:phenomenon.${phenomenon}`),
    from: dates.year(drift.from),
    to: dates.year(drift.to),
  };
  const points = runs.flat();
  const [first, last] = [points[0], points.at(-1)];
  const dayOf = (point: DriftPoint) => dates.day({ ...point.date, year: PLAIN_YEAR });
  const why = whyNever(drift.epochs, phenomenon);
  const inUse = points.find(({ year }) => year === yearInUse) ?? null;
  return (
    <Board
      title={t('picture.title')}
      beside={
        <ButtonAnchor
          href={apiUrl(driftEndpoints.csv, {
            params: { placeId, markerKey: drift.markerKey },
            query: { from: drift.from, to: drift.to },
          })}
          download
          aria-label={t('csvLabel')}
          icon={<Download aria-hidden size={20} />}
        >
          {t('csv')}
        </ButtonAnchor>
      }
    >
      {first && last ? (
        <>
          <Picture
            {...props}
            runs={runs}
            inUse={inUse}
            isWide={isWide}
            label={t('picture.label', {
              ...words,
              first: dayOf(first),
              firstYear: dates.year(first.year),
              last: dayOf(last),
              lastYear: dates.year(last.year),
              pace,
            })}
          />
          <p className="mt-2">
            <strong>{pace}</strong>{' '}
            {inUse !== null && t('picture.peg', { year: dates.year(yearInUse), day: dayOf(inUse) })}
          </p>
          <p className="text-small text-umber-soft">{t('picture.read')}</p>
        </>
      ) : (
        <p className="text-lead">
          {t('picture.none')} {why !== null && t(`picture.why.${why}`)}
        </p>
      )}
      <DriftTurns turns={drift.turns.filter((turn) => turn.phenomenon === phenomenon)} />
      <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
        <DriftTable {...props} caption={t('table.caption', words)} />
      </More>
    </Board>
  );
}

interface PictureProps extends DriftBoardProps {
  runs: readonly (readonly DriftPoint[])[];
  inUse: DriftPoint | null;
  isWide: boolean;
  label: string;
}

function Picture({ drift, phenomenon, runs, inUse, isWide, label }: PictureProps) {
  const dates = useDateWords();
  const scale = driftScale(runs, drift, isWide ? 8 : 4);
  const x = (year: number) => ((year - scale.fromYear) / (scale.toYear - scale.fromYear)) * 100;
  const y = (season: number) => ((season - scale.top) / (scale.bottom - scale.top)) * 100;
  return (
    <DriftPicture
      runs={runs.map((run) =>
        run.map(({ year, early, expected, late }) => ({
          x: x(year),
          early: early && y(early),
          expected: y(expected),
          late: late && y(late),
        })),
      )}
      side={endOfNight(phenomenon)}
      label={label}
      height={isWide ? 320 : 240}
      across={scale.days.map((day) => ({ at: y(day), words: dates.day(plainDate(day), 'short') }))}
      down={scale.years.map((year) => ({ at: x(year), words: dates.year(year) }))}
      peg={inUse && { x: x(inUse.year), y: y(inUse.expected) }}
    />
  );
}

/** The one reason why no year has the day; null where the reasons differ. */
function whyNever(epochs: DriftAnswer['epochs'], phenomenon: Phenomenon) {
  const reasons = epochs.map(({ outcome, outcomeDetail, phenomena }) =>
    outcome === 'rises-and-sets' ? phenomena[phenomenon].outcome : (outcomeDetail ?? outcome),
  );
  const [first] = reasons;
  if (first === undefined || first === 'dated' || first === 'none-in-this-year') return null;
  return reasons.every((reason) => reason === first) ? first : null;
}
