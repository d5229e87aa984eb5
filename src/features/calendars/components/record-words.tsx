import { useTranslation } from 'react-i18next';
import { OPERATIONS } from '#shared/contracts/event-record.js';
import { plainWord } from '#shared/contracts/word-lists.js';
import { useCropDays } from '#src/lib/crop-days.js';
import { chosenValue, useWordLists, wordOptions } from '#src/lib/word-lists.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { LineField } from '#src/ui/said-fields.js';
import { setRecord, type RecordProps } from './record-parts.js';

/** The kind of work in the village's words; "something else" asks for one. */
export function OperationFields({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const lists = useWordLists();
  const { operation, ownOperation, operationWord } = form.draft.record.what;
  const at = (field: string) => form.at(`record.what.${field}`);
  const chosen = { code: operation, word: operationWord };
  const options = wordOptions(lists?.operations, OPERATIONS, (code) => t(`operation.${code}`), chosen);
  const choose = (value: string) => {
    const { operationWord: _before, ...what } = form.draft.record.what;
    const option = options.find((one) => one.value === value);
    const { code = null, word } = option ?? {};
    // What a village's own work is called stands there also where its list is not at hand.
    const own = code === 'other' && word ? { ownOperation: word.word } : {};
    form.change(({ record }) => ({
      record: { ...record, what: { ...what, operation: code, ...own, ...(word && { operationWord: word }) } },
    }));
  };
  return (
    <>
      <SelectField
        label={t('operation.label')}
        value={chosenValue(chosen)}
        problem={at('operation') ?? at('operationWord.id')}
        onChange={(event) => {
          choose(event.currentTarget.value);
        }}
      >
        <option value="">{t('choose')}</option>
        {options.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </SelectField>
      {operation === 'other' && operationWord === undefined && (
        <LineField
          label={t('ownOperation')}
          value={ownOperation}
          problem={at('ownOperation')}
          onChange={(words) => setRecord(form, 'what', { ownOperation: words })}
        />
      )}
    </>
  );
}

/** Offers the days that the village's list says of this crop, while the entry says none. Its own always count. */
export function CropLength({ form }: RecordProps) {
  const { t } = useTranslation('words');
  const lists = useWordLists();
  const cropDays = useCropDays();
  const { variety } = form.draft.record.what;
  const crop = plainWord(form.draft.crop);
  const listed = lists?.crops.items.find(({ word }) => crop !== '' && plainWord(word) === crop);
  if (!listed || variety.fromDays !== null || variety.toDays !== null) return null;
  const { fromDays, toDays } = listed;
  const days = cropDays(listed);
  if (days === '') return null;
  return (
    <div>
      <Button onClick={() => setRecord(form, 'what', { variety: { ...variety, fromDays, toDays } })}>
        {t('entry.useDays', { days })}
      </Button>
    </div>
  );
}
