import { useCurrentPlace } from './community.js';
import { isoOf, todayIn } from './days.js';

/** The civil day at the place on screen, `YYYY-MM-DD`; of a village without a place, this device's. */
export function useVillageDay(): string {
  return isoOf(todayIn(useCurrentPlace().place?.timeZone ?? null));
}
