import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { skySign, type SkyTexts } from '#shared/calendar/sky-sign.js';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { compassPoint } from './sky-words.js';
import { markerName, type NamesByKey } from './marker-names.js';

/** `Belt of Orion due south at 21:00 by the Sun`. Needs the texts `sky`. */
export function useSkySignWords(): (spec: SkyMarkerSpec, markers: NamesByKey) => string {
  const { t } = useTranslation('sky');
  return useMemo(() => {
    // The keys are made from the spec; every one of them is checked in the texts' own test.
    const texts: SkyTexts = { t: (key, values) => t(key as 'dusk', values ?? {}), compassPoint };
    return (spec, markers) => skySign(spec, starNameOf(spec, markers), texts);
  }, [t]);
}

function starNameOf(spec: SkyMarkerSpec, markers: NamesByKey): string {
  if (!('markerKey' in spec)) return '';
  const names = markers.get(spec.markerKey);
  return names ? markerName(names) : spec.markerKey;
}
