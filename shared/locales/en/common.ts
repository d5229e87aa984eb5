/** English texts that every screen may use: tools, states, dates, waiting, offline. */
export const texts = {
  productName: 'Dawnpeg',
  pageTitle: '{{page}} · Dawnpeg',
  skipToContent: 'Go to the content',

  rail: {
    label: 'Main places',
    today: 'Today',
    stars: 'Stars',
    calendar: 'Calendar',
    village: 'Village',
    account: 'You and this device',
    who: '{{name}}, {{roles}}',
  },

  takeBack: 'Take back or hide',
  takeBackAbout: 'Take back or hide: {{about}}',

  undo: 'Undo',
  close: 'Close',
  cancel: 'Leave it as it is',
  save: 'Save',
  back: 'Back',
  tryAgain: 'Try again',
  stop: 'Stop',
  show: 'Show',
  hide: 'Hide',
  more: 'More',
  loading: 'One moment',
  optional: '{{label}} (if you like)',
  showAsTable: 'Show as a table',
  showAsPicture: 'Show as a picture',
  less: 'One less',
  plus: 'One more',
  chooseOne: 'Choose one',
  noMatch: 'Nothing fits these letters.',
  suggestionsOpen: 'Show the list',
  sortUp: '{{column}}, sorted, smallest or earliest first',
  sortDown: '{{column}}, sorted, largest or latest first',
  sortNone: '{{column}}, not sorted',

  monthBefore: 'The month before',
  monthAfter: 'The month after',

  closedButton: 'Not yet: {{reason}}',

  pegsDone: '{{done}} of {{total}}',
  stepOf: '{{step}} of {{total}}',
  dayGap_one: '{{count}} day',
  dayGap_other: '{{count}} days',
  days_one: '{{count}} day',
  days_other: '{{count}} days',
  nights_one: '{{count}} night',
  nights_other: '{{count}} nights',
  daysLater_one: '{{count}} day later',
  daysLater_other: '{{count}} days later',
  daysEarlier_one: '{{count}} day earlier',
  daysEarlier_other: '{{count}} days earlier',
  sameDay: 'the same day',

  date: {
    about: 'about {{day}}',
    between: 'between {{from}} and {{to}}',
    aboutBetween: 'About {{day}}, between {{from}} and {{to}}',
    within: {
      aboutBetween: 'about {{day}}, between {{from}} and {{to}}',
      aboutNotAfter: 'about {{day}}, no later than {{to}}',
      aboutNotBefore: 'about {{day}}, no earlier than {{from}}',
      aboutOpen: 'about {{day}}; how much earlier or later cannot be told',
    },
    aboutNotAfter: 'About {{day}}, no later than {{to}}',
    aboutNotBefore: 'About {{day}}, no earlier than {{from}}',
    aboutOpen: 'About {{day}}; how much earlier or later cannot be told',
    notAfter: 'no later than {{to}}',
    notBefore: 'no earlier than {{from}}',
    openRange: 'how much earlier or later cannot be told',
    month: 'Month',
    dayOfMonth: 'Day',
    range: '{{from}} to {{to}}',
    morningOf: 'morning of {{day}}',
    eveningOf: 'evening of {{day}}',
    morningOfAbout: 'Morning of about {{day}}',
    eveningOfAbout: 'Evening of about {{day}}',
    yearBc: '{{year}} BC',
    julian: '{{day}} in the Julian calendar',
    today: 'today',
    yesterday: 'yesterday',
    yesterdayAt: 'yesterday, {{time}}',
    dayAt: '{{day}}, {{time}}',
  },

  state: {
    draft: 'Draft',
    'in-review': 'In review',
    'changes-asked': 'Changes asked',
    'signed-off': 'Signed off',
    published: 'Published',
    replaced: 'Replaced',
    recalled: 'Recalled',
  },

  role: {
    steward: 'steward',
    officer: 'officer',
    elder: 'elder',
    staff: 'print and office',
    observer: 'observer',
  },

  offline: {
    since: 'No network since {{time}}. What you type is kept on this device.',
    stale: 'Last brought up to date {{when}}.',
  },

  keptDraft: 'Kept on this device {{when}}',

  theme: {
    label: 'How the screen looks',
    default: 'Limewash',
    defaultNote: 'for daylight',
    contrast: 'Strong contrast',
    contrastNote: 'black on white, thicker edges',
    ink: 'Little ink',
    inkNote: 'lines only, as it prints',
  },

  village: {
    current: 'Village',
    choose: 'Which village',
    none: 'You belong to no village yet',
    noneHint:
      'Ask the steward of your village to add you. They give you a code; enter it under “I have a code”.',
  },

  place: {
    choose: 'Which place',
    none: 'No watching place yet',
  },

  trouble: {
    title: 'This did not come through',
    loadTitle: 'This page could not be brought up',
    safe: 'What you typed is safe on this device.',
    offline: 'There is no network just now. Try again when it is back.',
    reference: 'Tell the steward this number if it happens again: {{id}}',
    reload: 'Load the page again',
    newVersion: 'Dawnpeg was brought up to date while this page was open. Load it again to go on.',
  },

  notFound: {
    title: 'There is nothing at this address',
    hint: 'It may have been taken out, or it belongs to another village.',
    toToday: 'Go to Today',
  },
} as const;
