import { Search } from 'lucide-react';
import { useId, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { markerName } from '#src/lib/marker-names.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { Button } from '#src/ui/button.js';
import { FieldNotes, SelectField, TickField } from '#src/ui/field.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { ComboField, type ComboOption } from '#src/ui/combo-field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { hasSign } from '../model/entry-draft.js';
import type { FormState } from '../model/form-state.js';
import { findMarkers } from '../model/marker-search.js';
import type { Markers } from '../model/preview-dates.js';
import { SeenFields } from './anchor-fields.js';
import { SignParameters } from './sign-parameters.js';

/** Kinds for which somebody may look towards the Sun. */
const SUN_KINDS: ReadonlySet<SkyMarkerSpec['kind']> = new Set([
  'sun-azimuth',
  'noon-sun',
  'zenith-sun',
  'sun-season',
]);

/** Stars and figures to choose from, figures first, then the brighter before the fainter; null while on their way. */
function useStarOptions(markers: Markers | null): ComboOption[] | null {
  return useMemo(
    () =>
      markers &&
      findMarkers([...markers.values()], '', new Set()).map((row) => ({
        id: row.markerKey,
        text:
          row.designation === markerName(row) ? markerName(row) : `${markerName(row)}, ${row.designation}`,
      })),
    [markers],
  );
}

/** The sign of the sky that leads, and which of its two days where a year has two. */
export function SignFields({ form, onSearch }: { form: FormState; onSearch: () => void }) {
  const { t } = useTranslation(['calendars', 'sky', 'anchors']);
  const days = useMarkerDayWords();
  const sign = useSkySignWords();
  const labelId = useId();
  const { draft, change, at, year } = form;
  const { sky } = draft;
  const problem = at('lead.spec.markerKey') ?? at('lead.spec');
  const occurrences = form.sign?.occurrences ?? [];
  const setSpec = (spec: SkyMarkerSpec) => {
    change({ sky: { ...sky, spec, occurrence: 1 } });
  };
  const starOptions = useStarOptions(form.markers);
  return (
    <div className="grid gap-4">
      <div role="group" aria-labelledby={labelId}>
        <p id={labelId} className="field-label">
          {t('form.goesBy')}
        </p>
        <div className="chosen-marker" data-invalid={problem === undefined ? undefined : true}>
          {hasSign(sky) && (
            <p className="flex items-center gap-3">
              <SignIcon sign={skySignIconKey(sky.spec)} size={28} />
              <strong>{sign(sky.spec, form.markers ?? new Map())}</strong>
            </p>
          )}
          <Button
            icon={<Search aria-hidden size={20} />}
            onClick={onSearch}
            data-invalid={problem === undefined ? undefined : true}
          >
            {t(hasSign(sky) ? 'form.changeMarker' : 'form.chooseSign')}
          </Button>
        </div>
        <FieldNotes inputId={labelId} problem={problem} />
      </div>
      {hasSign(sky) && starOptions !== null && 'markerKey' in sky.spec && (
        <ComboField
          label={t('sign.star')}
          options={starOptions}
          value={sky.spec.markerKey}
          problem={at('lead.spec.markerKey')}
          onChange={(markerKey) => {
            if (markerKey !== null && 'markerKey' in sky.spec) setSpec({ ...sky.spec, markerKey });
          }}
        />
      )}
      {hasSign(sky) && (
        <SignParameters spec={sky.spec} at={(parameter) => at(`lead.spec.${parameter}`)} onChange={setSpec} />
      )}
      {form.sign !== null && form.sign.reason !== null && <p>{t(`sky:noSign.${form.sign.reason}`)}</p>}
      {form.sign?.outcome === 'dated' && (
        <p className="text-small text-umber-soft">{t(`sky:signRange.${form.sign.basis.range as 'shaft'}`)}</p>
      )}
      {SUN_KINDS.has(sky.spec.kind) && (
        <Care>
          <p>{t('sign.sunCaution')}</p>
        </Care>
      )}
      {sky.spec.kind === 'moon-phase' && (
        <SelectField
          label={t('form.occurrences', { year })}
          value={String(sky.occurrence)}
          onChange={({ currentTarget: { value } }) => {
            change({ sky: { ...sky, occurrence: Number(value) } });
          }}
        >
          {occurrences.map((one, index) => (
            <option key={one.expected.dayNumber} value={String(index + 1)}>
              {t('form.nth', { nth: index + 1, date: days.about(one) })}
            </option>
          ))}
          {sky.occurrence > occurrences.length && (
            <option value={String(sky.occurrence)}>{t('form.nthNone', { nth: sky.occurrence, year })}</option>
          )}
        </SelectField>
      )}
      {sky.spec.kind !== 'moon-phase' && occurrences.length === 2 && (
        <PickGroup
          label={t('form.occurrence', { year })}
          stacked
          value={sky.occurrence === 1 ? 'first' : 'second'}
          onChange={(which) => {
            change({ sky: { ...sky, occurrence: which === 'first' ? 1 : 2 } });
          }}
          options={(['first', 'second'] as const).map((which, index) => {
            const one = occurrences[index];
            return { value: which, label: t(`form.${which}`, { date: one ? days.about(one) : '' }) };
          })}
        />
      )}
      {hasSign(sky) && (
        <TickField
          label={t('anchors:form.asSeen')}
          hint={t('anchors:form.asSeenHint')}
          checked={sky.seen === null}
          onChange={(event) => {
            const { spec, occurrence } = sky;
            change({ sky: { spec, occurrence, ...(event.currentTarget.checked && { seen: null }) } });
          }}
        />
      )}
      {sky.seen === null && <SeenFields form={form} />}
    </div>
  );
}
