import type { AirAnswer } from '#shared/contracts/air.js';
import { computeAirYear, resolveMarker } from '#shared/sky/index.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { PlacesService } from '../places/places.service.js';
import { settingsOf, siteOf } from '../places/watched-place.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import type { SkyYearsService } from '../stars/sky-years.service.js';
import { toAirAnswer } from './air.mapper.js';

/** A second opinion on the days of one star or figure: the model of visibility beside the published rules. */
export class AirService {
  constructor(
    private readonly places: PlacesService,
    private readonly skyYears: SkyYearsService,
  ) {}

  async read(actor: Actor, placeId: string, markerKey: string, year: number): Promise<AirAnswer> {
    const place = await this.places.watched(actor, placeId);
    if (resolveMarker(markerKey, place.figures) === null) throw notFound();
    const [markerYear] = this.skyYears.markerYears(place, year, [markerKey]);
    if (!markerYear) throw notFound();
    const airYear = computeAirYear(markerKey, siteOf(place), settingsOf(place), year, place.figures);
    return toAirAnswer(placeId, markerNamesOf(markerKey, place.figures), airYear, markerYear.basis);
  }
}
