import type { SkyMarkerQuestion, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import { setImmediate } from 'node:timers/promises';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { PlacesService } from '../places/places.service.js';
import { resolveMarker } from '#shared/sky/index.js';
import { offeredSpecs } from './offered-specs.service.js';
import type { SkyMarkerYearsService } from './sky-marker-years.service.js';
import { toSkyMarkerYear } from './sky-markers.mapper.js';

/** Signs between which other requests get their turn: some ten milliseconds of work. */
const SPECS_AT_A_TIME = 8;

/** Signs beyond a star's first and last days, for those who choose what an entry goes by. */
export class SkyMarkersService {
  constructor(
    private readonly places: PlacesService,
    private readonly years: SkyMarkerYearsService,
  ) {}

  /** What makes sense at the place, each with its days; what never happens there is not among it. */
  async list(actor: Actor, placeId: string, year: number): Promise<SkyMarkerYear[]> {
    const place = await this.places.watched(actor, placeId);
    const specs = offeredSpecs(place);
    const found: SkyMarkerYear[] = [];
    for (const [index, spec] of specs.entries()) {
      const markerYear = this.years.year(place, year, spec);
      if (markerYear.outcome !== 'never-here') found.push(toSkyMarkerYear(markerYear, place));
      if (index % SPECS_AT_A_TIME === 0) await setImmediate();
    }
    return found;
  }

  async compute(actor: Actor, placeId: string, { year, spec }: SkyMarkerQuestion): Promise<SkyMarkerYear> {
    const place = await this.places.watched(actor, placeId);
    if ('markerKey' in spec && resolveMarker(spec.markerKey, place.figures) === null) {
      throw invalidField('spec.markerKey', 'unknown-marker');
    }
    return toSkyMarkerYear(this.years.year(place, year, spec), place);
  }
}
