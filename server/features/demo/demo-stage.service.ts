import type { DataSource } from 'typeorm';
import type { Clock } from '../../http/context.js';
import { CalendarsService } from '../calendars/calendars.service.js';
import { EntriesService } from '../calendars/entries.service.js';
import { SkyDatesService } from '../calendars/sky-dates.service.js';
import { CardSignInService } from '../cards/card-sign-in.service.js';
import { AnswersService } from '../reviews/answers.service.js';
import { SigningService } from '../reviews/signing.service.js';
import { VariantsService } from '../variants/variants.service.js';
import { FrozenContentService } from '../versions/frozen-content.service.js';
import { PublishingService } from '../versions/publishing.service.js';
import { VersionsService } from '../versions/versions.service.js';

/** In the demo everybody writes; nobody's voice is kept. */
export const UNSPOKEN = { keepWith: () => Promise.reject(new Error('Nobody speaks in the demo')) };

/** What every calendar of the demo is played with: the services that everybody uses, by a clock of the story. */
export function demoStage(dataSource: DataSource, clock: Clock) {
  const sky = new SkyDatesService();
  const versions = new VersionsService(dataSource, clock);
  const contents = new FrozenContentService(dataSource, clock, sky);
  return {
    calendars: new CalendarsService(dataSource, clock),
    entries: new EntriesService(dataSource, clock, sky),
    variants: new VariantsService(dataSource, clock, sky),
    publishing: new PublishingService(dataSource, clock, contents, versions),
    answers: new AnswersService(dataSource, clock, new CardSignInService(dataSource, clock), UNSPOKEN),
    signing: new SigningService(dataSource, clock, versions),
  };
}
