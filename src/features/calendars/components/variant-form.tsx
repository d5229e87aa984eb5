import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { BASES, CONFIDENCES } from '#shared/contracts/event-record.js';
import { VARIANT_DIFFERENCES, type Variant } from '#shared/contracts/variants.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { PersonSelect, SharingFields } from '#src/lib/sharing-fields.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextAreaField, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSaveVariant } from '../api/variant-queries.js';
import { problemsFrom, type FieldProblems } from '../model/field-problems.js';
import type { FormState } from '../model/form-state.js';
import { signOf } from '../model/signs.js';
import type { Editor } from '../model/use-editor.js';
import { variantDraftOf, variantOf, variantProblems, type VariantDraft } from '../model/variant-draft.js';
import { ChooseLead } from './choose-lead.js';
import { LateFields, SignsFields } from './other-fields.js';
import { WhenFields } from './when-fields.js';

interface VariantFormProps {
  editor: Editor;
  /** The form of the entry beside which it stands. */
  beside: FormState;
  saved: Variant | null;
  onClose: () => void;
}

/** One other timing: whose it is, when they count it, and who may see it. */
export function VariantForm({ editor, beside, saved, onClose }: VariantFormProps) {
  const { t } = useTranslation(['variants', 'sharing', 'calendars', 'common']);
  const words = useProblemWords();
  const say = useToast();
  const save = useSaveVariant(beside.calendarId, beside.entryId);
  const [draft, setDraft] = useState<VariantDraft>(() =>
    variantDraftOf(beside.content, saved?.content ?? null),
  );
  const [problems, setProblems] = useState<FieldProblems>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const [isChoosing, setIsChoosing] = useState(false);
  const { own, timing } = draft;
  const at = (field: string) => {
    const problem = problems.get(field);
    return problem && words.field(problem.code, problem.message);
  };
  const form: FormState = {
    ...beside,
    draft: timing,
    content: { ...beside.content, ...variantOf(draft) },
    dates: saved?.dates ?? null,
    change: (change) => {
      setDraft((now) => ({
        ...now,
        timing: { ...now.timing, ...(typeof change === 'function' ? change(now.timing) : change) },
      }));
    },
    at,
    sign: timing.leadType === 'sky' ? signOf(editor.signs, timing.sky.spec) : null,
  };
  const setOwn = (changes: Partial<VariantDraft['own']>) => {
    setDraft((now) => ({ ...now, own: { ...now.own, ...changes } }));
  };
  const send = async () => {
    const content = variantOf(draft);
    const found = variantProblems(content);
    setProblems(found);
    setOverall(null);
    if (found.size > 0) return;
    try {
      await save.send({ content, saved: saved && { variantId: saved.variantId, version: saved.version } });
      say(t('saved'));
      onClose();
    } catch (cause) {
      const refused = cause instanceof ApiProblem ? problemsFrom(cause.errors) : new Map();
      setProblems(refused);
      if (refused.size === 0) setOverall(words.problem(cause));
    }
  };
  return (
    <div className="mt-3 grid gap-4">
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      <TextField
        label={t('giver')}
        hint={t('giverHint')}
        value={own.giver}
        problem={at('giver')}
        onChange={(event) => {
          setOwn({ giver: event.currentTarget.value });
        }}
      />
      <PersonSelect
        label={t('sharing:giver')}
        hint={t('sharing:giverHint')}
        nobody={t('sharing:giverMe')}
        value={own.giverId}
        problem={at('giverId')}
        onChange={(giverId) => {
          setOwn({ giverId });
        }}
      />
      <PickGroup
        label={t('difference.label')}
        stacked
        value={own.difference}
        onChange={(difference) => {
          setOwn({ difference });
        }}
        options={VARIANT_DIFFERENCES.map((value) => ({
          value,
          label: t(`difference.${value}.name`),
          note: t(`difference.${value}.note`),
        }))}
      />
      {own.difference !== 'not-on-a-board' && (
        <>
          <WhenFields form={form} timingOnly onSearch={() => setIsChoosing(true)} />
          <SignsFields form={form} />
          <LateFields form={form} />
        </>
      )}
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <SelectField
          label={t('confidence.label')}
          value={own.confidence}
          onChange={(event) => {
            const chosen = CONFIDENCES.find((one) => one === event.currentTarget.value);
            if (chosen) setOwn({ confidence: chosen });
          }}
        >
          {CONFIDENCES.map((one) => (
            <option key={one} value={one}>
              {t(`confidence.${one}`)}
            </option>
          ))}
        </SelectField>
        <SelectField
          label={t('basis.label')}
          value={own.basis}
          onChange={(event) => {
            const chosen = BASES.find((one) => one === event.currentTarget.value);
            if (chosen) setOwn({ basis: chosen });
          }}
        >
          {BASES.map((one) => (
            <option key={one} value={one}>
              {t(`basis.${one}`)}
            </option>
          ))}
        </SelectField>
      </div>
      <TextAreaField
        label={t('note')}
        rows={3}
        value={own.note}
        problem={at('note')}
        onChange={(event) => {
          setOwn({ note: event.currentTarget.value });
        }}
      />
      <SharingFields
        value={{ level: timing.sharingLevel, details: timing.sharing ?? PLAIN_DETAILS }}
        problem={(field) => at(field === 'level' ? 'sharingLevel' : `sharing.${field}`)}
        onChange={({ level, details }) => {
          form.change({ sharingLevel: level, sharing: details });
        }}
      />
      <div className="flex flex-wrap gap-3">
        <Button busy={save.isPending} onClick={() => void send()}>
          {t('save')}
        </Button>
        <Button look="quiet" onClick={onClose}>
          {t('common:cancel')}
        </Button>
      </div>
      <ChooseLead editor={editor} form={form} isOpen={isChoosing} onClose={() => setIsChoosing(false)} />
    </div>
  );
}
