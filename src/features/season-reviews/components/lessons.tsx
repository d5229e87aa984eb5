import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { lessonInput, type Lesson } from '#shared/contracts/season-reviews.js';
import { useDateWords } from '#src/lib/date-words.js';
import { SureButton } from '#src/lib/sure-button.js';
import { More } from '#src/ui/fold.js';
import { useToast } from '#src/ui/toast.js';
import { useSeasonWords } from '../api/season-queries.js';
import { WordsForm } from './words-form.js';

interface LessonsProps {
  calendarId: string;
  /** Null for the whole year. */
  entryId: string | null;
  lessons: readonly Lesson[];
}

/** What people say that the year taught, each in their own words and under their own name. */
export function Lessons({ calendarId, entryId, lessons }: LessonsProps) {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  const { addLesson, removeLesson } = useSeasonWords(calendarId);
  const say = useToast();
  const [written, setWritten] = useState(0);
  return (
    <section className="mt-3 grid gap-2">
      <h3 className="text-body text-umber-soft">{t('lessons.title')}</h3>
      {lessons.length === 0 && <p>{t('lessons.none')}</p>}
      <ul className="grid gap-2">
        {lessons.map(({ id, text, by, typedBy, writtenAt, mine }) => (
          <li key={id} className="well">
            <p className="whitespace-pre-line">{text}</p>
            <p className="text-small text-umber-soft">
              {typedBy === undefined
                ? t('lessons.by', { by, when: dates.moment(writtenAt) })
                : t('lessons.typed', { by, typedBy, when: dates.moment(writtenAt) })}
            </p>
            {mine && (
              <SureButton
                label={t('lessons.takeOut')}
                look="quiet"
                question={t('lessons.sure')}
                what={<p>{text}</p>}
                yes={t('lessons.yes')}
                act={async () => {
                  await removeLesson.mutateAsync(id);
                }}
              />
            )}
          </li>
        ))}
      </ul>
      <More key={written} label={t('lessons.write')}>
        <WordsForm
          name={`lesson.${calendarId}.${entryId ?? 'year'}`}
          label={t('lessons.field')}
          hint={t('lessons.hint')}
          save={t('lessons.keep')}
          isBusy={addLesson.isPending}
          read={({ text }) => lessonInput.safeParse({ entryId, text })}
          send={async (input) => {
            await addLesson.mutateAsync(input);
            say(t('lessons.kept'));
            setWritten((count) => count + 1);
          }}
        />
      </More>
    </section>
  );
}
