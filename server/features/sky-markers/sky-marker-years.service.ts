import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { computeSkyMarker, type SkyMarkerSpec, type SkyMarkerYear } from '#shared/sky/index.js';
import { figuresOf, settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';

/** A marker's year takes a few milliseconds and a few hundred bytes. */
const KEPT_YEARS = 500;

/** Years of markers beyond a star's first and last days, each computed once while the place stays as it is. */
export class SkyMarkerYearsService {
  private readonly kept = new Map<string, SkyMarkerYear>();

  /** The spec's star or figure must be known. A figure that was changed has other years. */
  year(place: WatchedPlace, year: number, spec: SkyMarkerSpec): SkyMarkerYear {
    const figures = figuresOf(place).filter((figure) => 'markerKey' in spec && figure.key === spec.markerKey);
    const key = canonicalJson([year, spec, siteOf(place), settingsOf(place), figures]);
    const found =
      this.kept.get(key) ?? computeSkyMarker(spec, siteOf(place), settingsOf(place), year, figures);
    this.kept.delete(key);
    this.kept.set(key, found);
    const [oldest] = this.kept.keys();
    if (this.kept.size > KEPT_YEARS && oldest !== undefined) this.kept.delete(oldest);
    return found;
  }
}
