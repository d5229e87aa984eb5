import { useTranslation } from 'react-i18next';
import type { EntryDates } from '#shared/contracts/calendars.js';
import { PLANNED_DAYS } from '#shared/contracts/entry-lead.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { SelectField, TextField, TickField } from '#src/ui/field.js';
import type { FormState } from '../model/form-state.js';
import { MonthDayFields } from '#src/lib/month-day-fields.js';
import { LineField } from '#src/ui/said-fields.js';
import { Care } from '#src/ui/surfaces.js';

interface AnchorProps {
  form: FormState;
}

/** So far from the computed day hardly anybody sees the same thing: rather a slip of the hand, or another star. */
const FAR_DAYS = 21;

/** The day on which it was seen this year: who saw it, and which elder says so, too. */
export function SeenFields({ form }: AnchorProps) {
  const { t } = useTranslation('anchors');
  const { draft, change, at, year, dates } = form;
  const away = daysFromComputed(dates);
  const { seen } = draft;
  const set = (patch: Partial<NonNullable<typeof seen>>) => {
    if (seen !== null) change({ seen: { ...seen, ...patch } });
  };
  return (
    <div className="grid gap-3">
      <TickField
        label={t('form.seen')}
        checked={seen !== null}
        onChange={(event) => {
          change({ seen: event.currentTarget.checked ? { date: '', by: '', agreedBy: '' } : null });
        }}
      />
      {seen !== null && (
        <div className="grid gap-4 border-s-4 border-hairline ps-4 @min-[34rem]:grid-cols-3">
          <TextField
            type="date"
            label={t('form.seenOn')}
            min={`${year - 1}-01-01`}
            max={`${year + 1}-12-31`}
            value={seen.date}
            problem={at('lead.seen.date')}
            onChange={(event) => {
              set({ date: event.currentTarget.value });
            }}
          />
          <LineField
            label={t('form.seenBy')}
            value={seen.by}
            problem={at('lead.seen.by')}
            onChange={(by) => {
              set({ by });
            }}
          />
          <LineField
            label={t('form.agreedBy')}
            value={seen.agreedBy}
            problem={at('lead.seen.agreedBy')}
            onChange={(agreedBy) => {
              set({ agreedBy });
            }}
          />
        </div>
      )}
      {away > FAR_DAYS && (
        <Care>
          <p>{t('form.farFromComputed', { count: away })}</p>
        </Care>
      )}
    </div>
  );
}

/** Zero while nothing was seen, and where nothing was computed. */
function daysFromComputed(dates: EntryDates | null): number {
  const seen = dates?.counted?.basis === 'seen' ? dates.counted.from : null;
  if (seen === null || !dates?.marker) return 0;
  return Math.abs(dayNumberFromIso(seen) - dates.marker.expected.dayNumber);
}

/** A sign of nature with its usual days. */
export function NatureFields({ form }: AnchorProps) {
  const { t } = useTranslation('anchors');
  const { draft, change, at } = form;
  const { nature } = draft;
  const set = (patch: Partial<typeof nature>) => {
    change({ nature: { ...nature, ...patch } });
  };
  return (
    <div className="grid gap-4 @min-[34rem]:grid-cols-2">
      <LineField
        label={t('form.natureName')}
        value={nature.name}
        problem={at('lead.name')}
        onChange={(name) => {
          set({ name });
        }}
      />
      <LineField
        label={t('form.natureSource')}
        value={nature.source}
        problem={at('lead.source')}
        onChange={(source) => {
          set({ source });
        }}
      />
      <MonthDayFields
        label={t('form.usualFrom')}
        value={nature.usual.from}
        problem={at('lead.usual.from.day')}
        onChange={(from) => {
          set({ usual: { ...nature.usual, from } });
        }}
      />
      <MonthDayFields
        label={t('form.usualTo')}
        value={nature.usual.to}
        problem={at('lead.usual.to.day')}
        onChange={(to) => {
          set({ usual: { ...nature.usual, to } });
        }}
      />
    </div>
  );
}

/** Another entry of this calendar: its planned day, or the day on which it is done. */
export function AnchorFields({ form }: AnchorProps) {
  const { t } = useTranslation('anchors');
  const { draft, change, at, others, circle } = form;
  const { anchor } = draft;
  if (others.length === 0) return <p>{t('form.noEntries')}</p>;
  const chain = circle?.join(t('form.link')) ?? null;
  return (
    <div className="grid gap-4 @min-[34rem]:grid-cols-2">
      <SelectField
        label={t('form.entry')}
        value={anchor.entryId}
        problem={chain === null ? at('lead.entryId') : t('form.circle', { chain })}
        onChange={(event) => {
          change({ anchor: { ...anchor, entryId: event.currentTarget.value } });
        }}
      >
        <option value="">{t('form.chooseEntry')}</option>
        {others.map(({ id, title }) => (
          <option key={id} value={id}>
            {title}
          </option>
        ))}
      </SelectField>
      {draft.leadType === 'entry-planned' && (
        <SelectField
          label={t('form.whichDay')}
          value={anchor.day}
          onChange={(event) => {
            const day = PLANNED_DAYS.find((one) => one === event.currentTarget.value);
            if (day) change({ anchor: { ...anchor, day } });
          }}
        >
          {PLANNED_DAYS.map((day) => (
            <option key={day} value={day}>
              {t(`day.${day}`)}
            </option>
          ))}
        </SelectField>
      )}
    </div>
  );
}
