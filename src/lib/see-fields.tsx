import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { z } from 'zod';
import { sightingInput, type SightingInput } from '#shared/contracts/signs.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useFormProblems } from './form-problems.js';
import { useSession } from './session.js';

const FIELDS = ['signId', 'day', 'who'] as const;
const seeForm = sightingInput.extend({ signId: z.uuid('choose-one') });
type SeeForm = z.infer<typeof seeForm>;

export interface SeeFieldsProps {
  /** Says it to the server. */
  mark: (signId: string, body: SightingInput) => Promise<unknown>;
  /** One is asked about no more; of several the person chooses. */
  signs: readonly { id: string; name: string; look: string }[];
  /** The civil day at the village. */
  today: string;
  onDone: () => void;
}

/** Which sign, on which day, and by whom. */
export default function SeeFields({ mark, signs, today, onDone }: SeeFieldsProps) {
  const { t } = useTranslation('signs');
  const say = useToast();
  const { person } = useSession();
  const [first] = signs;
  const form = useForm({
    resolver: zodResolver(seeForm),
    defaultValues: {
      signId: signs.length === 1 ? (first?.id ?? '') : '',
      day: today,
      who: person?.displayName ?? '',
    },
  });
  const problems = useFormProblems(form, FIELDS);
  const submit = async ({ signId, day, who }: SeeForm) => {
    try {
      await mark(signId, { day, who });
      say(t('see.saved', { name: signs.find(({ id }) => id === signId)?.name ?? '' }));
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
      {signs.length === 1 ? (
        <p>
          <strong>{first?.name}</strong> {first?.look}
        </p>
      ) : (
        <SelectField {...form.register('signId')} label={t('see.which')} problem={problems.at('signId')}>
          <option value="">{t('entry.chooseNone')}</option>
          {signs.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
      )}
      <TextField
        {...form.register('day')}
        type="date"
        max={today}
        label={t('see.day')}
        problem={problems.at('day')}
      />
      <TextField
        {...form.register('who')}
        label={t('see.who')}
        hint={t('see.whoHint')}
        problem={problems.at('who')}
      />
      <Button type="submit" look="main" full busy={form.formState.isSubmitting}>
        {t('see.save')}
      </Button>
    </form>
  );
}
