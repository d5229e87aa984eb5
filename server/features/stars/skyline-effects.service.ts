import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { RangedDay, SkylineEffect } from '#shared/contracts/stars.js';
import { FIGURES, markerKeyOf, STARS, type MarkerYear, type Occurrence } from '#shared/sky/index.js';
import type { Actor } from '../../http/actor.js';
import type { PlacesService } from '../places/places.service.js';
import { figuresOf, type WatchedPlace } from '../places/watched-place.service.js';
import { flatOccurrence, onFlatGround } from './flat-horizon.js';
import { markerNamesOf } from './marker-names.service.js';
import type { SkyYearsService } from './sky-years.service.js';

/** Stars that everybody knows; enough to see what a hill does. */
const BRIGHTER_THAN_V = 1.5;
/** The two dates that people wait for. */
const SHOWN = ['heliacal-rising', 'heliacal-setting'] as const;

const BUILT_IN_KEYS: readonly string[] = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.filter((star) => star.vMag < BRIGHTER_THAN_V)
    .sort((a, b) => a.vMag - b.vMag)
    .map((star) => markerKeyOf(star.hr)),
];

/** What the skyline does to first mornings and last evenings: hills may move a date, make one, or take it away. */
export class SkylineEffectsService {
  constructor(
    private readonly places: PlacesService,
    private readonly skyYears: SkyYearsService,
  ) {}

  async ofPlace(actor: Actor, placeId: string, year: number): Promise<SkylineEffect[]> {
    return this.of(await this.places.watched(actor, placeId), year);
  }

  /** The same for any place, saved or not. Figures first, the village's own before others, then stars by brightness. */
  of(place: WatchedPlace, year: number): SkylineEffect[] {
    const keys = [...figuresOf(place).map((figure) => figure.key), ...BUILT_IN_KEYS];
    const hills = this.skyYears.markerYears(place, year, keys);
    const flats = this.skyYears.markerYears(onFlatGround(place), year, keys);
    return hills.flatMap((hill, index) => {
      const flat = flats[index];
      return flat ? SHOWN.flatMap((phenomenon) => this.compare(place, flat, hill, phenomenon)) : [];
    });
  }

  private compare(
    place: WatchedPlace,
    flat: MarkerYear,
    hill: MarkerYear,
    phenomenon: (typeof SHOWN)[number],
  ): SkylineEffect[] {
    const overHill = hill.phenomena[phenomenon].occurrences[0] ?? null;
    const overFlat = overHill
      ? flatOccurrence(this.skyYears, place, hill, phenomenon, overHill)
      : (flat.phenomena[phenomenon].occurrences[0] ?? null);
    if (overHill === null && overFlat === null) return [];
    const { markerKey, name, designation } = markerNamesOf(hill.markerKey, figuresOf(place));
    return [
      {
        markerKey,
        name: name === '' ? designation : name,
        phenomenon,
        flat: overFlat && toRangedDay(overFlat),
        hill: overHill && toRangedDay(overHill),
        differenceDays: overHill && overFlat && overHill.expected.dayNumber - overFlat.expected.dayNumber,
        hillOutcome: hill.outcome,
        hillPhenomenonOutcome: hill.phenomena[phenomenon].outcome,
      },
    ];
  }
}

function toRangedDay(occurrence: Occurrence): RangedDay {
  const { expected, early, late } = occurrenceDaysOf(occurrence);
  return { ...expected, early, late };
}
