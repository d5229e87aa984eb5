import type { EntryInput } from '#shared/contracts/calendars.js';
import type { VariantInput } from '#shared/contracts/variants.js';

/** Other keepers' timings that stand beside an entry. */
export const VARIANTS: readonly {
  code: string;
  content: Omit<VariantInput, 'giverId'>;
  by: 'elder3' | null;
}[] = [
  {
    code: 'A03',
    by: null,
    content: {
      difference: 'other-marker',
      lead: {
        type: 'sky',
        spec: {
          kind: 'moon-counted',
          markerKey: 'pleiades',
          phenomenon: 'heliacal-rising',
          event: 'first-crescent',
          count: 1,
        },
        occurrence: 1,
      },
      offsets: { earliestDays: 0, bestFromDays: 0, bestToDays: 2, lastAdvisedDays: 4 },
      otherSigns: 'The thin Moon seen at dusk',
      ifLate: 'Hold it on the next market day',
      giver: 'A second family',
      confidence: 'fair',
      basis: 'handed-down',
      note: 'They hold it on the thin Moon after the Cluster has been seen.',
      sharingLevel: 'village',
    },
  },
  {
    code: 'A04',
    by: 'elder3',
    content: {
      difference: 'other-marker',
      lead: { type: 'marker', markerKey: 'hr1457', phenomenon: 'heliacal-rising', occurrence: 1 },
      offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
      otherSigns: 'The red star seen at dawn; soil wet to a hand depth',
      ifLate: 'Short millet, as everybody',
      giver: 'Elder A-3',
      confidence: 'strong',
      basis: 'handed-down',
      note: 'Waits for the red star, some days later than the Cluster.',
      sharingLevel: 'open',
    },
  },
];

/** What Elder A-3 gave for the elders alone, to be told in August. Invented, like everything here. */
export const WITHHELD_ENTRY: EntryInput = {
  titleVillage: 'Sìlɛ ɗúma',
  titleOfficer: 'The quiet evening',
  kind: 'belief',
  icon: 'lamp',
  crop: '',
  notes:
    'The lamps are lit from the upper end of the village down, and nobody speaks until the last one burns.',
  caution: '',
  lead: { type: 'marker', markerKey: 'hr2326', phenomenon: 'heliacal-rising', occurrence: 1 },
  offsets: { earliestDays: 2, bestFromDays: 2, bestToDays: 11, lastAdvisedDays: 11 },
  hasLastDate: false,
  lastDate: null,
  protectiveWatch: false,
  otherSigns: '',
  ifLate: '',
  giver: 'Elder A-3',
  agreedToPrint: false,
  sharingLevel: 'elders',
  sharing: {
    groupId: null,
    trace: 'blank',
    tellingSeason: { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } },
    successorId: null,
    naming: 'role',
  },
};
