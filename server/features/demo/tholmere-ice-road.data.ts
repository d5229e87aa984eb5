import { days, demoEntry, lastDay, type DemoEntry, type DemoVariant } from './demo-entry.js';

const LOG_AND_NOTICE = 'Community ice log and authority notice';
const LEAD = { type: 'fixed-date', date: { month: 4, day: 30 }, source: LOG_AND_NOTICE } as const;

/** People drive on this ice: no star leads it, and nothing reaches over the day that the authority set. */
export const ICE_ROAD: DemoEntry = demoEntry('C05', {
  titleVillage: 'Ranvǭ thóλ',
  titleOfficer: 'Stop using the ice road',
  kind: 'safety',
  icon: 'frost',
  notes: 'Only named measurers drill.',
  caution: 'Never drive on ice that nobody measured today.',
  lead: LEAD,
  offsets: days(-19, -14, 0, 5),
  ...lastDay(5, 5, 'Road authority'),
  otherSigns: 'One of these: water on ice; grey or white ice; edges lifting',
  ifLate: 'Never extend past the authority closing date',
  giver: 'The officer',
});

/** Two families read the ice by different signs. Both stand there, and the earlier closing counts. */
export const ICE_ROAD_FAMILIES: readonly DemoVariant[] = [
  {
    code: 'C05',
    by: null,
    content: {
      difference: 'other-sign',
      lead: LEAD,
      offsets: days(-19, -14, -4, 1),
      otherSigns: 'Water standing on the ice at noon two days in a row',
      ifLate: 'Walk round by the shore',
      giver: 'A family of the shore',
      confidence: 'strong',
      basis: 'own-years',
      note: 'They close once water stands on it, whatever the log says.',
      sharingLevel: 'open',
    },
  },
  {
    code: 'C05',
    by: null,
    content: {
      difference: 'other-sign',
      lead: LEAD,
      offsets: days(-16, -10, 0, 3),
      otherSigns: 'Grey or white ice, or the edges lifting from the bank',
      ifLate: 'Ask the ice committee to measure again',
      giver: 'A family of the upper bank',
      confidence: 'fair',
      basis: 'handed-down',
      note: 'They look at the colour of the ice and at its edges.',
      sharingLevel: 'open',
    },
  },
];
