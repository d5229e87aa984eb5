import { zodResolver } from '@hookform/resolvers/zod';
import { Check } from 'lucide-react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import { PASSWORD_MIN } from '#shared/contracts/people.js';
import { resetPasswordInput, type ResetPasswordInput } from '#shared/contracts/session.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useResetPassword } from '../api/reset-api.js';
import { Door } from './door.js';
import { PasswordField } from './password-field.js';

const FIELDS = ['newPassword'] as const;

/** What the link of a letter opens. */
export function NewPasswordForm({ token }: { token: string }) {
  const { t } = useTranslation(['letters', 'session']);
  const navigate = useNavigate();
  const reset = useResetPassword();
  const form = useForm({
    resolver: zodResolver(resetPasswordInput),
    defaultValues: { token, newPassword: '' },
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);
  // The token has no field: what is said about it stands over the form.
  const overall = problems.overall ?? problems.at('token');
  const submit = async (values: ResetPasswordInput) => {
    try {
      await reset.mutateAsync(values);
      await navigate(paths.today(), { replace: true });
    } catch (cause) {
      problems.show(cause);
    }
  };
  return (
    <Door title={t('reset.newTitle')} lead={t('reset.newLead')}>
      <Board>
        <form
          noValidate
          className="grid gap-4 pt-2"
          onSubmit={(event) => {
            void form.handleSubmit(submit)(event);
          }}
        >
          {overall !== undefined && (
            <Care blocked role="alert">
              <p>{overall}</p>
            </Care>
          )}
          <PasswordField
            {...form.register('newPassword')}
            label={t('reset.newPassword')}
            hint={t('session:passwordHint', { count: PASSWORD_MIN })}
            problem={problems.at('newPassword')}
            autoComplete="new-password"
          />
          <Button
            type="submit"
            look="main"
            full
            busy={reset.isPending}
            icon={<Check aria-hidden size={22} />}
          >
            {t('reset.save')}
          </Button>
        </form>
      </Board>
      <div>
        <Link className="link-line" to={paths.reset()}>
          {t('reset.title')}
        </Link>
      </div>
    </Door>
  );
}
