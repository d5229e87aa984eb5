import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { rainInput, type RainInput } from '#shared/contracts/weather.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { CountField, LineField } from '#src/ui/said-fields.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useWeather } from '../api/weather-mutations.js';
import type { WeatherFormProps } from './weather-board.js';

/** Rain of a day: measured, in words, or both. */
export default function RainForm({ communityId, today, onDone }: WeatherFormProps) {
  const { t } = useTranslation('weather');
  const words = useProblemWords();
  const say = useToast();
  const { addRain } = useWeather(communityId);
  const [written, setWritten] = useState<RainInput>({ day: today, mm: null, words: '' });
  const [problems, setProblems] = useState<ReadonlyMap<string, string>>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const set = (patch: Partial<RainInput>) => {
    setWritten((before) => ({ ...before, ...patch }));
  };
  const save = async () => {
    const parsed = rainInput.safeParse(written);
    if (!parsed.success) {
      const { issues } = parsed.error;
      setProblems(new Map(issues.map(({ path, message }) => [path.join('.'), words.field(message)])));
      return;
    }
    try {
      await addRain.mutateAsync(parsed.data);
      say(t('form.rainSaved'));
      onDone();
    } catch (cause) {
      const errors = cause instanceof ApiProblem ? cause.errors : [];
      setProblems(new Map(errors.map(({ field, code, message }) => [field, words.field(code, message)])));
      setOverall(errors.length > 0 ? null : words.problem(cause));
    }
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      <TextField
        type="date"
        max={today}
        label={t('form.day')}
        value={written.day}
        problem={problems.get('day')}
        onChange={(event) => {
          set({ day: event.currentTarget.value });
        }}
      />
      <CountField
        label={t('form.mm')}
        value={written.mm}
        problem={problems.get('mm')}
        onChange={(mm) => {
          set({ mm });
        }}
      />
      <LineField
        label={t('form.rainWords')}
        hint={t('form.rainWordsHint')}
        value={written.words}
        problem={problems.get('words')}
        onChange={(said) => {
          set({ words: said });
        }}
      />
      <Button type="submit" look="main" full busy={addRain.isPending}>
        {t('form.saveRain')}
      </Button>
    </form>
  );
}
