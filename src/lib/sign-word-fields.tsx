import { useTranslation } from 'react-i18next';
import { RECORD_SIGN_TYPES, STILL_SEEN, type RecordSign } from '#shared/contracts/event-record.js';
import { SelectField, TickField } from '#src/ui/field.js';
import { ChoiceField, LineField } from '#src/ui/said-fields.js';
import { MonthDayFields } from '#src/lib/month-day-fields.js';

type SignWords = Omit<RecordSign, 'sharedId'>;

/** A sign of which nothing is said yet. */
export const NEW_SIGN: SignWords = {
  ...{ type: 'bird', name: '', look: '', where: '', usual: null, stillSeen: null },
};
const FIRST_USUAL = { from: { month: 1, day: 1 }, to: { month: 1, day: 31 } };

export interface SignWordFieldsProps {
  sign: SignWords;
  /** The sentence at a field, or undefined while all is well. */
  at: (field: string) => string | undefined;
  set: (patch: Partial<SignWords>) => void;
}

/** What is said of a sign: its kind, its name, what to look for, where, and when it usually comes. */
export function SignWordFields({ sign, at, set }: SignWordFieldsProps) {
  const { t } = useTranslation('record');
  return (
    <>
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
        {(['name', 'look', 'where'] as const).map((field) => (
          <LineField
            key={field}
            label={t(`signs.${field}`)}
            value={sign[field]}
            problem={at(field)}
            onChange={(value) => {
              set({ [field]: value });
            }}
          />
        ))}
      </div>
      <UsualDays sign={sign} at={at} set={set} />
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
    </>
  );
}

function UsualDays({ sign: { usual }, at, set }: SignWordFieldsProps) {
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
