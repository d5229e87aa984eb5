import type { SkyMarkerQuestion, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { PlacesService } from '../places/places.service.js';
import { resolveMarker } from '#shared/sky/index.js';
import { offeredSpecs } from './offered-specs.service.js';
import type { SkyMarkerYearsService } from './sky-marker-years.service.js';
import { toSkyMarkerYear } from './sky-markers.mapper.js';

/** Signs beyond a star's first and last days, for those who choose what an entry goes by. */
export class SkyMarkersService {
  constructor(
    private readonly places: PlacesService,
    private readonly years: SkyMarkerYearsService,
  ) {}

  /** What makes sense at the place, each with its days; what never happens there is not among it. */
  async list(actor: Actor, placeId: string, year: number): Promise<SkyMarkerYear[]> {
    const place = await this.places.read(actor, placeId);
    return offeredSpecs(place)
      .map((spec) => this.years.year(place, year, spec))
      .filter(({ outcome }) => outcome !== 'never-here')
      .map((markerYear) => toSkyMarkerYear(markerYear, place));
  }

  async compute(actor: Actor, placeId: string, { year, spec }: SkyMarkerQuestion): Promise<SkyMarkerYear> {
    const place = await this.places.read(actor, placeId);
    if ('markerKey' in spec && resolveMarker(spec.markerKey) === null) {
      throw invalidField('spec.markerKey', 'unknown-marker');
    }
    return toSkyMarkerYear(this.years.year(place, year, spec), place);
  }
}
