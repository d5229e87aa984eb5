import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { Check, Users } from 'lucide-react';
import { useId, useState, type ReactNode } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { group as groupSchema, groupInput, type Group, type GroupInput } from '#shared/contracts/sharing.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useRoles } from '#src/lib/community.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { listWords } from '#src/lib/list-words.js';
import { useSession } from '#src/lib/session.js';
import { villagePeopleQuery } from '#src/lib/sharing-queries.js';
import { Button } from '#src/ui/button.js';
import { FieldNotes, TextField, TickField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAddGroup, useUpdateGroup } from '../api/sharing-mutations.js';

const FIELDS = ['name', 'memberIds'] as const;

export function FoundGroupForm({ communityId }: { communityId: string }) {
  const { t } = useTranslation('sharing');
  const say = useToast();
  const add = useAddGroup(communityId);
  return (
    <GroupForm
      communityId={communityId}
      start={{ name: '', memberIds: [] }}
      known={[]}
      isBusy={add.isPending}
      note={<p className="text-small text-umber-soft">{t('groups.foundNote')}</p>}
      button={t('groups.foundNow')}
      onSave={async (values) => {
        const { name } = await add.mutateAsync(values);
        say(t('groups.founded', { name }));
        return 'emptied';
      }}
    />
  );
}

export function ChangeGroupForm({
  communityId,
  group,
  onDone,
}: {
  communityId: string;
  group: Group;
  onDone: () => void;
}) {
  const { t, i18n } = useTranslation('sharing');
  const say = useToast();
  const [newer, setNewer] = useState<string | null>(null);
  const update = useUpdateGroup(communityId);
  const known = group.members ?? [];
  return (
    <GroupForm
      communityId={communityId}
      start={{ name: group.name, memberIds: known.map(({ id }) => id) }}
      known={known}
      isBusy={update.isPending}
      note={
        newer === null ? null : (
          <Care role="alert">
            <p>{newer}</p>
          </Care>
        )
      }
      button={t('groups.save')}
      onSave={async (values) => {
        try {
          await update.mutateAsync({ groupId: group.id, ...values, version: group.version });
        } catch (cause) {
          const newer =
            cause instanceof ApiProblem && cause.slug === 'stale'
              ? groupSchema.safeParse(cause.current)
              : null;
          if (!newer?.success) throw cause;
          // What is typed stays; saving again puts it over what somebody else saved meanwhile.
          const names = (newer.data.members ?? []).map(({ displayName }) => displayName);
          setNewer(t('groups.stale', { name: newer.data.name, people: listWords(names, i18n.language) }));
          return 'kept';
        }
        say(t('groups.saved', { name: values.name }));
        onDone();
        return 'kept';
      }}
    />
  );
}

interface GroupFormProps {
  communityId: string;
  start: GroupInput;
  /** Its people so far, for those who may not read who else is of the village. */
  known: readonly { id: string; displayName: string }[];
  isBusy: boolean;
  note: ReactNode;
  button: string;
  onSave: (values: GroupInput) => Promise<'emptied' | 'kept'>;
}

function GroupForm({ communityId, start, known, isBusy, note, button, onSave }: GroupFormProps) {
  const { t } = useTranslation('sharing');
  const readsPeople = useRoles().is('steward', 'officer', 'elder');
  const people = useQuery({ ...villagePeopleQuery(communityId), enabled: readsPeople });
  const me = useSession().person?.id;
  const form = useForm({ resolver: zodResolver(groupInput), defaultValues: start });
  const problems = useFormProblems(form, FIELDS);
  const submit = async (values: GroupInput) => {
    try {
      if ((await onSave(values)) === 'emptied') form.reset(start);
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
        {...form.register('name')}
        label={t('groups.name')}
        hint={t('groups.nameHint')}
        problem={problems.at('name')}
        autoComplete="off"
      />
      <Controller
        control={form.control}
        name="memberIds"
        render={({ field }) => (
          <>
            <PeopleTicks
              people={people.data ?? known}
              value={field.value}
              problem={problems.at('memberIds')}
              onChange={field.onChange}
            />
            {!readsPeople && <p className="text-small text-umber-soft">{t('groups.onlyKnown')}</p>}
            {me !== undefined && start.memberIds.includes(me) && !field.value.includes(me) && (
              <Care>
                <p>{t('groups.leaving')}</p>
              </Care>
            )}
          </>
        )}
      />
      {note}
      <div>
        <Button
          type="submit"
          look="main"
          busy={isBusy}
          icon={known.length > 0 ? <Check aria-hidden size={22} /> : <Users aria-hidden size={22} />}
        >
          {button}
        </Button>
      </div>
    </form>
  );
}

interface PeopleTicksProps {
  people: readonly { id: string; displayName: string }[];
  value: readonly string[];
  problem: string | undefined;
  onChange: (ids: string[]) => void;
}

function PeopleTicks({ people, value, problem, onChange }: PeopleTicksProps) {
  const { t } = useTranslation('sharing');
  const id = useId();
  return (
    <fieldset>
      <legend className="field-label">{t('groups.people')}</legend>
      <div className="grid gap-1">
        {people.map((person) => (
          <TickField
            key={person.id}
            label={person.displayName}
            checked={value.includes(person.id)}
            aria-invalid={problem !== undefined || undefined}
            onChange={(event) => {
              const { checked } = event.currentTarget;
              const others = value.filter((each) => each !== person.id);
              onChange(checked ? [...others, person.id] : others);
            }}
          />
        ))}
      </div>
      <FieldNotes inputId={id} problem={problem} />
    </fieldset>
  );
}
