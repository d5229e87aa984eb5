import { useTranslation } from 'react-i18next';
import { BASES, CONFIDENCES, type EventRecord } from '#shared/contracts/event-record.js';
import { TextField, TickField } from '#src/ui/field.js';
import { ChoiceField, CountField, LineField } from '#src/ui/said-fields.js';
import { setRecord, type RecordProps } from './record-parts.js';

const CHECKS = ['work', 'safety', 'late'] as const satisfies (keyof EventRecord['checked'])[];
type CheckOf = (typeof CHECKS)[number];

/** How sure it is, on what it rests, and which office read the words on which somebody may act. */
export function RecordTrust({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { trust } = form.draft.record;
  const at = (field: string) => form.at(`record.trust.${field}`);
  return (
    <div className="grid gap-4">
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <ChoiceField
          label={t('confidence.label')}
          nothing={t('choose')}
          options={CONFIDENCES}
          words={(one) => t(`confidence.${one}`)}
          value={trust.confidence}
          problem={at('confidence')}
          onChange={(confidence) => setRecord(form, 'trust', { confidence })}
        />
        <ChoiceField
          label={t('basis.label')}
          nothing={t('choose')}
          options={BASES}
          words={(one) => t(`basis.${one}`)}
          value={trust.basis}
          problem={at('basis')}
          onChange={(basis) => setRecord(form, 'trust', { basis })}
        />
      </div>
      <LineField
        label={t('confidenceBy')}
        value={trust.by}
        problem={at('by')}
        onChange={(by) => setRecord(form, 'trust', { by })}
      />
      <CountField
        label={t('sinceYear')}
        hint={t('sinceYearHint')}
        value={trust.sinceYear ?? null}
        problem={at('sinceYear')}
        onChange={(year) => {
          form.change(({ record }) => {
            const { sinceYear: _before, ...rest } = record.trust;
            return { record: { ...record, trust: year === null ? rest : { ...rest, sinceYear: year } } };
          });
        }}
      />
      <fieldset className="grid gap-3">
        <legend className="field-label">{t('check.title')}</legend>
        {CHECKS.map((of) => (
          <CheckFields key={of} form={form} of={of} />
        ))}
      </fieldset>
    </div>
  );
}

function CheckFields({ form, of }: RecordProps & { of: CheckOf }) {
  const { t } = useTranslation('record');
  const check = form.draft.record.checked[of];
  const at = (field: string) => form.at(`record.checked.${of}.${field}`);
  const set = (patch: Partial<NonNullable<typeof check>>) => {
    if (check !== null) setRecord(form, 'checked', { [of]: { ...check, ...patch } });
  };
  return (
    <div className="grid gap-3">
      <TickField
        label={t(`check.${of}`)}
        checked={check !== null}
        onChange={(event) =>
          setRecord(form, 'checked', {
            [of]: event.currentTarget.checked ? { office: '', name: '', day: '' } : null,
          })
        }
      />
      {check !== null && (
        <div className="grid gap-4 border-s-4 border-hairline ps-4 @min-[34rem]:grid-cols-3">
          <LineField
            label={t('check.office')}
            value={check.office}
            problem={at('office')}
            onChange={(office) => {
              set({ office });
            }}
          />
          <LineField
            label={t('check.name')}
            value={check.name}
            problem={at('name')}
            onChange={(name) => {
              set({ name });
            }}
          />
          <TextField
            type="date"
            label={t('check.day')}
            value={check.day}
            problem={at('day')}
            onChange={(event) => {
              set({ day: event.currentTarget.value });
            }}
          />
        </div>
      )}
    </div>
  );
}
