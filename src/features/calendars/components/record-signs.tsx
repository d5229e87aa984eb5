import { Plus, Trash2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { RECORD_SIGNS_MAX, type RecordSign } from '#shared/contracts/event-record.js';
import { NEW_SIGN, SignWordFields } from '#src/lib/sign-word-fields.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { CountField } from '#src/ui/said-fields.js';
import { withoutSign } from '../model/record-signs.js';
import { SignFromList, SignToList, SignsToChoose } from './listed-signs.js';
import { RecordMore, setRecord, type RecordProps } from './record-parts.js';

/**
 * The signs for which people wait: of the village's list or in the entry's own words, how many are needed, and the one
 * without which nothing begins.
 */
export function RecordSigns({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { signs } = form.draft.record;
  const { list, needed, mustHave } = signs;
  return (
    <RecordMore>
      {list.map((sign, index) => (
        <OneSign key={index} form={form} sign={sign} index={index} />
      ))}
      {list.length < RECORD_SIGNS_MAX && (
        <div className="grid gap-3">
          <SignsToChoose form={form} />
          <div>
            <Button
              look="quiet"
              icon={<Plus aria-hidden size={22} />}
              onClick={() => setRecord(form, 'signs', { list: [...list, NEW_SIGN] })}
            >
              {t('signs.add')}
            </Button>
          </div>
        </div>
      )}
      {list.length > 0 && (
        <div className="grid gap-4 @min-[34rem]:grid-cols-2">
          <CountField
            label={t('signs.needed')}
            value={needed}
            problem={form.at('record.signs.needed')}
            onChange={(count) => setRecord(form, 'signs', { needed: count })}
          />
          <SelectField
            label={t('signs.mustHave')}
            value={mustHave ?? ''}
            problem={form.at('record.signs.mustHave')}
            onChange={(event) => {
              const { value } = event.currentTarget;
              setRecord(form, 'signs', { mustHave: value === '' ? null : Number(value) });
            }}
          >
            <option value="">{t('signs.noneOfThem')}</option>
            {list.map(({ name }, index) => (
              <option key={index} value={index}>
                {name === '' ? t('signs.one', { number: index + 1 }) : name}
              </option>
            ))}
          </SelectField>
        </div>
      )}
    </RecordMore>
  );
}

interface OneSignProps extends RecordProps {
  sign: RecordSign;
  index: number;
}

function OneSign({ form, sign, index }: OneSignProps) {
  const { t } = useTranslation('record');
  const at = (field: string) => form.at(`record.signs.list.${index}.${field}`);
  const set = (patch: Partial<RecordSign>) => {
    const { list } = form.draft.record.signs;
    setRecord(form, 'signs', {
      list: list.map((one, place) => (place === index ? { ...one, ...patch } : one)),
    });
  };
  return (
    <fieldset className="grid gap-3 border-s-4 border-hairline ps-4">
      <legend className="field-label">{t('signs.one', { number: index + 1 })}</legend>
      {sign.sharedId === undefined ? (
        <SignWordFields sign={sign} at={at} set={set} />
      ) : (
        <SignFromList sign={sign} problem={at('sharedId')} />
      )}
      <div className="flex flex-wrap items-end justify-between gap-3">
        {sign.sharedId === undefined && <SignToList draft={form.draft} sign={sign} onListed={set} />}
        <Button
          look="quiet"
          icon={<Trash2 aria-hidden size={20} />}
          onClick={() => setRecord(form, 'signs', withoutSign(form.draft.record.signs, index))}
        >
          {t('signs.remove')}
        </Button>
      </div>
    </fieldset>
  );
}
