import { z } from 'zod';
import { isoDate } from '#shared/contracts/common.js';
import { keep, readKept } from '#src/lib/device-storage.js';
import { MARKET_DAYS_MAX, MARKET_DAYS_MIN } from './strip-scale.js';

/** How somebody likes to read the strip of a village on this device. */
const stripSettings = z.strictObject({
  yearFrom: z.enum(['civil', 'local']),
  /** `none`, `moons`, `months` of the village, `market`, or a calendar that the browser knows. */
  scale: z.string().max(40),
  marketDays: z.number().int().min(MARKET_DAYS_MIN).max(MARKET_DAYS_MAX),
  /** Any day on which there was a market. */
  marketDay: isoDate,
});
export type StripSettings = z.infer<typeof stripSettings>;

export const FIRST_SETTINGS: StripSettings = {
  yearFrom: 'civil',
  scale: 'none',
  marketDays: 7,
  marketDay: '2027-01-04',
};

function keyOf(communityId: string): string {
  return `strip.${communityId}`;
}

export function readStripSettings(communityId: string): StripSettings {
  const kept = stripSettings.safeParse(readKept(keyOf(communityId)));
  return kept.success ? kept.data : FIRST_SETTINGS;
}

export function keepStripSettings(communityId: string, settings: StripSettings): void {
  keep(keyOf(communityId), settings);
}
