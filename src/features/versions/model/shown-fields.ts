/** Fields of an entry in the order in which the table shows them; what the machine alone reads is left out. */
export const SHOWN_FIELDS = [
  'titleOfficer',
  'titleVillage',
  'lead',
  'marker',
  'offsets',
  'window',
  'lastDate',
  'protectiveWatch',
  'kind',
  'icon',
  'crop',
  'otherSigns',
  'ifLate',
  'caution',
  'notes',
  'giver',
  'agreedToPrint',
  'sharingLevel',
] as const;

export type ShownField = (typeof SHOWN_FIELDS)[number];
