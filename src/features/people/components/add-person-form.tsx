import { zodResolver } from '@hookform/resolvers/zod';
import { UserPlus } from 'lucide-react';
import { Controller, useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { personInput, type PersonInput, type Role } from '#shared/contracts/people.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAddPerson } from '../api/people-mutations.js';
import type { IssuedCode } from './code-dialog.js';
import { RoleTicks } from './role-ticks.js';

const FIELDS = ['email', 'displayName', 'roles'] as const;
const EMPTY: { email: string; displayName: string; roles: Role[] } = {
  email: '',
  displayName: '',
  roles: ['observer'],
};

export function AddPersonForm({
  communityId,
  onCode,
  onCard,
}: {
  communityId: string;
  onCode: (issued: IssuedCode) => void;
  /** Somebody without an address was added: a card comes next. */
  onCard: (name: string) => void;
}) {
  const { t } = useTranslation('people');
  const say = useToast();
  const add = useAddPerson(communityId);
  const form = useForm({ resolver: zodResolver(personInput), defaultValues: EMPTY });
  const problems = useFormProblems(form, FIELDS);

  const submit = async (values: PersonInput) => {
    try {
      const { person, oneTimeCode } = await add.mutateAsync(values);
      form.reset(EMPTY);
      if (person.email === '') onCard(person.displayName);
      else if (oneTimeCode === null) say(t('add.joined', { name: person.displayName }));
      else onCode({ name: person.displayName, code: oneTimeCode });
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
      <TextField
        {...form.register('displayName')}
        label={t('add.name')}
        problem={problems.at('displayName')}
        autoComplete="off"
      />
      <TextField
        {...form.register('email')}
        label={t('add.email')}
        hint={t('add.emailHint')}
        problem={problems.at('email')}
        type="email"
        autoComplete="off"
      />
      <Controller
        control={form.control}
        name="roles"
        render={({ field }) => (
          <RoleTicks
            label={t('add.roles')}
            value={field.value}
            onChange={field.onChange}
            problem={problems.at('roles')}
          />
        )}
      />
      <div>
        <Button type="submit" look="main" busy={add.isPending} icon={<UserPlus aria-hidden size={22} />}>
          {t('add.submit')}
        </Button>
      </div>
    </form>
  );
}
