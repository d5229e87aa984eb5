/** English texts of what leaves the calendar: files and addresses. Keys with _one and _other follow i18next's plural rules. */
export const texts = {
  along: {
    title: 'Take along',
    what: 'Files hold what is open or the village’s and was agreed to be put into calendars. What is kept by a few is in none of them.',
    notPublished: 'This is not published. Every file says so.',
    sheet: 'The sheet, to print',
    reminder: 'Remind me on the telephone',
    noReminder: 'Never',
    daysAhead_zero: 'On the day',
    daysAhead_one: '{{count}} day ahead',
    daysAhead_other: '{{count}} days ahead',
    ics: 'For a telephone’s calendar',
    csv: 'As a table (CSV)',
    json: 'Whole, to bring back in (JSON)',
    zip: 'Whole, with voices and pictures (ZIP, about {{size}} MB)',
    voices_one: '{{count}} voice goes along.',
    voices_other: '{{count}} voices go along.',
    pictures_one: '{{count}} picture goes along.',
    pictures_other: '{{count}} pictures go along.',
    stays_one:
      '{{count}} voice or picture stays here: it is kept by a few or for its season, or nobody has agreed that it is handed on.',
    stays_other:
      '{{count}} voices and pictures stay here: they are kept by a few or for their season, or nobody has agreed that they are handed on.',
    tooLarge: 'It is larger than what can be brought back in at once (512 MB): keep it as a copy.',
  },
  feeds: {
    title: 'Always fresh on your telephone',
    what: 'An address that your telephone’s calendar looks at by itself. It always holds what is published today; what is taken back goes by itself.',
    make: 'Make an address',
    made: 'Give this address to your telephone’s calendar as a subscription. It is shown only now.',
    copy: 'Copy the address',
    care: 'Whoever has this address reads the calendar without a password. Do not pass it on; end it when a telephone is lost.',
    madeOn: 'Made {{when}}',
    neverFetched: 'No telephone has looked at it yet.',
    fetchedOn: 'Last looked at on {{date}}.',
    end: 'End it',
    endSure: 'End this address?',
    endWhat:
      'Telephones that have it get nothing new from now on. What they hold already may stay on them until it is deleted there.',
    endDo: 'End it now',
  },
} as const;
