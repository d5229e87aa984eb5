import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Community } from '#shared/contracts/people.js';
import { intlLocale, useDateWords } from '#src/lib/date-words.js';
import { Button, IconButton } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { knownCalendars, MARKET_DAYS_MAX, MARKET_DAYS_MIN } from '../model/strip-scale.js';
import { ZOOMS } from '../model/strip-span.js';
import type { Strip } from '../model/use-strip.js';

interface StripToolsProps {
  strip: Strip;
  unsavedCount: number;
  isSaving: boolean;
  onSaveAll: () => void;
}

/** How close the strip is, which days it shows, and saving what was moved on it. */
export function StripTools({ strip, unsavedCount, isSaving, onSaveAll }: StripToolsProps) {
  const { t } = useTranslation('strip');
  const dates = useDateWords();
  const { zoom, span, isFirst, isLast } = strip;
  return (
    <div className="mb-2 flex flex-wrap items-end gap-x-4 gap-y-2">
      <PickGroup
        label={t('zoom')}
        labelForEars
        value={zoom}
        onChange={strip.zoomTo}
        options={ZOOMS.map((value) => ({ value, label: t(`zooms.${value}`) }))}
      />
      {zoom !== 'year' && (
        <div className="flex items-center gap-2">
          <IconButton
            label={t('earlier')}
            icon={<ChevronLeft aria-hidden size={22} />}
            closed={isFirst}
            onClick={() => {
              strip.go(-1);
            }}
          />
          <span aria-live="polite">{t('shows', { range: dates.range(span.first, span.last) })}</span>
          <IconButton
            label={t('later')}
            icon={<ChevronRight aria-hidden size={22} />}
            closed={isLast}
            onClick={() => {
              strip.go(1);
            }}
          />
        </div>
      )}
      {unsavedCount > 0 && (
        <Button busy={isSaving} onClick={onSaveAll}>
          {t('saveAll', { count: unsavedCount })}
        </Button>
      )}
    </div>
  );
}

interface StripSettingsProps {
  strip: Strip;
  /** Null until its settings are known. */
  community: Community | null;
}

/** Where the year begins and what stands under the months, as somebody likes it on this device. */
export function StripSettings({ strip, community }: StripSettingsProps) {
  const { t, i18n } = useTranslation('strip');
  const dates = useDateWords();
  const { settings, set } = strip;
  const yearStart = community?.yearStart.date ?? null;
  const hasMonths = (community?.localMonths.length ?? 0) > 0;
  return (
    <div className="grid gap-3 sm:grid-cols-2">
      {yearStart !== null && (
        <SelectField
          label={t('yearFrom')}
          value={settings.yearFrom}
          onChange={(event) => {
            set({ yearFrom: event.target.value === 'local' ? 'local' : 'civil' });
          }}
        >
          <option value="civil">{t('yearFromCivil')}</option>
          <option value="local">
            {t('yearFromLocal', { day: dates.day({ year: 2027, ...yearStart }) })}
          </option>
        </SelectField>
      )}
      <SelectField
        label={t('secondScale')}
        value={settings.scale}
        onChange={(event) => {
          set({ scale: event.target.value });
        }}
      >
        <option value="none">{t('scale.none')}</option>
        <option value="moons">{t('scale.moons')}</option>
        <option value="months" disabled={!hasMonths}>
          {hasMonths ? t('scale.months') : t('monthsNotNamed')}
        </option>
        <option value="market">{t('scale.market')}</option>
        <optgroup label={t('otherCalendars')}>
          {knownCalendars(intlLocale(i18n.language)).map(({ calendar, name }) => (
            <option key={calendar} value={calendar}>
              {name}
            </option>
          ))}
        </optgroup>
      </SelectField>
      {settings.scale === 'market' && (
        <>
          <Stepper
            label={t('marketDays')}
            value={settings.marketDays}
            min={MARKET_DAYS_MIN}
            max={MARKET_DAYS_MAX}
            onChange={(marketDays) => {
              set({ marketDays });
            }}
          />
          <TextField
            label={t('marketDay')}
            type="date"
            value={settings.marketDay}
            onChange={(event) => {
              if (event.target.value !== '') set({ marketDay: event.target.value });
            }}
          />
        </>
      )}
    </div>
  );
}
