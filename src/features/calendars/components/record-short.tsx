import { useTranslation } from 'react-i18next';
import { REPEATS } from '#shared/contracts/event-record.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { CountField, LineField } from '#src/ui/said-fields.js';
import { CropLength, OperationFields } from './record-words.js';
import { RecordMore, setRecord, type RecordProps } from './record-parts.js';

/** Kind of work, variety and land. */
export function RecordWhat({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { what } = form.draft.record;
  const { variety } = what;
  const at = (field: string) => form.at(`record.what.${field}`);
  const setVariety = (patch: Partial<typeof variety>) => {
    setRecord(form, 'what', { variety: { ...variety, ...patch } });
  };
  return (
    <RecordMore>
      <OperationFields form={form} />
      <LineField
        label={t('varietyName')}
        value={variety.name}
        problem={at('variety.name')}
        onChange={(name) => {
          setVariety({ name });
        }}
      />
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <CountField
          label={t('varietyFrom')}
          value={variety.fromDays}
          problem={at('variety.fromDays')}
          onChange={(fromDays) => {
            setVariety({ fromDays });
          }}
        />
        <CountField
          label={t('varietyTo')}
          value={variety.toDays}
          problem={at('variety.toDays')}
          onChange={(toDays) => {
            setVariety({ toDays });
          }}
        />
      </div>
      <CropLength form={form} />
      <LineField
        label={t('land')}
        hint={t('landHint')}
        value={what.land}
        problem={at('land')}
        onChange={(land) => setRecord(form, 'what', { land })}
      />
    </RecordMore>
  );
}

/** How long before to get ready, and in which years. */
export function RecordWhen({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { when } = form.draft.record;
  const at = (field: string) => form.at(`record.when.${field}`);
  return (
    <RecordMore>
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <CountField
          label={t('leadDays')}
          value={when.leadDays}
          problem={at('leadDays')}
          onChange={(leadDays) => setRecord(form, 'when', { leadDays })}
        />
        <CountField
          label={t('graceDays')}
          value={when.graceDays}
          problem={at('graceDays')}
          onChange={(graceDays) => setRecord(form, 'when', { graceDays })}
        />
      </div>
      <SelectField
        label={t('repeats.label')}
        value={when.repeats}
        onChange={(event) => {
          const repeats = REPEATS.find((one) => one === event.currentTarget.value);
          if (repeats) setRecord(form, 'when', { repeats });
        }}
      >
        {REPEATS.map((one) => (
          <option key={one} value={one}>
            {t(`repeats.${one}`)}
          </option>
        ))}
      </SelectField>
      {when.repeats === 'every-n-years' && (
        <CountField
          label={t('everyYears')}
          value={when.everyYears}
          problem={at('everyYears')}
          onChange={(everyYears) => setRecord(form, 'when', { everyYears })}
        />
      )}
      {when.repeats !== 'yearly' && (
        <LineField
          label={t('rule')}
          hint={t('ruleHint')}
          value={when.rule}
          problem={at('rule')}
          onChange={(rule) => setRecord(form, 'when', { rule })}
        />
      )}
    </RecordMore>
  );
}

/** Where, when and in which language it was told. */
export function RecordHeard({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { heard } = form.draft.record;
  const at = (field: string) => form.at(`record.heard.${field}`);
  return (
    <RecordMore>
      <LineField
        label={t('heardWhere')}
        hint={t('heardWhereHint')}
        value={heard.where}
        problem={at('where')}
        onChange={(where) => setRecord(form, 'heard', { where })}
      />
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <TextField
          type="date"
          label={t('heardDay')}
          value={heard.day ?? ''}
          problem={at('day')}
          onChange={(event) => setRecord(form, 'heard', { day: event.currentTarget.value || null })}
        />
        <LineField
          label={t('heardLanguage')}
          value={heard.language}
          problem={at('language')}
          onChange={(language) => setRecord(form, 'heard', { language })}
        />
      </div>
    </RecordMore>
  );
}
