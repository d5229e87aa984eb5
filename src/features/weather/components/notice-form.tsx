import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { noticeInput, type NoticeInput } from '#shared/contracts/weather.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField, TextField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useWeather } from '../api/weather-mutations.js';
import type { WeatherFormProps } from './weather-board.js';

const FIELDS = ['text', 'issuer', 'issuedOn', 'expiresOn'] as const;

/** A notice as the office issued it. It says how long it holds, so that none stays by mistake. */
export default function NoticeForm({ communityId, today, onDone }: WeatherFormProps) {
  const { t } = useTranslation('weather');
  const say = useToast();
  const { addNotice } = useWeather(communityId);
  const form = useForm({
    resolver: zodResolver(noticeInput),
    defaultValues: { text: '', issuer: '', issuedOn: today, expiresOn: '' },
  });
  const problems = useFormProblems(form, FIELDS);
  const submit = async (input: NoticeInput) => {
    try {
      await addNotice.mutateAsync(input);
      say(t('form.noticeSaved'));
      onDone();
    } catch (cause) {
      problems.show(cause);
    }
  };
  return (
    <form noValidate className="grid gap-4" onSubmit={(event) => void form.handleSubmit(submit)(event)}>
      {problems.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problems.overall}</p>
        </Care>
      )}
      <TextAreaField
        {...form.register('text')}
        rows={4}
        label={t('form.text')}
        hint={t('form.textHint')}
        problem={problems.at('text')}
      />
      <TextField {...form.register('issuer')} label={t('form.issuer')} problem={problems.at('issuer')} />
      <TextField
        {...form.register('issuedOn')}
        type="date"
        max={today}
        label={t('form.issuedOn')}
        problem={problems.at('issuedOn')}
      />
      <TextField
        {...form.register('expiresOn')}
        type="date"
        min={today}
        label={t('form.expiresOn')}
        hint={t('form.expiresHint')}
        problem={problems.at('expiresOn')}
      />
      <Button type="submit" look="main" full busy={addNotice.isPending}>
        {t('form.saveNotice')}
      </Button>
    </form>
  );
}
