import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { rainInput, type RainInput } from '#shared/contracts/weather.js';
import { useWrittenForm } from '#src/lib/written-form.js';
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
  const say = useToast();
  const { addRain } = useWeather(communityId);
  const { written, set, at, checked, refuse } = useWrittenForm<RainInput>(rainInput, {
    ...{ day: today, mm: null, words: '' },
  });
  const [overall, setOverall] = useState<string | null>(null);
  const save = async () => {
    const input = checked();
    if (input === null) return;
    try {
      await addRain.mutateAsync(input);
      say(t('form.rainSaved'));
      onDone();
    } catch (cause) {
      setOverall(refuse(cause));
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
        problem={at('day')}
        onChange={(event) => {
          set({ day: event.currentTarget.value });
        }}
      />
      <CountField
        label={t('form.mm')}
        value={written.mm}
        problem={at('mm')}
        onChange={(mm) => {
          set({ mm });
        }}
      />
      <LineField
        label={t('form.rainWords')}
        hint={t('form.rainWordsHint')}
        value={written.words}
        problem={at('words')}
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
