import { zodResolver } from '@hookform/resolvers/zod';
import { ArrowRight } from 'lucide-react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { PASSWORD_MIN } from '#shared/contracts/people.js';
import { redeemCodeInput } from '#shared/contracts/session.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useRedeemCode } from '../api/session-mutations.js';
import { Door } from './door.js';
import { PasswordField } from './password-field.js';

const FIELDS = ['email', 'code', 'newPassword'] as const;

export function RedeemCodeForm({ code }: { code: string }) {
  const { t } = useTranslation('session');
  const redeem = useRedeemCode();
  const form = useForm({
    resolver: zodResolver(redeemCodeInput),
    defaultValues: { email: '', code, newPassword: '' },
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);
  return (
    <Door title={t('welcome.title')} lead={t('welcome.lead')}>
      <Board>
        <form
          noValidate
          className="grid gap-4 pt-2"
          onSubmit={(event) => {
            void form.handleSubmit((values) => redeem.mutateAsync(values).catch(problems.show))(event);
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
          <TextField
            {...form.register('code')}
            label={t('welcome.code')}
            hint={t('welcome.codeHint')}
            problem={problems.at('code')}
            autoComplete="one-time-code"
            autoCapitalize="characters"
            spellCheck={false}
          />
          <PasswordField
            {...form.register('newPassword')}
            label={t('welcome.newPassword')}
            hint={t('passwordHint', { count: PASSWORD_MIN })}
            problem={problems.at('newPassword')}
            autoComplete="new-password"
          />
          <Button
            type="submit"
            look="main"
            full
            busy={redeem.isPending}
            icon={<ArrowRight aria-hidden className="turns" size={22} />}
          >
            {t('welcome.submit')}
          </Button>
        </form>
      </Board>
      <div>
        <Link className="link-line" to={paths.signIn()}>
          {t('welcome.toSignIn')}
        </Link>
      </div>
    </Door>
  );
}
