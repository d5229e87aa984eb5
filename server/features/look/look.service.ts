import type { Look, LookQuery } from '#shared/contracts/look.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { resolveMarker, watchTimes, whereToLook } from '#shared/sky/index.js';
import type { Phenomenon, WatchSide } from '#shared/sky/index.js';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { civilDateAt } from '../places/place-day.service.js';
import type { PlacesService, VillagePlace } from '../places/places.service.js';
import { settingsOf, siteOf } from '../places/watched-place.service.js';
import type { LookSeasonService } from './look-season.service.js';
import { toLook } from './look.mapper.js';

const JD_UNIX_EPOCH = 2_440_587.5;
const MS_PER_DAY = 86_400_000;

export class LookService {
  constructor(
    private readonly places: PlacesService,
    private readonly seasons: LookSeasonService,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor, placeId: string, query: LookQuery): Promise<Look> {
    const place = await this.places.watched(actor, placeId);
    return this.at(place, query);
  }

  private at(place: VillagePlace, { marker, phenomenon, date }: LookQuery): Look {
    if (resolveMarker(marker, place.figures) === null) throw invalidField('marker', 'unknown-marker');
    const side = sideOf(phenomenon);
    const dayNumber = date === undefined ? this.nextDay(place, marker, phenomenon) : dayNumberFromIso(date);
    const season = this.seasons.of(place, marker, phenomenon, dayNumber);
    return toLook({
      place,
      phenomenon,
      sky: whereToLook(marker, siteOf(place), settingsOf(place), dayNumber, side, place.figures),
      season,
      alternative:
        season.days === null ? this.seasons.alternative(place, marker, phenomenon, dayNumber) : null,
    });
  }

  /** The next morning or evening while the star's days are open, else its next expected day. */
  private nextDay(place: VillagePlace, markerKey: string, phenomenon: Phenomenon): number {
    const today = dayNumberFromIso(civilDateAt(this.clock.now(), place));
    const { stopLookingJdUt } = watchTimes(siteOf(place), today);
    const nowJdUt = JD_UNIX_EPOCH + this.clock.now().getTime() / MS_PER_DAY;
    const isOver =
      sideOf(phenomenon) === 'dawn' && nowJdUt > (stopLookingJdUt ?? today - place.longitudeDeg / 360);
    const next = isOver ? today + 1 : today;
    const { season, days } = this.seasons.of(place, markerKey, phenomenon, next);
    return season === 'within' || days === null ? next : days.expected.dayNumber;
  }
}

export function sideOf(phenomenon: Phenomenon): WatchSide {
  return phenomenon === 'heliacal-rising' || phenomenon === 'cosmical-setting' ? 'dawn' : 'dusk';
}
