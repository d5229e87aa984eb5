import { zodResolver } from '@hookform/resolvers/zod';
import { Check } from 'lucide-react';
import { useEffect, useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import {
  community as communitySchema,
  communityInput,
  type Community,
  type CommunityInput,
  type CommunityPerson,
} from '#shared/contracts/people.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { Button } from '#src/ui/button.js';
import { Columns, ThumbBar } from '#src/ui/page.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSaveCommunity } from '../api/people-mutations.js';
import { isSettings, settingsOf } from '../model/settings-form.js';
import { LocalMonthFields, MoonNameFields } from './local-month-fields.js';
import { NewerSettings } from './newer-settings.js';
import { ContactFields, NameFields, YearStartFields } from './settings-fields.js';
import { RuleFields } from './rule-fields.js';

const FIELDS = [
  'name',
  'villageLanguage.name',
  'villageLanguage.tag',
  'officerLanguage.name',
  'officerLanguage.tag',
  'yearStart.date.month',
  'yearStart.date.day',
  'yearStart.note',
  'localMonths',
  'moonNames',
  'weatherContact',
  'agricultureContact',
  'signOffRule',
] as const;

/** The steward's form. What is typed survives a reload; a newer save by somebody else is laid beside it. */
export function SettingsForm({
  community,
  elders,
}: {
  community: Community;
  elders: readonly CommunityPerson[];
}) {
  const { t } = useTranslation('people');
  const dates = useDateWords();
  const say = useToast();
  const save = useSaveCommunity(community.id);
  const { found, keptAt, keepDraft, dropDraft } = useKeptDraft(`settings.${community.id}`, isSettings);
  const [version, setVersion] = useState(found?.baseVersion ?? community.version);
  const [newer, setNewer] = useState<Community | null>(null);
  const form = useForm({
    resolver: zodResolver(communityInput),
    defaultValues: found?.value ?? settingsOf(community),
  });
  const problems = useFormProblems<CommunityInput, unknown, CommunityInput>(form, FIELDS);
  const values = useWatch({ control: form.control }) as CommunityInput;
  const dirty = JSON.stringify(values) !== JSON.stringify(settingsOf(community));

  useEffect(() => {
    if (dirty) keepDraft(values, version);
  }, [dirty, values, version, keepDraft]);

  const submit = async (settings: CommunityInput) => {
    try {
      const saved = await save.mutateAsync({ ...settings, version });
      dropDraft();
      setNewer(null);
      setVersion(saved.version);
      form.reset(settingsOf(saved));
      say(t('settings.saved'));
    } catch (cause) {
      const current =
        cause instanceof ApiProblem && cause.slug === 'stale'
          ? communitySchema.safeParse(cause.current)
          : null;
      if (current?.success) setNewer(current.data);
      else problems.show(cause);
    }
  };
  const goBack = () => {
    dropDraft();
    setVersion(community.version);
    form.reset(settingsOf(community));
  };

  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        void form.handleSubmit(submit)(event);
      }}
    >
      {newer !== null && (
        <NewerSettings
          yours={values}
          theirs={settingsOf(newer)}
          elders={elders}
          onChosen={(settings) => {
            form.reset(settings);
            setVersion(newer.version);
            setNewer(null);
          }}
        />
      )}
      {problems.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problems.overall}</p>
        </Care>
      )}
      <Columns>
        <div className="grid gap-4">
          <NameFields form={form} at={problems.at} />
          <YearStartFields form={form} at={problems.at} />
          <LocalMonthFields form={form} at={problems.at} />
        </div>
        <div className="grid gap-4">
          <ContactFields form={form} at={problems.at} />
          <RuleFields form={form} at={problems.at} elders={elders} />
          <MoonNameFields form={form} at={problems.at} />
        </div>
      </Columns>
      <ThumbBar
        note={
          dirty
            ? keptAt === null
              ? t('settings.unsaved')
              : t('settings.unsavedSince', { when: dates.moment(keptAt) })
            : undefined
        }
      >
        <Button
          type="submit"
          look="main"
          busy={save.isPending}
          icon={<Check aria-hidden size={22} />}
          closedBecause={newer === null ? undefined : t('settings.newerHint')}
        >
          {t('settings.save')}
        </Button>
        {dirty && (
          <Button look="quiet" onClick={goBack}>
            {t('settings.throwAway')}
          </Button>
        )}
      </ThumbBar>
    </form>
  );
}
