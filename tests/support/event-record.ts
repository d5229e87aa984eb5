import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';

/** As whole, of work that waits for no signs. */
export function withoutSigns(): EventRecord {
  const { what } = wholeRecord();
  const { variety } = EMPTY_RECORD.what;
  return wholeRecord({ what: { ...what, operation: 'weed', variety }, signs: EMPTY_RECORD.signs });
}

/** A whole record of sowing: nothing that its kind needs is left unsaid. */
export function wholeRecord(changes: Partial<EventRecord> = {}): EventRecord {
  const check = { office: 'Agricultural office', name: 'R. Ansel', day: '2027-02-03' };
  return {
    what: {
      operation: 'sow',
      ownOperation: '',
      variety: { name: 'long millet', fromDays: 85, toDays: 95 },
      land: 'upper terraces',
    },
    when: { ...EMPTY_RECORD.when, leadDays: 14, graceDays: 5 },
    signs: {
      list: [
        {
          type: 'soil',
          name: 'wet to the hand',
          look: 'Soil sticks at hand depth.',
          where: 'terraces',
          usual: null,
          stillSeen: 'yes',
        },
        {
          type: 'bird',
          name: 'the reed caller',
          look: 'It calls at dusk.',
          where: 'by the spring',
          usual: { from: { month: 6, day: 1 }, to: { month: 6, day: 20 } },
          stillSeen: 'seldom',
        },
      ],
      needed: 2,
      mustHave: 0,
    },
    work: {
      ...EMPTY_RECORD.work,
      responsible: 'women of each house',
      decides: 'the eldest sister',
      ifEarly: 'Sow one strip and wait.',
      ifLaterStill: 'Sow beans.',
      stop: { date: { month: 7, day: 5 }, source: 'Agricultural office' },
      askWhom: 'the field officer',
    },
    trust: { confidence: 'fair', by: 'Elder A-1', basis: 'handed-down' },
    heard: { where: 'upper village', day: '2026-11-20', language: 'Tazi' },
    checked: { work: check, safety: check, late: check },
    ...changes,
  };
}
