import { useTranslation } from 'react-i18next';
import { skyMarkerTimeOf } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useCountedWords } from '#src/lib/counted-words.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { endOfLead } from '#src/lib/sky-words.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { isByStar, type FormState } from '../model/form-state.js';
import { AnchorFields, NatureFields, SeenFields } from './anchor-fields.js';
import { LastDateFields } from './last-date-fields.js';
import { MarkerFields } from './marker-fields.js';
import { MonthDayFields } from '#src/lib/month-day-fields.js';
import { OffsetSteppers } from './offset-steppers.js';
import { SignFields } from './sign-fields.js';
import { WindowPicture } from './window-picture.js';

const ANCHORED = ['entry-planned', 'entry-actual'] as const;

/** When it is done: what leads, four days from it, and what may cut them short. */
export interface WhenFieldsProps {
  form: FormState;
  onSearch: () => void;
  /** Beside an entry: the last date is that one's. */
  timingOnly?: boolean | undefined;
}

export function WhenFields({ form, onSearch, timingOnly }: WhenFieldsProps) {
  const { t } = useTranslation(['calendars', 'anchors']);
  const days = useMarkerDayWords();
  const counted = useCountedWords();
  const { draft, change, dates } = form;
  return (
    <div className="grid gap-4">
      <PickGroup
        label={t('form.leadType')}
        className="lead-picks"
        value={draft.leadType}
        onChange={(leadType) => {
          change({ leadType });
        }}
        options={[
          { value: 'marker', label: t('form.byMarker'), note: t('form.byMarkerNote') },
          { value: 'sky', label: t('form.bySign'), note: t('form.bySignNote') },
          { value: 'fixed-date', label: t('form.byDate'), note: t('form.byDateNote') },
          { value: 'marker-as-seen', label: t('anchors:as-seen.name'), note: t('anchors:as-seen.note') },
          { value: 'nature-sign', label: t('anchors:nature.name'), note: t('anchors:nature.note') },
          ...(timingOnly === true
            ? []
            : ANCHORED.map((value) => ({
                value,
                label: t(`anchors:${value}.name`),
                note: t(`anchors:${value}.note`),
              }))),
        ]}
      />
      {isByStar(draft) && <MarkerFields form={form} onSearch={onSearch} />}
      {draft.leadType === 'marker-as-seen' && <SeenFields form={form} />}
      {draft.leadType === 'nature-sign' && <NatureFields form={form} />}
      {(draft.leadType === 'entry-planned' || draft.leadType === 'entry-actual') && (
        <AnchorFields form={form} />
      )}
      {draft.leadType === 'sky' && <SignFields form={form} onSearch={onSearch} />}
      {draft.leadType === 'fixed-date' && <FixedDateFields form={form} />}
      <div className="grid gap-3">
        <p>
          {dates?.marker && <strong>{days.about(dates.marker)}. </strong>}
          {dates?.counted && dates.counted.basis !== 'gone' ? (
            counted(dates.counted)
          ) : (
            <CountedFrom form={form} />
          )}
        </p>
        <OffsetSteppers form={form} />
        <WindowPicture form={form} />
      </div>
      {timingOnly !== true && <LastDateFields form={form} />}
    </div>
  );
}

/** From which day the steps are counted. */
function CountedFrom({ form }: { form: FormState }) {
  const { t } = useTranslation(['calendars', 'anchors']);
  const dateWords = useDateWords();
  const counted = useCountedWords();
  const { draft, dates, year, content, circle } = form;
  if (draft.leadType === 'fixed-date') {
    return t('form.daysFromDate', { day: dateWords.day({ year, ...draft.fixed.date }) });
  }
  if (dates?.counted) {
    const isThere = draft.anchor.entryId === '' || circle !== null;
    return isThere ? t('anchors:form.chooseFirst') : counted(dates.counted);
  }
  if (!dates?.marker) return t('form.daysFromNothing');
  if (content.lead.type === 'sky') {
    const time = skyMarkerTimeOf(content.lead.spec);
    if (time === 'noon' || time === 'day') return t('form.daysFromDay');
  }
  return endOfLead(content.lead) === 'dawn' ? t('form.daysFromMorning') : t('form.daysFromEvening');
}

function FixedDateFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at } = form;
  return (
    <div className="grid gap-4 @min-[34rem]:grid-cols-2">
      <MonthDayFields
        label={t('form.fixedDate')}
        value={draft.fixed.date}
        problem={at('lead.date.day')}
        onChange={(date) => {
          change((now) => ({ fixed: { ...now.fixed, date } }));
        }}
      />
      <TextField
        label={t('form.source')}
        hint={t('form.sourceHint')}
        value={draft.fixed.source}
        problem={at('lead.source')}
        onChange={(event) => {
          const source = event.currentTarget.value;
          change((now) => ({ fixed: { ...now.fixed, source } }));
        }}
      />
    </div>
  );
}
