import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { decisionInput, type Decision, type SeasonReview } from '#shared/contracts/season-reviews.js';
import { useDateWords } from '#src/lib/date-words.js';
import { SureButton } from '#src/lib/sure-button.js';
import { More } from '#src/ui/fold.js';
import { useToast } from '#src/ui/toast.js';
import { useSeasonWords as useSeasonWrites } from '../api/season-queries.js';
import { useSeasonWords } from '../model/season-words.js';
import { WordsForm } from './words-form.js';

interface DecisionsProps {
  review: SeasonReview;
  /** Null for the whole year. */
  entryId: string | null;
  decisions: readonly Decision[];
  decides: boolean;
}

/** What is to be done otherwise next year, and whether it is. */
export function Decisions({ review: { calendarId, year }, entryId, decisions, decides }: DecisionsProps) {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  const words = useSeasonWords();
  const { decide, removeDecision } = useSeasonWrites(calendarId);
  const say = useToast();
  const [written, setWritten] = useState(0);
  const next = year + 1;
  return (
    <section className="mt-3 grid gap-2">
      <h3 className="text-body text-umber-soft">{t('decisions.title', { year: next })}</h3>
      {decisions.length === 0 && <p>{t('decisions.none')}</p>}
      <ul className="grid gap-2">
        {decisions.map((decision) => (
          <li key={decision.id} className="well">
            <p className="whitespace-pre-line">{words.decision(decision)}</p>
            <p className="text-small text-umber-soft">
              {t('decisions.by', { by: decision.by, when: dates.moment(decision.decidedAt) })}
            </p>
            <p className="text-small">
              {decision.done === null
                ? t('decisions.waits')
                : t('decisions.done', { by: decision.done.by, day: dates.day(decision.done.on, 'year') })}
            </p>
            {decides && (
              <SureButton
                label={t('decisions.takeOut')}
                look="quiet"
                question={t('decisions.sure', { year: next })}
                what={<p>{words.decision(decision)}</p>}
                yes={t('decisions.yes')}
                act={async () => {
                  await removeDecision.mutateAsync(decision.id);
                }}
              />
            )}
          </li>
        ))}
      </ul>
      {decides && (
        <More key={written} label={t('decisions.decide', { year: next })}>
          <WordsForm
            name={`decision.${calendarId}.${entryId ?? 'year'}`}
            kindLabel={t('decisions.kind')}
            label={t('decisions.field')}
            hint={t('decisions.hint', { year: next })}
            save={t('decisions.keep')}
            isBusy={decide.isPending}
            read={({ text, kind }) => decisionInput.safeParse({ entryId, kind, text })}
            send={async (input) => {
              await decide.mutateAsync(input);
              say(t('decisions.kept', { year: next }));
              setWritten((count) => count + 1);
            }}
          />
        </More>
      )}
    </section>
  );
}
