import { Table2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { AirAnswer, AirOccurrence } from '#shared/contracts/air.js';
import { CLARITIES, THRESHOLD_SETS, type Phenomenon } from '#shared/sky/vocabulary.js';
import { markerName } from '#src/lib/marker-names.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { More } from '#src/ui/fold.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Board } from '#src/ui/surfaces.js';
import { agreementOf, spreadDays } from '../model/air-days.js';
import { useAirWords, type AirWords } from './air-words.js';
import { MinutesPicture } from './minutes-picture.js';
import { MinutesTable } from './minutes-table.js';

/** One of the four days: by the village's rule, by the model in three airs, by every published rule. */
export function PhenomenonBoard({ answer, phenomenon }: { answer: AirAnswer; phenomenon: Phenomenon }) {
  const { t } = useTranslation(['air', 'sky']);
  const words = useAirWords(answer.year);
  const { outcome, occurrences } = answer.phenomena[phenomenon];
  return (
    <Board
      title={
        <span className="flex items-center gap-2">
          <PhenomenonIcon phenomenon={phenomenon} size={28} />
          {t(`sky:phenomenonTitle.${phenomenon}`)}
        </span>
      }
    >
      {occurrences.length === 0 && <p>{t(`noRule.${outcome}`, { year: answer.year })}</p>}
      {occurrences.map((occurrence, index) => (
        <div
          key={occurrence.rule?.expected.dayNumber ?? index}
          className={
            index > 0 ? 'mt-5 grid grid-cols-[minmax(0,1fr)] gap-3' : 'grid grid-cols-[minmax(0,1fr)] gap-3'
          }
        >
          {index > 0 && <p className="text-small text-umber-soft">{t('again')}</p>}
          <OccurrenceDays answer={answer} occurrence={occurrence} phenomenon={phenomenon} words={words} />
        </div>
      ))}
    </Board>
  );
}

interface OccurrenceProps {
  answer: AirAnswer;
  occurrence: AirOccurrence;
  phenomenon: Phenomenon;
  words: AirWords;
}

function OccurrenceDays(props: OccurrenceProps) {
  const { answer, occurrence, phenomenon, words } = props;
  const { t } = useTranslation('air');
  const side = endOfNight(phenomenon);
  const { rule, ruleClarity, ruleWidth, byModel, nights } = occurrence;
  const spread = spreadDays(occurrence);
  const agreement = agreementOf(occurrence);
  const { outcome } = answer.phenomena[phenomenon];
  return (
    <>
      <dl className="facts">
        <dt>{t('rule')}</dt>
        <dd>
          {rule === null
            ? t(`noRule.${outcome}`, { year: answer.year })
            : t(`ruleDay.${side}`, { about: words.about(rule) })}
          {ruleClarity !== null && ruleClarity !== 'ordinary' && (
            <span className="range-line">{t(`ruleAir.${ruleClarity}`)}</span>
          )}
          {ruleWidth !== null && <span className="range-line">{words.width(ruleWidth)}</span>}
        </dd>
        {CLARITIES.map((clarity) => {
          const day = byModel[clarity];
          return (
            <div key={clarity} className="contents">
              <dt>{t('modelIn', { air: t(`air.${clarity}`) })}</dt>
              <dd>{day === null ? t('noModelDay') : words.modelDay(day, side, nights.length > 0)}</dd>
            </div>
          );
        })}
      </dl>
      {nights.length > 0 ? <Minutes {...props} /> : <p className="text-small">{t('atSkyline')}</p>}
      <p>
        {spread !== null && (spread === 0 ? t('spreadNone') : t('spread', { count: spread }))}{' '}
        {agreement !== null && t(`within.${agreement}`)}
      </p>
      <Sets {...props} />
    </>
  );
}

function Minutes({ answer, occurrence, phenomenon, words }: OccurrenceProps) {
  const { t } = useTranslation(['air', 'common']);
  const { nights } = occurrence;
  const side = endOfNight(phenomenon);
  const star = markerName(answer);
  const span = { first: nights[0]?.dayNumber ?? 0, last: nights.at(-1)?.dayNumber ?? 0 };
  const dayAt = (dayNumber: number) => words.dayAt(occurrence, dayNumber);
  return (
    <div>
      <h3 className="mb-1 text-small text-umber-soft">{t('minutes')}</h3>
      <MinutesPicture
        occurrence={occurrence}
        span={span}
        side={side}
        label={words.picture(occurrence, side, star)}
      />
      <div className="mt-1 flex justify-between ps-18 text-small text-umber-soft" aria-hidden>
        <span>{dayAt(span.first)}</span>
        <span>{dayAt(span.last)}</span>
      </div>
      <p className="mt-1 text-small text-umber-soft">{t('minutesRead')}</p>
      <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
        <MinutesTable nights={nights} star={star} dayAt={dayAt} />
      </More>
    </div>
  );
}

function Sets({ answer, occurrence, phenomenon, words }: OccurrenceProps) {
  const { t } = useTranslation('air');
  const side = endOfNight(phenomenon);
  return (
    <More label={t('sets')}>
      <dl className="facts mt-2">
        {THRESHOLD_SETS.map((set) => {
          const days = occurrence.bySet[set];
          return (
            <div key={set} className="contents">
              <dt>
                {t(`set.${set}`)}
                {set === answer.basis.thresholdSet && (
                  <span className="block text-small text-umber-soft">{t('setInUse')}</span>
                )}
              </dt>
              <dd>{days === null ? t('noSetDay') : t(`ruleDay.${side}`, { about: words.about(days) })}</dd>
            </div>
          );
        })}
      </dl>
      <p className="mt-2 text-small text-umber-soft">{t('setsNote')}</p>
    </More>
  );
}
