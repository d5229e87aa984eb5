import { memo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { EntryOffsets } from '#shared/contracts/calendars.js';
import { Button } from '#src/ui/button.js';
import { OFFSETS } from '../model/offsets.js';

export interface StripRowWays {
  rename: (entryId: string, titleOfficer: string) => void;
  setOffset: (entryId: string, name: keyof EntryOffsets, days: number) => void;
  save: (entryId: string) => void;
}

interface StripRowFieldsProps {
  entryId: string;
  title: string;
  offsets: EntryOffsets;
  unsaved: boolean;
  ways: StripRowWays;
}

/** A row of the table to be written in: the name, and the days counted from the lead. */
export const StripRowFields = memo(function StripRowFields({
  entryId,
  title,
  offsets,
  unsaved,
  ways,
}: StripRowFieldsProps) {
  const { t } = useTranslation(['strip', 'calendars']);
  const name = title || t('calendars:editor.untitled');
  return (
    <>
      <th scope="row">
        <input
          className="inp min-w-72"
          aria-label={t('titleOf', { title: name })}
          value={title}
          onChange={(event) => {
            ways.rename(entryId, event.target.value);
          }}
        />
      </th>
      {OFFSETS.map((offset) => (
        <td key={offset}>
          <DaysInput
            label={`${t(`column.${offset}`)}, ${name}`}
            value={offsets[offset]}
            onChange={(days) => {
              ways.setOffset(entryId, offset, days);
            }}
          />
        </td>
      ))}
      <td>
        {unsaved && (
          <Button
            aria-label={t('saveRow', { title: name })}
            onClick={() => {
              ways.save(entryId);
            }}
          >
            {t('column.save')}
          </Button>
        )}
      </td>
    </>
  );
});

/** A number that may be half typed: what is no whole number yet stays in the field. */
function DaysInput({
  label,
  value,
  onChange,
}: {
  label: string;
  value: number;
  onChange: (days: number) => void;
}) {
  const [typed, setTyped] = useState<string | null>(null);
  return (
    <input
      className="inp w-24"
      inputMode="numeric"
      aria-label={label}
      value={typed ?? String(value)}
      onChange={(event) => {
        const text = event.target.value;
        setTyped(text);
        if (/^[-−+]?\d{1,3}$/u.test(text.trim())) onChange(Number(text.trim().replace('−', '-')));
      }}
      onBlur={() => {
        setTyped(null);
      }}
    />
  );
}
