import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { PlaceInput } from '#shared/contracts/places.js';
import type { SkylineEffect } from '#shared/contracts/stars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { FROM_MID, useMediaQuery } from '#src/lib/media-query.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { Button } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { skylineEffectsQuery, skylinePreviewQuery } from '../api/places-queries.js';
import { EffectCards, EffectTable } from './effect-rows.js';

const PAUSE_MS = 500;
const FIRST_ROWS = { table: 8, cards: 4 };

export interface EffectsSectionProps {
  communityId: string;
  /** The saved place; null while it is new. */
  placeId: string | null;
  /** What stands on the screen and differs from what is saved; null where it does not, or cannot be read yet. */
  preview: PlaceInput | null;
  hasSkyline: boolean;
  year: number;
}

/** Flat and hill dates side by side, with "2 days later"; for what stands on the screen, saved or not. */
export function EffectsSection({ communityId, placeId, preview, hasSkyline, year }: EffectsSectionProps) {
  const { t } = useTranslation('places');
  const words = useProblemWords();
  const dates = useDateWords();
  const isMid = useMediaQuery(FROM_MID);
  const [showsAll, setShowsAll] = useState(false);
  const settledPreview = useSettled(preview, PAUSE_MS);
  const usesPreview = settledPreview !== null;
  const saved = useQuery({
    ...skylineEffectsQuery(placeId ?? '', year),
    enabled: placeId !== null && !usesPreview,
  });
  const unsaved = useQuery({
    ...skylinePreviewQuery(communityId, settledPreview ?? NO_PLACE, year),
    enabled: usesPreview,
    placeholderData: keepPreviousData,
  });
  const { data, error, refetch } = usesPreview ? unsaved : saved;
  const isLate = preview !== settledPreview || unsaved.isPlaceholderData;
  if (placeId === null && !usesPreview) return null;

  const rows = data ?? [];
  const firstRows = isMid ? FIRST_ROWS.table : FIRST_ROWS.cards;
  const shown = showsAll ? rows : rows.slice(0, firstRows);
  return (
    <section aria-labelledby="place-effects">
      <h2 id="place-effects" className="mb-2">
        {t('effects.title', { year: dates.year(year) })}
      </h2>
      {!hasSkyline && <p className="mb-2">{t('effects.noSkyline')}</p>}
      {error !== null && data === undefined ? (
        <TroubleNote
          title={t('effects.notReached')}
          sentence={words.problem(error)}
          onRetry={() => {
            void refetch();
          }}
        />
      ) : data === undefined ? (
        <Board>
          <Skeleton lines={6} />
        </Board>
      ) : (
        <div aria-busy={isLate} className={isLate ? 'opacity-85' : undefined}>
          <Rows rows={shown} asTable={isMid} />
        </div>
      )}
      {rows.length > firstRows && (
        <Button
          look="quiet"
          className="-ms-2"
          aria-expanded={showsAll}
          onClick={() => {
            setShowsAll(!showsAll);
          }}
        >
          {showsAll ? t('effects.fewer') : t('effects.more', { count: rows.length - firstRows })}
        </Button>
      )}
      <p className="mt-2 text-small text-umber-soft" aria-live="polite">
        {usesPreview && (isLate ? t('effects.waiting') : t('effects.ofDraft'))} {t('effects.rest')}
      </p>
    </section>
  );
}

function Rows({ rows, asTable }: { rows: readonly SkylineEffect[]; asTable: boolean }) {
  const { t } = useTranslation('places');
  if (rows.length === 0) return <p>{t('effects.empty')}</p>;
  return asTable ? <EffectTable rows={rows} /> : <EffectCards rows={rows} />;
}

/** Never sent: the query that would send it is closed. */
const NO_PLACE: PlaceInput = {
  name: '',
  latitudeDeg: 0,
  longitudeDeg: 0,
  elevationM: 0,
  timeZone: 'UTC',
  skyline: [],
  clarityByMonth: [],
  rainMonths: [],
  thresholdSet: 'three-class',
  sameSideShiftDeg: 0,
  oppositeSideShiftDeg: 0,
  skylineRule: 'altitude-difference',
};
