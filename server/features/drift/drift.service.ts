import type { DriftAnswer, DriftQuery } from '#shared/contracts/drift.js';
import { driftOf, resolveMarker } from '#shared/sky/index.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { PlacesService } from '../places/places.service.js';
import { figuresOf, settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';
import { driftCsv } from './drift-csv.js';
import { toDriftAnswer } from './drift.mapper.js';
import { driftYears } from './drift-years.js';

/** A marker across the centuries at a place: some ten milliseconds of work, so nothing is kept. */
export class DriftService {
  constructor(private readonly places: PlacesService) {}

  async read(actor: Actor, placeId: string, markerKey: string, query: DriftQuery): Promise<DriftAnswer> {
    return driftAt(await this.places.watched(actor, placeId), markerKey, query);
  }

  async csv(
    actor: Actor,
    placeId: string,
    markerKey: string,
    query: DriftQuery,
  ): Promise<{ text: string; fileName: string }> {
    const place = await this.places.watched(actor, placeId);
    return driftCsv(place, driftAt(place, markerKey, query));
  }
}

function driftAt(place: WatchedPlace, markerKey: string, { from, to, year }: DriftQuery): DriftAnswer {
  const figures = figuresOf(place);
  if (resolveMarker(markerKey, figures) === null) throw notFound();
  const years = driftYears(from, to, year ?? null);
  const drift = driftOf(markerKey, siteOf(place), settingsOf(place), years, figures);
  return toDriftAnswer(drift, { from, to, figures });
}
