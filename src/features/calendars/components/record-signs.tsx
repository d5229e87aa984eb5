import { Plus, Trash2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import {
  RECORD_SIGNS_MAX,
  RECORD_SIGN_TYPES,
  STILL_SEEN,
  type RecordSign,
} from '#shared/contracts/event-record.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TickField } from '#src/ui/field.js';
import { SignMarks } from '#src/ui/pictures/sign-marks.js';
import { withoutSign } from '../model/record-signs.js';
import { MonthDayFields } from './month-day-fields.js';
import {
  ChoiceField,
  CountField,
  LineField,
  RecordMore,
  setRecord,
  type RecordProps,
} from './record-parts.js';

const NEW_SIGN: RecordSign = { type: 'bird', name: '', look: '', where: '', usual: null, stillSeen: null };
const FIRST_USUAL = { from: { month: 1, day: 1 }, to: { month: 1, day: 31 } };

/** The signs for which people wait: each by itself, how many are needed, and the one without which nothing begins. */
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
        <div>
          <Button
            look="quiet"
            icon={<Plus aria-hidden size={22} />}
            onClick={() => setRecord(form, 'signs', { list: [...list, NEW_SIGN] })}
          >
            {t('signs.add')}
          </Button>
        </div>
      )}
      {list.length > 0 && (
        <div className="grid gap-4 @min-[34rem]:grid-cols-2">
          <div>
            <CountField
              label={t('signs.needed')}
              value={needed}
              problem={form.at('record.signs.needed')}
              onChange={(count) => setRecord(form, 'signs', { needed: count })}
            />
            {needed !== null && (
              <SignMarks
                needed={needed}
                total={list.length}
                label={t('signs.neededForEars', { count: needed, total: list.length })}
              />
            )}
          </div>
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
      <div className="grid gap-3 @min-[34rem]:grid-cols-2">
        <SelectField
          label={t('signs.type.label')}
          value={sign.type}
          onChange={(event) => {
            const type = RECORD_SIGN_TYPES.find((one) => one === event.currentTarget.value);
            if (type) set({ type });
          }}
        >
          {RECORD_SIGN_TYPES.map((type) => (
            <option key={type} value={type}>
              {t(`signs.type.${type}`)}
            </option>
          ))}
        </SelectField>
        <LineField
          label={t('signs.name')}
          value={sign.name}
          problem={at('name')}
          onChange={(name) => {
            set({ name });
          }}
        />
        <LineField
          label={t('signs.look')}
          value={sign.look}
          problem={at('look')}
          onChange={(look) => {
            set({ look });
          }}
        />
        <LineField
          label={t('signs.where')}
          value={sign.where}
          problem={at('where')}
          onChange={(where) => {
            set({ where });
          }}
        />
      </div>
      <UsualDays sign={sign} at={at} set={set} />
      <div className="flex flex-wrap items-end justify-between gap-3">
        <ChoiceField
          label={t('signs.stillSeen.label')}
          nothing={t('choose')}
          options={STILL_SEEN}
          words={(one) => t(`signs.stillSeen.${one}`)}
          value={sign.stillSeen}
          onChange={(stillSeen) => {
            set({ stillSeen });
          }}
        />
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

interface UsualDaysProps {
  sign: RecordSign;
  at: (field: string) => string | undefined;
  set: (patch: Partial<RecordSign>) => void;
}

function UsualDays({ sign: { usual }, at, set }: UsualDaysProps) {
  const { t } = useTranslation('record');
  return (
    <div className="grid gap-3">
      <TickField
        label={t('signs.hasUsual')}
        checked={usual !== null}
        onChange={(event) => {
          set({ usual: event.currentTarget.checked ? FIRST_USUAL : null });
        }}
      />
      {usual !== null && (
        <div className="grid gap-3 @min-[34rem]:grid-cols-2">
          <MonthDayFields
            label={t('signs.usualFrom')}
            value={usual.from}
            problem={at('usual.from.day')}
            onChange={(from) => {
              set({ usual: { ...usual, from } });
            }}
          />
          <MonthDayFields
            label={t('signs.usualTo')}
            value={usual.to}
            problem={at('usual.to.day')}
            onChange={(to) => {
              set({ usual: { ...usual, to } });
            }}
          />
        </div>
      )}
    </div>
  );
}
