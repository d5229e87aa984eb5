import { zodResolver } from '@hookform/resolvers/zod';
import { LogIn } from 'lucide-react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { signInInput } from '#shared/contracts/session.js';
import { ARRIVED } from '#src/lib/arrival.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { paths, safeNext } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useSignIn } from '../api/session-mutations.js';
import { Door } from './door.js';
import { PasswordField } from './password-field.js';

const FIELDS = ['email', 'password'] as const;

export function SignInPage() {
  const { t } = useTranslation('session');
  const { person } = useSession();
  const [search] = useSearchParams();
  const signIn = useSignIn();
  const form = useForm({
    resolver: zodResolver(signInInput),
    defaultValues: { email: '', password: '' },
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);
  const next = search.get('next');

  if (person !== null) return <Navigate to={safeNext(next)} state={ARRIVED} replace />;
  return (
    <Door title={t('signIn.title')} lead={next !== null && next !== '/' ? t('signIn.needed') : undefined}>
      <Board>
        <form
          noValidate
          className="grid gap-4 pt-2"
          onSubmit={(event) => {
            void form.handleSubmit((values) => signIn.mutateAsync(values).catch(problems.show))(event);
          }}
        >
          {problems.overall !== undefined && (
            <Care blocked role="alert">
              <p>{problems.overall}</p>
            </Care>
          )}
          <TextField
            {...form.register('email')}
            label={t('signIn.email')}
            problem={problems.at('email')}
            type="email"
            autoComplete="username"
            autoCapitalize="none"
          />
          <PasswordField
            {...form.register('password')}
            label={t('signIn.password')}
            problem={problems.at('password')}
            autoComplete="current-password"
          />
          <Button
            type="submit"
            look="main"
            full
            busy={signIn.isPending}
            icon={<LogIn aria-hidden className="turns" size={22} />}
          >
            {t('signIn.submit')}
          </Button>
        </form>
      </Board>
      <div>
        <Link className="link-line" to={paths.card()}>
          {t('signIn.haveCard')}
        </Link>
        <p className="mb-3 text-small text-umber-soft">{t('signIn.haveCardHint')}</p>
        <Link className="link-line" to={paths.welcome()}>
          {t('signIn.haveCode')}
        </Link>
        <p className="text-small text-umber-soft">{t('signIn.haveCodeHint')}</p>
        <p className="mt-3">
          <Link className="link-line" to={paths.reset()}>
            {t('signIn.forgotten')}
          </Link>
        </p>
      </div>
    </Door>
  );
}
