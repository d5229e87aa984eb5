import { CalendarSearch, Download, Search, X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Place } from '#shared/contracts/places.js';
import { starsEndpoints } from '#shared/contracts/stars.js';
import { apiUrl } from '#src/lib/api-client.js';
import { paths } from '#src/lib/paths.js';
import { ButtonAnchor, ButtonLink } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Fold } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { YearStepper } from '#src/lib/year-stepper.js';
import { DOES, type Does } from '../model/star-choice.js';
import { ROWS_STEP, SORT_KEYS, type SortKey, type StarListQuery } from '../model/star-list-query.js';

export interface StarsToolbarProps {
  query: StarListQuery;
  set: (patch: Partial<StarListQuery>) => void;
  place: Place;
  places: readonly Place[];
  onPlace: (placeId: string) => void;
  /** How many there are, once they are known. */
  counts: { good: number; all: number } | null;
  /** Cards have no column heads: then the order is chosen here. */
  hasHeads: boolean;
}

/** Find, choose, step through the years, take along as CSV. Cards have a fold for what table heads do. */
export function StarsToolbar(props: StarsToolbarProps) {
  const { query, set, place, counts, hasHeads } = props;
  const { t } = useTranslation('stars');
  const choose = (patch: Partial<StarListQuery>) => {
    set({ ...patch, rows: ROWS_STEP });
  };
  const csv = (
    <ButtonAnchor
      href={apiUrl(starsEndpoints.csv, { params: { placeId: place.id }, query: { year: query.year } })}
      download
      aria-label={t('csvLabel')}
      icon={<Download aria-hidden size={20} />}
    >
      {t('csv')}
    </ButtonAnchor>
  );
  return (
    <div className="mb-4 grid gap-3">
      <div className="flex flex-wrap items-end gap-3">
        <StarSearch
          value={query.search}
          onChange={(search) => {
            choose({ search });
          }}
        />
        <PickGroup
          label={t('showWhich')}
          labelForEars
          value={query.search.trim() === '' ? query.show : null}
          onChange={(show) => {
            choose({ show, search: '' });
          }}
          options={[
            {
              value: 'good',
              label: counts === null || !hasHeads ? t('good') : t('goodCount', { count: counts.good }),
            },
            { value: 'all', label: counts === null ? t('allStars') : t('all', { count: counts.all }) },
          ]}
        />
        {hasHeads && <DoesSelect query={query} choose={choose} forEars />}
        <YearStepper
          className="w-44"
          year={query.year}
          labelForEars
          onChange={(year) => {
            set({ year });
          }}
        />
        {hasHeads && csv}
      </div>
      <div>
        <ButtonLink
          look="quiet"
          className="-ms-2"
          to={paths.finder({ placeId: place.id, year: query.year })}
          icon={<CalendarSearch aria-hidden size={22} />}
        >
          {t('finder')}
        </ButtonLink>
      </div>
      {!hasHeads && (
        <Fold title={t('orderAndChoice')} line={<ChoiceLine {...props} />}>
          <div className="grid gap-4">
            <OrderSelect query={query} choose={choose} />
            <DoesSelect query={query} choose={choose} />
            <PlaceSelect {...props} />
            <div>{csv}</div>
          </div>
        </Fold>
      )}
    </div>
  );
}

function StarSearch({ value, onChange }: { value: string; onChange: (search: string) => void }) {
  const { t } = useTranslation('stars');
  const clear = {
    endKey: (
      <button
        type="button"
        className="inp-key"
        aria-label={t('searchClear')}
        onClick={() => {
          onChange('');
        }}
      >
        <X aria-hidden size={22} />
      </button>
    ),
  };
  return (
    <TextField
      className="min-w-0 flex-[1_1_15rem]"
      label={<span className="for-ears">{t('search')}</span>}
      placeholder={t('searchHint')}
      type="text"
      role="searchbox"
      enterKeyHint="search"
      autoComplete="off"
      autoCapitalize="none"
      spellCheck={false}
      leadIcon={<Search aria-hidden size={22} />}
      value={value}
      onChange={(event) => {
        onChange(event.currentTarget.value);
      }}
      {...(value === '' ? {} : clear)}
    />
  );
}

function ChoiceLine({ query, place, places }: StarsToolbarProps) {
  const { t } = useTranslation('stars');
  const parts: string[] = [t('orderLine', { order: t(`sort.${query.sort}`) })];
  if (query.does !== 'any') parts.push(t(`does.${query.does}`));
  if (places.length > 1) parts.push(place.name);
  return parts.join(' · ');
}

interface SelectProps {
  query: StarListQuery;
  choose: (patch: Partial<StarListQuery>) => void;
  forEars?: boolean;
}

function OrderSelect({ query, choose }: SelectProps) {
  const { t } = useTranslation('stars');
  return (
    <SelectField
      label={t('sortBy')}
      value={query.sort}
      onChange={(event) => {
        choose({ sort: event.currentTarget.value as SortKey, descending: false });
      }}
    >
      {SORT_KEYS.map((key) => (
        <option key={key} value={key}>
          {t(`sort.${key}`)}
        </option>
      ))}
    </SelectField>
  );
}

function DoesSelect({ query, choose, forEars = false }: SelectProps) {
  const { t } = useTranslation('stars');
  return (
    <SelectField
      className={forEars ? 'w-56' : undefined}
      label={<span className={forEars ? 'for-ears' : undefined}>{t('does.label')}</span>}
      value={query.does}
      onChange={(event) => {
        const does = event.currentTarget.value as Does;
        choose({ does, ...(does === 'any' || does === 'dated' ? {} : { show: 'all' as const }) });
      }}
    >
      {DOES.map((does) => (
        <option key={does} value={does}>
          {t(`does.${does}`)}
        </option>
      ))}
    </SelectField>
  );
}

/** Only where there is something to choose. */
export function PlaceSelect({
  place,
  places,
  onPlace,
  forEars = false,
}: Pick<StarsToolbarProps, 'place' | 'places' | 'onPlace'> & { forEars?: boolean }) {
  const { t } = useTranslation('common');
  if (places.length < 2) return null;
  return (
    <SelectField
      className={forEars ? 'w-48' : undefined}
      label={<span className={forEars ? 'for-ears' : undefined}>{t('place.choose')}</span>}
      value={place.id}
      onChange={(event) => {
        onPlace(event.currentTarget.value);
      }}
    >
      {places.map((each) => (
        <option key={each.id} value={each.id}>
          {each.name}
        </option>
      ))}
    </SelectField>
  );
}
