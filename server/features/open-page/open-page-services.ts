import type { DataSource } from 'typeorm';
import type { Clock } from '../../http/context.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { LeftOutService } from './left-out.service.js';
import { NoNamesService } from './no-names.service.js';
import { OpenPageService } from './open-page.service.js';

export interface OpenPageServices {
  pages: OpenPageService;
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
    pages: new OpenPageService(dataSource, clock, contents, publicUrl),
    leftOut: new LeftOutService(dataSource, contents),
    noNames: new NoNamesService(dataSource, clock, contents),
  };
}
