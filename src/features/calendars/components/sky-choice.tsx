import { useQuery } from '@tanstack/react-query';
import { Search } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import type { NamesByKey } from '#src/lib/marker-names.js';
import { skyMarkersQuery } from '#src/lib/sky-marker-queries.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { TextField } from '#src/ui/field.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { findSigns, OWN_KINDS, startOf, type OwnKind } from '../model/sign-starts.js';

export interface SkyChoiceProps {
  placeId: string;
  year: number;
  markers: NamesByKey;
  /** Canonical texts of the specs that the calendar goes by already. */
  inUse: ReadonlySet<string>;
  chosen: SkyMarkerSpec | null;
  /** With which star a sign of one's own begins. */
  startStar: string;
  onChoose: (spec: SkyMarkerSpec) => void;
}

const OWN_ICONS = {
  'due-meridian': 'star',
  culmination: 'star',
  'star-altitude': 'star',
  'about-pole': 'star',
  'sun-azimuth': 'sun',
  'moon-counted': 'moon',
} as const satisfies Record<OwnKind, string>;

/** Signs of the Sun, the nights and the stars that the place has, each with its day; and those one sets up oneself. */
export function SkyChoice({ placeId, year, markers, inUse, chosen, startStar, onChoose }: SkyChoiceProps) {
  const { t } = useTranslation(['calendars', 'sky']);
  const [typed, setTyped] = useState('');
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    field.current?.focus();
  }, []);
  const { data: offered, isError } = useQuery(skyMarkersQuery(placeId, year));
  const sign = useSkySignWords();
  const words = useMarkerDayWords();
  const shown = findSigns(
    (offered ?? []).map((found) => {
      const key = canonicalJson(found.spec);
      return { ...found, key, name: sign(found.spec, markers), isInUse: inUse.has(key) };
    }),
    typed,
  );
  const chosenKey = chosen && canonicalJson(chosen);
  return (
    <div className="grid gap-3">
      <TextField
        ref={field}
        label={t('marker.searchSign')}
        leadIcon={<Search aria-hidden size={22} />}
        value={typed}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => {
          setTyped(event.currentTarget.value);
        }}
      />
      <p className="text-small text-umber-soft" role="status">
        {isError
          ? t('marker.signsTrouble')
          : offered === undefined
            ? t('marker.signsLoading')
            : t('marker.found', { count: shown.length })}
      </p>
      <ul className="marker-list">
        {shown.map(({ key, spec, name, isInUse, occurrences }) => (
          <li key={key}>
            <button
              type="button"
              className="marker-choice"
              aria-pressed={key === chosenKey}
              onClick={() => {
                onChoose(spec);
              }}
            >
              <span className="ring" aria-hidden />
              <SignIcon sign={skySignIconKey(spec)} size={26} />
              <span>
                <span>{name}</span>
                {isInUse && <span className="text-small text-umber-soft"> · {t('marker.inUse')}</span>}
                <span className="range-line">{words.occurrences(occurrences, year)}</span>
              </span>
            </button>
          </li>
        ))}
        {OWN_KINDS.map((kind) => (
          <li key={kind}>
            <button
              type="button"
              className="marker-choice"
              aria-pressed={false}
              onClick={() => {
                onChoose(startOf(kind, startStar, offered ?? []));
              }}
            >
              <span className="ring" aria-hidden />
              <SignIcon sign={OWN_ICONS[kind]} size={26} />
              <span>
                <span>{t(`marker.setUp.${kind}`)}</span>
                <span className="range-line">{t('marker.ownNote')}</span>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}
