import type { Variant, VariantInput } from '#shared/contracts/variants.js';
import type { Client } from './api.js';

/** Waits for the red star instead of the Cluster; whole, ready to send. */
export function variantInput(changes: Partial<VariantInput> = {}): VariantInput {
  return {
    difference: 'other-marker',
    lead: { type: 'marker', markerKey: 'hr1457', phenomenon: 'heliacal-rising', occurrence: 1 },
    offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
    otherSigns: '',
    ifLate: '',
    giver: 'A-3',
    giverId: null,
    confidence: 'strong',
    basis: 'handed-down',
    note: 'Waits for the red star.',
    sharingLevel: 'village',
    ...changes,
  };
}

export async function addVariant(
  client: Client,
  calendarId: string,
  entryId: string,
  changes: Partial<VariantInput> = {},
): Promise<Variant> {
  const path = `/api/calendars/${calendarId}/entries/${entryId}/variants`;
  return (await client.post(path, variantInput(changes)).expect(201)).body as Variant;
}
