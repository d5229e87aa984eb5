import { useQuery } from '@tanstack/react-query';
import { Clock } from 'lucide-react';
import { lazy, Suspense, useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSettled } from '#src/lib/settled.js';
import { Button } from '#src/ui/button.js';
import { FieldNotes } from '#src/ui/field.js';
import { Skeleton } from '#src/ui/waiting.js';
import { timeZoneQuery } from '../api/places-queries.js';
import { readCoordinate } from '../model/coordinate.js';
import { offsetName, offsetsMin, zoneName } from '../model/time-zone.js';
import type { FieldPart } from './place-form-parts.js';

const PAUSE_MS = 500;

/** A list to type in is heavy, and hardly anybody needs it: it comes when it is asked for. */
const ZoneChoice = lazy(() => import('./zone-choice.js'));

/** The clock of the place: found from the coordinates, changed by hand where people keep another one. */
export function TimeZoneField({ draft, change, problem, year }: FieldPart & { year: number }) {
  const { t } = useTranslation(['places', 'common']);
  const [choosing, setChoosing] = useState(false);
  const zone = useFoundZone(draft.latitude, draft.longitude);
  const found = zone.found;

  useEffect(() => {
    if (found !== null && !draft.timeZoneChosen && draft.timeZone !== found) change({ timeZone: found });
  }, [found, draft.timeZoneChosen, draft.timeZone, change]);

  const said = problem('timeZone');
  const mustChoose = choosing || (draft.timeZone === '' && zone.state === 'not-found');
  return (
    <div className="field">
      <span className="field-label" id="place-timeZone-label">
        {t('field.timeZone')}
      </span>
      {draft.timeZone !== '' && (
        <p className="flex items-start gap-2 py-1">
          <Clock aria-hidden size={22} className="mt-0.5" />
          <span>
            {zoneName(draft.timeZone)}
            <span className="range-line">
              <OffsetWords timeZone={draft.timeZone} year={year} />
            </span>
          </span>
        </p>
      )}
      <p className="text-small text-umber-soft" aria-live="polite">
        {zone.state === 'waiting' && t('zone.finding')}
        {zone.state === 'not-asked' && draft.timeZone === '' && t('zone.none')}
        {zone.state === 'not-found' && t('zone.notFound')}
        {zone.state === 'not-reached' && draft.timeZone === '' && t('zone.notReached')}
        {found !== null && found === draft.timeZone && t('zone.found')}
        {found !== null && found !== draft.timeZone && t('zone.foundOther', { zone: zoneName(found) })}
      </p>
      <div className="flex flex-wrap gap-x-2">
        {found !== null && found !== draft.timeZone && (
          <Button
            look="quiet"
            onClick={() => {
              change({ timeZone: found, timeZoneChosen: false });
              setChoosing(false);
            }}
          >
            {t('zone.useFound')}
          </Button>
        )}
        {zone.state === 'not-reached' && (
          <Button look="quiet" onClick={zone.tryAgain}>
            {t('common:tryAgain')}
          </Button>
        )}
        {!mustChoose && (
          <Button
            look="quiet"
            id="place-timeZone"
            onClick={() => {
              setChoosing(true);
            }}
          >
            {t('zone.change')}
          </Button>
        )}
      </div>
      {mustChoose && (
        <Suspense fallback={<Skeleton lines={2} />}>
          <ZoneChoice
            value={draft.timeZone}
            onChoose={(timeZone) => {
              change({ timeZone, timeZoneChosen: true });
              setChoosing(false);
            }}
          />
        </Suspense>
      )}
      <FieldNotes inputId="place-timeZone-notes" problem={said} />
    </div>
  );
}

/** `UTC+3 all year`, or both where the clocks change. */
export function OffsetWords({ timeZone, year }: { timeZone: string; year: number }) {
  const { t } = useTranslation('places');
  const offsets = offsetsMin(timeZone, year);
  if (offsets === null) return null;
  const [january, july] = [offsetName(offsets.january), offsetName(offsets.july)];
  return january === july ? t('zone.allYear', { offset: january }) : t('zone.twoOffsets', { january, july });
}

type ZoneState = 'not-asked' | 'waiting' | 'found' | 'not-found' | 'not-reached';

interface FoundZone {
  state: ZoneState;
  found: string | null;
  tryAgain: () => void;
}

function useFoundZone(latitude: string, longitude: string): FoundZone {
  const settled = useSettled(`${latitude}|${longitude}`, PAUSE_MS);
  const [latitudeText = '', longitudeText = ''] = settled.split('|');
  const lat = readCoordinate(latitudeText, 'latitude');
  const lon = readCoordinate(longitudeText, 'longitude');
  const bothRead = lat.ok && lon.ok;
  const { data, isFetching, isError, refetch } = useQuery({
    ...timeZoneQuery(lat.ok ? lat.valueDeg : 0, lon.ok ? lon.valueDeg : 0),
    enabled: bothRead,
  });
  const answer = (state: ZoneState, found: string | null = null) => ({
    state,
    found,
    tryAgain: () => {
      void refetch();
    },
  });
  if (!bothRead) return answer('not-asked');
  if (isFetching) return answer('waiting');
  if (isError || data === undefined) return answer('not-reached');
  return data === null ? answer('not-found') : answer('found', data);
}
