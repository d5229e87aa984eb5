import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { PASSWORD_MIN } from '#shared/contracts/people.js';
import { changePasswordInput, type ChangePasswordInput } from '#shared/contracts/session.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useChangePassword } from '../api/session-mutations.js';
import { PasswordField } from './password-field.js';

const FIELDS = ['currentPassword', 'newPassword'] as const;
const EMPTY = { currentPassword: '', newPassword: '' };

export function ChangePasswordForm() {
  const { t } = useTranslation('session');
  const say = useToast();
  const change = useChangePassword();
  const form = useForm({
    resolver: zodResolver(changePasswordInput),
    defaultValues: EMPTY,
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);

  const submit = async (values: ChangePasswordInput) => {
    try {
      await change.mutateAsync(values);
      form.reset(EMPTY);
      say(t('account.passwordChanged'));
    } catch (cause) {
      problems.show(cause);
    }
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        void form.handleSubmit(submit)(event);
      }}
    >
      {problems.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problems.overall}</p>
        </Care>
      )}
      <PasswordField
        {...form.register('currentPassword')}
        label={t('account.currentPassword')}
        problem={problems.at('currentPassword')}
        autoComplete="current-password"
      />
      <PasswordField
        {...form.register('newPassword')}
        label={t('account.newPassword')}
        hint={t('passwordHint', { count: PASSWORD_MIN })}
        problem={problems.at('newPassword')}
        autoComplete="new-password"
      />
      <div>
        <Button type="submit" busy={change.isPending}>
          {t('account.savePassword')}
        </Button>
      </div>
    </form>
  );
}
