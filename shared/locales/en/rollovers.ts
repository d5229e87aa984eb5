/** English texts for beginning next year's draft from this year's, and for what the new year changed. */
export const texts = {
  next: {
    begin: 'Begin {{year}} from this one',
    question: 'Begin the calendar of {{year}} from {{from}}?',
    keeps:
      'Every entry goes along with its sign, its days before and after, its giver and whoever may see it. The days are computed anew for {{year}}.',
    nothingAgreed:
      'Nothing is agreed by this: elders answer to {{year}} as to every new calendar. The calendar of {{from}} stays as it is.',
    yes: 'Begin {{year}}',
    done: 'The draft of {{year}} is begun.',
    open: 'Open {{year}}',
    report: 'What changed from {{from}} to {{year}}',
  },
  title: 'From {{from}} to {{year}}',
  under: '{{place}}. Begun by {{name}}, {{when}}',
  trouble: 'What changed could not be brought up',
  gone: 'There is no such list any more',
  goneWhy: 'It stands until the new draft is first submitted. From then on, compare the versions.',
  openDraft: 'Open the draft of {{year}}',
  nothingAgreed:
    'Nothing in this draft is agreed yet. Recordings and notes stay with the entries of {{from}}.',
  counts: {
    title: 'In short',
    moved_one: '{{count}} entry moved by more than three days.',
    moved_other: '{{count}} entries moved by more than three days.',
    'lost-days_one':
      '{{count}} entry has no days in {{year}}: its sign does not come, or the last date closes it.',
    'lost-days_other':
      '{{count}} entries have no days in {{year}}: their sign does not come, or the last date closes them.',
    'found-days_one': '{{count}} entry has days again.',
    'found-days_other': '{{count}} entries have days again.',
    'without-days_one': '{{count}} entry has no days in either year.',
    'without-days_other': '{{count}} entries have no days in either year.',
    stays_one: '{{count}} entry stays within three days.',
    stays_other: '{{count}} entries stay within three days.',
    consent_one: 'For {{count}} entry somebody is to be asked before {{year}}.',
    consent_other: 'For {{count}} entries somebody is to be asked before {{year}}.',
    none: 'The draft has no entries that you see.',
  },
  group: {
    moved: 'Moved by more than three days',
    'lost-days': 'No days in {{year}}',
    'found-days': 'Days again',
    'without-days': 'No days in either year',
    consent: 'To be asked again',
    stays: 'As usual',
  },
  table: {
    caption: '{{group}}: entries with their days in {{from}} and {{year}}',
    entry: 'Entry',
    move: 'Against the same day',
  },
  move: {
    later_one: '{{count}} day later',
    later_other: '{{count}} days later',
    earlier_one: '{{count}} day earlier',
    earlier_other: '{{count}} days earlier',
    same: 'the same day',
    none: '–',
  },
  askAgain: 'Ask about it',
} as const;
