import type { DataSource } from 'typeorm';
import type { Clock } from '../../http/context.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { LeftOutService } from './left-out.service.js';
import { NoNamesService } from './no-names.service.js';
import { OpenPageCardService } from './open-page-card.service.js';
import { OpenPageService } from './open-page.service.js';

export interface OpenPageServices {
  pages: OpenPageService;
  cards: OpenPageCardService;
  leftOut: LeftOutService;
  noNames: NoNamesService;
}

export function openPageServices(
  dataSource: DataSource,
  clock: Clock,
  contents: FrozenContentService,
  publicUrl: string,
): OpenPageServices {
  return {
    pages: new OpenPageService(dataSource, clock, contents),
    cards: new OpenPageCardService(dataSource, clock, publicUrl),
    leftOut: new LeftOutService(dataSource, contents),
    noNames: new NoNamesService(dataSource, clock, contents),
  };
}
