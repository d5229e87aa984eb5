import type { Basis, MarkerYear, PhenomenonResult } from '../types.js';
import { THRESHOLD_SET_FACTS } from '../visibility/threshold-sets.js';
import { ENGINE_VERSION, PHENOMENA, type Phenomenon, type SkyNote } from '../vocabulary.js';
import { hiddenNightsOf } from './hidden-nights.js';
import type { ResolvedMarker } from './marker-key.js';
import { phenomenonInYear } from './phenomenon-in-year.js';
import { type MarkerAtPlace, markerAtPlace, type PlaceYear } from './place-year.js';

/** What a marker's dates rest on. */
export function basisOf(marker: MarkerAtPlace): Basis {
  const { settings, threshold } = marker;
  const { override } = marker.marker;
  return {
    thresholdSet: settings.thresholdSet,
    thresholdSource: override ? override.source : THRESHOLD_SET_FACTS[settings.thresholdSet].source,
    sameSideDeg: threshold.sameSideDeg,
    oppositeSideDeg: threshold.oppositeSideDeg,
    sameSideShiftDeg: settings.sameSideShiftDeg,
    oppositeSideShiftDeg: settings.oppositeSideShiftDeg,
    skylineRule: settings.skylineRule,
    clarityByMonth: [...settings.clarityByMonth],
    year: marker.year.civil.year,
    engineVersion: ENGINE_VERSION,
  };
}

/** The year of one marker at a prepared place: four phenomena with ranges, hidden nights, notes and basis. */
export function markerYearOf(placeYear: PlaceYear, resolved: ResolvedMarker): MarkerYear {
  const marker = markerAtPlace(placeYear, resolved);
  const entries = PHENOMENA.map((phenomenon) => [phenomenon, phenomenonInYear(marker, phenomenon)] as const);
  const hidden = hiddenNightsOf(marker);
  const notes: SkyNote[] = [...hidden.notes];
  if (marker.threshold.extrapolated) notes.push('threshold-extrapolated');
  return {
    markerKey: resolved.key,
    year: placeYear.year.civil.year,
    outcome: marker.star.outcome,
    outcomeDetail: marker.star.detail,
    phenomena: Object.fromEntries(entries) as Record<Phenomenon, PhenomenonResult>,
    nightsHidden: hidden.nightsHidden,
    notes,
    basis: basisOf(marker),
  };
}
