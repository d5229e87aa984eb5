import type { Config } from '#server/config/env.js';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';

/** The present moment comes from outside, so that a test can stop it. */
export interface Clock {
  now(): Date;
}

/** What features are made from. */
export interface AppContext {
  dataSource: DataSource;
  config: Config;
  clock: Clock;
  log: Logger;
}
