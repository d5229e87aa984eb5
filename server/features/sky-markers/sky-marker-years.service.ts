import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { computeSkyMarker, type SkyMarkerSpec, type SkyMarkerYear } from '#shared/sky/index.js';
import { settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';

/** A marker's year takes a few milliseconds and a few hundred bytes. */
const KEPT_YEARS = 500;

/** Years of markers beyond a star's first and last days, each computed once while the place stays as it is. */
export class SkyMarkerYearsService {
  private readonly kept = new Map<string, SkyMarkerYear>();

  /** The spec's star must be in the table. */
  year(place: WatchedPlace, year: number, spec: SkyMarkerSpec): SkyMarkerYear {
    const key = canonicalJson([year, spec, siteOf(place), settingsOf(place)]);
    const found = this.kept.get(key) ?? computeSkyMarker(spec, siteOf(place), settingsOf(place), year);
    this.kept.delete(key);
    this.kept.set(key, found);
    const [oldest] = this.kept.keys();
    if (this.kept.size > KEPT_YEARS && oldest !== undefined) this.kept.delete(oldest);
    return found;
  }
}
