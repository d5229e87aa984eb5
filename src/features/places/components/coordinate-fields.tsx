import { useTranslation } from 'react-i18next';
import { TextField } from '#src/ui/field.js';
import { readCoordinate, splitPair } from '../model/coordinate.js';
import type { PlaceDraft } from '../model/place-draft.js';
import type { FieldPart } from './place-form-parts.js';

/** Latitude and longitude as people write them. Both pasted into the first field find their way. */
export function CoordinateFields({ draft, change, problem, touch }: FieldPart) {
  const { t } = useTranslation('places');
  const leaveLatitude = () => {
    const pair = readCoordinate(draft.latitude, 'latitude').ok ? null : splitPair(draft.latitude);
    if (pair !== null) change(pair);
    touch('latitudeDeg');
  };
  return (
    <>
      <CoordinateField
        id="place-latitudeDeg"
        label={t('field.latitude')}
        hint={t('field.latitudeHint')}
        value={draft.latitude}
        problem={problem('latitudeDeg')}
        onChange={(latitude) => {
          change({ latitude });
        }}
        onBlur={leaveLatitude}
      />
      <CoordinateField
        id="place-longitudeDeg"
        label={t('field.longitude')}
        hint={t('field.longitudeHint')}
        value={draft.longitude}
        problem={problem('longitudeDeg')}
        onChange={(longitude) => {
          change({ longitude });
        }}
        onBlur={() => {
          touch('longitudeDeg');
        }}
      />
    </>
  );
}

interface CoordinateFieldProps {
  id: string;
  label: string;
  hint: string;
  value: PlaceDraft['latitude'];
  problem: string | undefined;
  onChange: (text: string) => void;
  onBlur: () => void;
}

function CoordinateField({ onChange, hint, problem, ...field }: CoordinateFieldProps) {
  return (
    <TextField
      {...field}
      // What is not accepted is said instead of the hint: two notes under one field are one too many.
      hint={problem === undefined ? hint : undefined}
      problem={problem}
      autoComplete="off"
      spellCheck={false}
      dir="ltr"
      onChange={(event) => {
        onChange(event.currentTarget.value);
      }}
    />
  );
}
