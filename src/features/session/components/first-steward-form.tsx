import { zodResolver } from '@hookform/resolvers/zod';
import { Check } from 'lucide-react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { PASSWORD_MIN } from '#shared/contracts/people.js';
import { firstStewardInput } from '#shared/contracts/session.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useFirstSteward } from '../api/session-mutations.js';
import { Door } from './door.js';
import { PasswordField } from './password-field.js';

const FIELDS = ['displayName', 'email', 'newPassword', 'communityName'] as const;

/** The first start of an empty installation: one person and one village. */
export function FirstStewardForm({ token }: { token: string }) {
  const { t } = useTranslation('session');
  const found = useFirstSteward();
  const form = useForm({
    resolver: zodResolver(firstStewardInput),
    defaultValues: { token, displayName: '', email: '', newPassword: '', communityName: '' },
    reValidateMode: 'onSubmit',
  });
  const problems = useFormProblems(form, FIELDS);
  return (
    <Door title={t('setup.title')} lead={t('setup.lead')}>
      <form
        noValidate
        className="grid gap-4"
        onSubmit={(event) => {
          void form.handleSubmit((values) => found.mutateAsync(values).catch(problems.show))(event);
        }}
      >
        {problems.overall !== undefined && (
          <Care blocked role="alert">
            <p>{problems.overall}</p>
          </Care>
        )}
        <Board title={t('setup.you')}>
          <div className="grid gap-4">
            <TextField
              {...form.register('displayName')}
              label={t('setup.yourName')}
              problem={problems.at('displayName')}
              autoComplete="name"
            />
            <TextField
              {...form.register('email')}
              label={t('setup.email')}
              hint={t('setup.emailHint')}
              problem={problems.at('email')}
              type="email"
              autoComplete="username"
              autoCapitalize="none"
            />
            <PasswordField
              {...form.register('newPassword')}
              label={t('welcome.newPassword')}
              hint={t('passwordHint', { count: PASSWORD_MIN })}
              problem={problems.at('newPassword')}
              autoComplete="new-password"
            />
          </div>
        </Board>
        <Board title={t('setup.village')}>
          <TextField
            {...form.register('communityName')}
            label={t('setup.villageName')}
            problem={problems.at('communityName')}
            autoComplete="off"
          />
        </Board>
        <Button type="submit" look="main" full busy={found.isPending} icon={<Check aria-hidden size={22} />}>
          {t('setup.submit')}
        </Button>
      </form>
    </Door>
  );
}
