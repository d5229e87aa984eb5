import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { Mail } from 'lucide-react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { resetLetterInput } from '#shared/contracts/letters.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { letterServiceQuery, useAskForReset } from '../api/reset-api.js';
import { Door } from './door.js';

const FIELDS = ['email'] as const;

export function AskForResetForm() {
  const { t } = useTranslation('letters');
  const off = useQuery(letterServiceQuery).data?.on === false;
  const ask = useAskForReset();
  const form = useForm({
    resolver: zodResolver(resetLetterInput),
    defaultValues: { email: '' },
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);
  return (
    <Door title={t('reset.title')} lead={t(off ? 'reset.off' : 'reset.lead')}>
      {ask.isSuccess && <p role="status">{t('reset.asked')}</p>}
      {!off && !ask.isSuccess && (
        <Board>
          <form
            noValidate
            className="grid gap-4 pt-2"
            onSubmit={(event) => {
              void form.handleSubmit((values) => ask.mutateAsync(values).catch(problems.show))(event);
            }}
          >
            {problems.overall !== undefined && (
              <Care blocked role="alert">
                <p>{problems.overall}</p>
              </Care>
            )}
            <TextField
              {...form.register('email')}
              label={t('reset.email')}
              problem={problems.at('email')}
              type="email"
              autoComplete="username"
              autoCapitalize="none"
            />
            <Button type="submit" look="main" full busy={ask.isPending} icon={<Mail aria-hidden size={22} />}>
              {t('reset.submit')}
            </Button>
          </form>
        </Board>
      )}
      <div>
        <Link className="link-line" to={paths.signIn()}>
          {t('reset.toSignIn')}
        </Link>
      </div>
    </Door>
  );
}
