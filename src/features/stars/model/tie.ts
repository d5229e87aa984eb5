import type { MarkerRow } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';

/** Days that people tie work to, the best first: a return is watched for, a last sight is noticed late. */
const ORDER: readonly Phenomenon[] = [
  'heliacal-rising',
  'heliacal-setting',
  'acronychal-rising',
  'cosmical-setting',
];

/** The day that the main action offers; null where the star has none in this year. */
export function phenomenonToTie(row: MarkerRow): Phenomenon | null {
  return ORDER.find((phenomenon) => row.phenomena[phenomenon].outcome === 'dated') ?? null;
}

/** The four days in the order in which their cards stand: back again, gone, then the other half of the night. */
export const CARD_ORDER: readonly Phenomenon[] = [
  'heliacal-rising',
  'heliacal-setting',
  'acronychal-rising',
  'cosmical-setting',
];
