import { Search } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { MarkerRow } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { PickGroup } from '#src/ui/pick.js';
import { findMarkers, SHOWN_MAX } from '../model/marker-search.js';
import { SkyChoice, type SkyChoiceProps } from './sky-choice.js';

interface MarkerDialogProps extends StarChoiceProps {
  isOpen: boolean;
  onClose: () => void;
  /** On which side the dialog opens. */
  side: DialogSide;
  sky: Omit<SkyChoiceProps, 'year'>;
}

type DialogSide = 'stars' | 'sky';

/** What an entry can go by: a star's first or last day, or a sign of the Sun, the nights and the stars. */
export function MarkerDialog({ isOpen, onClose, side, sky, ...stars }: MarkerDialogProps) {
  const { t } = useTranslation('calendars');
  return (
    <Dialog title={t('marker.title')} isOpen={isOpen} onClose={onClose}>
      <BothSides
        side={side}
        sky={{
          ...sky,
          onChoose: (spec) => {
            sky.onChoose(spec);
            onClose();
          },
        }}
        stars={{
          ...stars,
          onChoose: (markerKey) => {
            stars.onChoose(markerKey);
            onClose();
          },
        }}
      />
    </Dialog>
  );
}

/** The dialog's content is made anew each time it opens, so it opens on the side that was asked for. */
function BothSides({
  side,
  stars,
  sky,
}: {
  side: DialogSide;
  stars: StarChoiceProps;
  sky: Omit<SkyChoiceProps, 'year'>;
}) {
  const { t } = useTranslation('calendars');
  const [open, setOpen] = useState(side);
  return (
    <div className="grid gap-3">
      <PickGroup
        label={t('marker.sides')}
        labelForEars
        value={open}
        onChange={setOpen}
        options={[
          { value: 'stars', label: t('marker.side.stars') },
          { value: 'sky', label: t('marker.side.sky') },
        ]}
      />
      {open === 'stars' ? <MarkerChoice {...stars} /> : <SkyChoice {...sky} year={stars.year} />}
    </div>
  );
}

interface StarChoiceProps {
  rows: readonly MarkerRow[];
  year: number;
  /** Its day is shown beside each star. */
  phenomenon: Phenomenon;
  chosen: string;
  inUse: ReadonlySet<string>;
  onChoose: (markerKey: string) => void;
}

/** Stars and figures by name, each with the day that it would bring. */
function MarkerChoice({ rows, year, phenomenon, chosen, inUse, onChoose }: StarChoiceProps) {
  const { t } = useTranslation(['calendars', 'sky']);
  const [typed, setTyped] = useState('');
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    field.current?.focus();
  }, []);
  const found = findMarkers(rows, typed, inUse, chosen);
  const shown = found.slice(0, SHOWN_MAX);
  return (
    <div className="grid gap-3">
      <TextField
        ref={field}
        label={t('marker.search')}
        leadIcon={<Search aria-hidden size={22} />}
        value={typed}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => {
          setTyped(event.currentTarget.value);
        }}
      />
      <p className="text-small text-umber-soft" role="status">
        {found.length === 0
          ? t('marker.none')
          : found.length > shown.length
            ? t('marker.showing', { count: shown.length, total: found.length })
            : t('marker.found', { count: found.length })}
      </p>
      <ul className="marker-list">
        {shown.map((row) => (
          <li key={row.markerKey}>
            <button
              type="button"
              className="marker-choice"
              aria-pressed={row.markerKey === chosen}
              onClick={() => {
                onChoose(row.markerKey);
              }}
            >
              <span className="ring" aria-hidden />
              <MarkerIcon markerKey={row.markerKey} size={26} />
              <MarkerLines row={row} phenomenon={phenomenon} year={year} isInUse={inUse.has(row.markerKey)} />
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}

interface MarkerLinesProps {
  row: MarkerRow;
  phenomenon: Phenomenon;
  year: number;
  isInUse: boolean;
}

function MarkerLines({ row, phenomenon, year, isInUse }: MarkerLinesProps) {
  const { t } = useTranslation(['calendars', 'sky']);
  const days = useMarkerDayWords();
  const name = markerName(row);
  return (
    <span>
      <span>{name}</span>
      {row.designation !== name && row.kind === 'star' && (
        <span className="text-small text-umber-soft"> · {row.designation}</span>
      )}
      {row.kind === 'own-figure' && <span className="text-small text-umber-soft"> · {t('marker.own')}</span>}
      {isInUse && <span className="text-small text-umber-soft"> · {t('marker.inUse')}</span>}
      <span className="range-line">
        {t('marker.dayOf', {
          phenomenon: t(`sky:phenomenonTitle.${phenomenon}`),
          days: days.phenomenon(row, phenomenon, year),
        })}
      </span>
    </span>
  );
}
