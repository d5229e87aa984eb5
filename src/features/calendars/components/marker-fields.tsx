import { Search } from 'lucide-react';
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { FieldNotes } from '#src/ui/field.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { PickGroup } from '#src/ui/pick.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import { leadDayNumber, leadingRow, type FormState } from '../model/form-state.js';

/** The star or figure that leads, and which of its four days. Each choice shows the day that it brings. */
export function MarkerFields({ form, onSearch }: { form: FormState; onSearch: () => void }) {
  const { t } = useTranslation(['calendars', 'sky']);
  const days = useMarkerDayWords();
  const labelId = useId();
  const { draft, change, at, year } = form;
  const { marker } = draft;
  const row = leadingRow(form);
  const problem = at('lead.markerKey');
  const occurrences = row?.phenomena[marker.phenomenon].occurrences ?? [];
  return (
    <div className="grid gap-4">
      <div role="group" aria-labelledby={labelId}>
        <p id={labelId} className="field-label">
          {t('form.goesBy')}
        </p>
        <div className="chosen-marker" data-invalid={problem === undefined ? undefined : true}>
          {marker.markerKey !== '' && (
            <p className="flex items-center gap-3">
              <MarkerIcon markerKey={marker.markerKey} size={28} />
              <strong>{row ? markerName(row) : marker.markerKey}</strong>
            </p>
          )}
          <Button
            icon={<Search aria-hidden size={20} />}
            onClick={onSearch}
            data-invalid={problem === undefined ? undefined : true}
            closedBecause={form.markers === null ? t('editor.loadingStars') : undefined}
          >
            {marker.markerKey === '' ? t('form.chooseMarker') : t('form.changeMarker')}
          </Button>
        </div>
        <FieldNotes inputId={labelId} problem={problem} />
        <ButtonLink look="quiet" className="-ms-2" to={finderPath(form)}>
          {t('form.findMarker')}
        </ButtonLink>
      </div>
      {row && (
        <PickGroup
          label={t('form.its')}
          stacked
          className="phenomenon-picks"
          value={marker.phenomenon}
          onChange={(phenomenon) => {
            change({ marker: { ...marker, phenomenon, occurrence: 1 } });
          }}
          options={PHENOMENA.map((phenomenon) => ({
            value: phenomenon,
            label: t(`sky:phenomenonTitle.${phenomenon}`),
            note: days.phenomenon(row, phenomenon, year),
            icon: <PhenomenonIcon phenomenon={phenomenon} size={30} />,
          }))}
        />
      )}
      {occurrences.length === 2 && (
        <PickGroup
          label={t('form.occurrence', { year })}
          stacked
          value={marker.occurrence === 1 ? 'first' : 'second'}
          onChange={(which) => {
            change({ marker: { ...marker, occurrence: which === 'first' ? 1 : 2 } });
          }}
          options={(['first', 'second'] as const).map((which, index) => {
            const one = occurrences[index];
            return { value: which, label: t(`form.${which}`, { date: one ? days.about(one) : '' }) };
          })}
        />
      )}
    </div>
  );
}

/** The finder asks for the day that the entry has now, and leads back to it. */
function finderPath(form: FormState): string {
  const { calendarId, entryId, placeId, year } = form;
  const lead = leadDayNumber(form);
  const day = lead === null ? null : dateOfDayNumber(lead);
  const two = (value: number) => String(value).padStart(2, '0');
  return paths.finder({
    placeId,
    year,
    calendar: calendarId,
    entry: entryId,
    ...(day === null ? {} : { from: `${two(day.month)}-${two(day.day)}` }),
  });
}
