/** English texts of Today. Keys with _one and _other follow i18next's plural rules. */
export const texts = {
  title: 'Today',
  noPlace: 'No watching place yet',
  noPlaceHint: 'Dates need a place: its latitude, its skyline and how clear the air is.',
  addPlace: 'Add the first place',
  askOfficer: 'The officer of the village adds it.',

  peg: {
    title: 'Peg today: <b>hole {{hole}}</b>, row {{row}}',
    picture: 'The row of {{month}}: the peg stands at the {{day}}th hole of {{count}}.',
    mayShow: '{{marker}}: {{phenomenon}}, {{between}}',
    window: '{{title}}: best {{range}}, last {{last}}',
    nothing: 'No work of the calendar is open today.',
    open: 'Open now',
    lostPlace: 'Lost your place? The hole’s number is the day of the year.',
  },

  watch: {
    tomorrowDawn: 'Tomorrow before dawn',
    thisEvening: 'This evening',
    next: 'Next to look for',
    look: 'Look for <b>{{marker}}</b> in the {{compass}}.',
    dawnStands: 'It crosses the skyline about {{time}}. Begin to look then.',
    duskStands: 'It crosses the skyline about {{time}}. Begin to look at {{start}}.',
    expected: '{{phenomenon}}: {{aboutBetween}}.',
    stop: 'Stop at <b>{{time}}</b>. Eyes only: no phone camera, no binoculars, and never the Sun.',
    notBefore: 'Not before <b>{{time}}</b>, when the Sun is down. Eyes only: no phone camera, no binoculars.',
    night:
      'Go in pairs, carry a light, mind animals, water and the edges of terraces. From the home yard is always enough.',
    picture: '{{marker}} over the skyline in the {{compass}}: it stands on the skyline about {{time}}.',
    pictureStop: 'Stop looking at {{time}}.',
    comesUp: '{{time}} comes up',
    goesDown: '{{time}} goes down',
    stopLabel: '{{time}} stop',
    startLabel: '{{time}} begin',
    hand: '1 hand',
    handHint: '1 hand: your fist at the end of your straight arm, about 10°.',
    toLook: 'Where to look, with the times of each day',
    toStar: 'More about {{marker}}',
    none: 'No star comes or goes in the next days',
    leads: 'The calendar goes by it: {{titles}}.',
  },

  coming: {
    title: 'Coming up',
    titleLater: 'The next ones',
    label: 'What comes next, with the days between',
    today: 'Today, {{day}}',
    item: '{{marker}}, {{phenomenon}}',
    inRange: 'can be any day now, until {{day}}',
    between: '{{between}}',
  },

  waiting: {
    title: 'Waiting for you',
    nothing: 'Nothing waits for you.',
    'answer-entries': {
      title_one: '{{place}} {{year}}: {{count}} entry waits for your answer',
      title_other: '{{place}} {{year}}: {{count}} entries wait for your answer',
      detail: 'Submission {{number}}, {{done}} of {{of}} answered',
    },
    'answer-own-entries': {
      title_one: '{{place}} {{year}}: {{count}} entry that you keep waits for your answer',
      title_other: '{{place}} {{year}}: {{count}} entries that you keep wait for your answer',
      detail: 'Only those who keep them see them; {{done}} of {{of}} answered',
    },
    'sign-as-elder': {
      title: '{{place}} {{year}}: you have answered everything',
      detail: 'Submission {{number}} waits for your signature',
    },
    'sign-as-steward': {
      title: '{{place}} {{year}} waits for your signature',
      detail: 'Submission {{number}}: sign that the village’s way was kept',
    },
    'elder-asked-change': {
      title: '{{person}} asks for a change: {{entry}}',
      detail: '“{{note}}”',
    },
    'elder-said-not-for-board': {
      title: '{{person}} says: not for the board: {{entry}}',
      detail: 'Take the entry out of the draft, then submit again.',
    },
    'review-progress': {
      title: '{{place}} {{year}}, submission {{number}}: {{done}} of {{of}} elders have answered',
      detail: 'Silence is never agreement; a visit may help.',
    },
    'ready-to-publish': {
      title: '{{place}} {{year}} is signed off',
      detail: 'Submission {{number}} can be published',
    },
    'go-on-with-draft': {
      title: 'The draft of {{place}} {{year}}',
      detail_one: '{{count}} entry, not submitted yet',
      detail_other: '{{count}} entries, not submitted yet',
    },
    'print-published': {
      title: '{{label}} of {{place}} can be printed',
      detail: 'Measure one page first, then print the rest.',
    },
    'heirs-open': {
      title_one: 'Something of {{count}} person who died waits to be passed on',
      title_other: 'Something of {{count}} people who died waits to be passed on',
      detail: 'Under People: say who is meant.',
    },
    'consents-due': {
      title_one: '{{count}} consent is due to be asked again',
      title_other: '{{count}} consents are due to be asked again',
      detail: 'Ask anew; no answer is never a yes.',
    },
  },
  action: {
    review: 'Go on with the review',
    draft: 'Go on with the {{year}} draft',
    sheet: 'Open the sheet',
    sign: 'Open the submission',
  },
} as const;
