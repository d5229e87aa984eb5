import { useTranslation } from 'react-i18next';
import { SelectField } from '#src/ui/field.js';
import type { KindInList } from '../model/kind-filter.js';

interface WarnedFilterProps {
  count: number;
  isOn: boolean;
  onChange: (isOn: boolean) => void;
}

/** Shows only those entries in which there is something to look at, and says of how many it is. */
export function WarnedFilter({ count, isOn, onChange }: WarnedFilterProps) {
  const { t } = useTranslation('calendars');
  return (
    <div>
      <button
        type="button"
        className="pick"
        aria-pressed={isOn}
        onClick={() => {
          onChange(!isOn);
        }}
      >
        <span className="ring" aria-hidden />
        <span>{t('row.onlyWarned', { count })}</span>
      </button>
      <p className="text-small text-umber-soft" role="status">
        {isOn && count === 0 && t('row.noneWarned')}
      </p>
    </div>
  );
}

interface KindFilterProps {
  kinds: readonly KindInList[];
  /** Null for all. */
  chosen: string | null;
  onChange: (key: string | null) => void;
}

/** Shows only entries of one kind, each with how many there are. */
export function KindFilter({ kinds, chosen, onChange }: KindFilterProps) {
  const { t } = useTranslation('calendars');
  return (
    <SelectField
      label={t('row.onlyKind')}
      value={chosen ?? ''}
      onChange={(event) => {
        onChange(event.currentTarget.value === '' ? null : event.currentTarget.value);
      }}
    >
      <option value="">{t('row.everyKind')}</option>
      {kinds.map(({ key, kind, word, count }) => (
        <option key={key} value={key}>
          {t('row.kindOf', { kind: word ?? t(`kind.${kind}`), count })}
        </option>
      ))}
    </SelectField>
  );
}
