import { useTranslation } from 'react-i18next';
import { TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { CoordinateFields } from './coordinate-fields.js';
import { MapField } from './map-field.js';
import type { FieldPart } from './place-form-parts.js';
import { TimeZoneField } from './time-zone-field.js';

/** Name, coordinates, height and clock. */
export function WhereBoard(part: FieldPart & { year: number }) {
  const { draft, change, problem, touch, year } = part;
  const { t } = useTranslation('places');
  const elevationProblem = problem('elevationM');
  return (
    <Board title={t('where')}>
      <div className="grid gap-4">
        <TextField
          id="place-name"
          label={t('field.name')}
          hint={t('field.nameHint')}
          value={draft.name}
          problem={problem('name')}
          maxLength={120}
          autoComplete="off"
          className="own-words"
          onChange={(event) => {
            change({ name: event.currentTarget.value });
          }}
          onBlur={() => {
            touch('name');
          }}
        />
        <div className="grid gap-4 mid:grid-cols-2">
          <CoordinateFields {...part} />
          <div className="mid:col-span-2">
            <MapField {...part} />
          </div>
          <TextField
            id="place-elevationM"
            label={t('field.elevation')}
            hint={elevationProblem === undefined ? t('field.elevationHint') : undefined}
            value={draft.elevation}
            problem={elevationProblem}
            inputMode="decimal"
            autoComplete="off"
            dir="ltr"
            onChange={(event) => {
              change({ elevation: event.currentTarget.value });
            }}
            onBlur={() => {
              touch('elevationM');
            }}
          />
          <TimeZoneField {...part} year={year} />
        </div>
      </div>
    </Board>
  );
}
