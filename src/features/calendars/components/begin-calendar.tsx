import { zodResolver } from '@hookform/resolvers/zod';
import { Plus } from 'lucide-react';
import { Controller, useForm, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import {
  CALENDAR_FIRST_YEAR,
  CALENDAR_LAST_YEAR,
  calendarInput,
  type Calendar,
} from '#shared/contracts/calendars.js';
import type { Place } from '#shared/contracts/places.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { todayIn } from '#src/lib/days.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { Stepper } from '#src/ui/stepper.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { EmptyState, Skeleton } from '#src/ui/waiting.js';
import { useBeginCalendar } from '../api/begin-calendar.js';
import { newEntryPath, type WantedMarker } from '../model/wanted-marker.js';

interface BeginCalendarProps {
  communityId: string;
  calendars: readonly Calendar[];
  wanted: WantedMarker | null;
}

/** A calendar begins with a place and a year; everything else follows from them. */
export function BeginCalendar(props: BeginCalendarProps) {
  const { t } = useTranslation('calendars');
  const { place, places, isLoading } = useCurrentPlace();
  return (
    <Board title={t('list.begin')}>
      {isLoading && <Skeleton />}
      {!isLoading && place === null && (
        <EmptyState
          title={t('list.noPlaces')}
          action={<ButtonLink to={paths.newPlace()}>{t('list.addPlace')}</ButtonLink>}
        />
      )}
      {place !== null && <BeginForm {...props} place={place} places={places} />}
    </Board>
  );
}

const FIELDS = ['placeId', 'year'] as const;

function BeginForm({
  communityId,
  calendars,
  wanted,
  place,
  places,
}: BeginCalendarProps & { place: Place; places: readonly Place[] }) {
  const { t } = useTranslation('calendars');
  const navigate = useNavigate();
  const say = useToast();
  const begin = useBeginCalendar(communityId);
  const form = useForm({
    resolver: zodResolver(calendarInput),
    defaultValues: { placeId: place.id, year: firstFreeYear(calendars, place) },
  });
  const problems = useFormProblems(form, FIELDS);
  const [placeId, year] = useWatch({ control: form.control, name: ['placeId', 'year'] });
  const existing = calendars.find((each) => each.placeId === placeId && each.year === year);
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        void form.handleSubmit(async (values) => {
          try {
            const calendar = await begin.mutateAsync(values);
            say(t('list.begun', { year: calendar.year, place: calendar.placeName }));
            void navigate(newEntryPath(calendar.id, wanted));
          } catch (cause) {
            problems.show(cause);
          }
        })(event);
      }}
    >
      {problems.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problems.overall}</p>
        </Care>
      )}
      <SelectField
        {...form.register('placeId')}
        label={t('list.place')}
        hint={t('list.placeHint')}
        problem={problems.at('placeId')}
      >
        {places.map((each) => (
          <option key={each.id} value={each.id}>
            {each.name}
          </option>
        ))}
      </SelectField>
      <Controller
        control={form.control}
        name="year"
        render={({ field }) => (
          <Stepper
            label={t('list.year')}
            value={field.value}
            onChange={field.onChange}
            min={CALENDAR_FIRST_YEAR}
            max={CALENDAR_LAST_YEAR}
            problem={problems.at('year')}
          />
        )}
      />
      {existing && (
        <Care>
          <p>{t('list.exists', { year: existing.year, place: existing.placeName })}</p>
          <p>
            <Link className="link-line" to={newEntryPath(existing.id, wanted)}>
              {t('list.openExisting')}
            </Link>
          </p>
        </Care>
      )}
      <div>
        <Button
          type="submit"
          look={wanted === null ? 'main' : 'plain'}
          busy={begin.isPending}
          icon={<Plus aria-hidden size={22} />}
          closedBecause={existing && t('list.exists', { year: existing.year, place: existing.placeName })}
        >
          {t('list.beginIt', { year })}
        </Button>
      </div>
    </form>
  );
}

/** The year that people plan for: this one from January on, else the next that has no calendar yet. */
function firstFreeYear(calendars: readonly Calendar[], place: Place): number {
  const taken = new Set(calendars.filter((each) => each.placeId === place.id).map((each) => each.year));
  let { year } = todayIn(place.timeZone);
  while (taken.has(year) && year < CALENDAR_LAST_YEAR) year += 1;
  return year;
}
