/** English texts of the namespace "moons". Keys with _one and _other follow i18next's plural rules. */
export const texts = {
  title: 'Moons',
  under: '{{place}}, {{year}}',
  year: 'Year',
  csv: 'CSV',
  csvLabel: 'These Moons as a CSV file',
  noPlace: 'The Moons need a watching place. Add one under Village.',
  trouble: 'The Moons could not be computed',

  event: {
    new: 'New Moon',
    'first-crescent': 'First crescent',
    full: 'Full Moon',
  },
  firstCrescentMeans:
    'The first crescent is the first evening on which the young Moon is seen. It is looked for low in the west after sunset.',

  rule: {
    title: 'How the months are counted',
    lineNone: 'The Moons are not counted.',
    marker: 'Counted from',
    none: 'Do not count months',
    phenomenon: 'Its sign',
    month: 'The sign falls in month',
    monthHint: 'Month 1: the year begins with the Moon in which the sign is seen.',
    begins: 'A month begins with',
    means:
      'When the Moons have run ahead of the star, so that its sign falls after the month that must hold it, a thirteenth month is put in.',
  },

  count: {
    twelve: 'The local year {{year}} has twelve months.',
    thirteen: 'The local year {{year}} has a thirteenth month: it begins on the evening of about {{day}}.',
    notNamed: 'This year’s months cannot be counted by this sign.',
    nearEdge:
      'In {{year}} the sign falls close to the turn of a Moon. What people see decides which month holds it, and so whether a thirteenth is needed.',
    'never-sets': 'This star never sets here, so it gives no sign to count from. Choose another.',
    'never-clears-skyline':
      'This star is never seen here, so it gives no sign to count from. Choose another.',
    noSign: 'This sign has no day in {{year}}. Choose another star or another of its four days.',
    sign: '{{star}}, {{phenomenon}}: {{days}}.',
    crescentMissing:
      'Where the crescent is not seen, the month is counted from its new Moon: people do not stop counting.',
  },

  picture: {
    title: 'The year’s Moons',
    how: 'One row a Moon, one hole a day, from new Moon to new Moon. The short stroke is where the month begins.',
    table: 'Show as a table',
    spoken: '{{month}}: {{days}}.',
    month: 'Month {{number}}',
    monthShort: '{{number}}',
    thirteenth: 'Thirteenth month',
    thirteenthShort: '13th',
    moonFrom: 'Moon of {{day}}',
    localYear: 'Local year {{year}}',
    sign: '{{star}}: {{phenomenon}}',
    newOn: 'new Moon {{day}}',
    fullOn: 'full Moon {{day}}',
    crescentOn: 'first crescent on the evening of about {{day}}',
    signOn: 'the sign about {{day}}',
    beginsOn: 'begins on the evening of {{day}}',
  },

  crescent: {
    easy: 'Evening of about {{day}}: easy.',
    clear: 'Evening of about {{day}}, if the air is clear.',
    clearBefore: 'If the air is clear, the evening of {{day}}.',
    easyAfter: 'Easy on the evening of {{day}}.',
    lateInHaze: 'In haze perhaps the evening of {{day}}.',
    look: 'Look {{compass}}, best at {{time}}; sunset is at {{sunset}}.',
    lookDark: 'Look {{compass}}, best at {{time}}.',
    none: {
      'stays-too-low': 'Not seen: the young Moon stays too low here for a week.',
      'behind-skyline': 'Not seen as a crescent: your skyline hides it for a week.',
      'sun-never-sets': 'Not seen: the Sun does not set.',
    },
    noneShort: {
      'stays-too-low': 'too low',
      'behind-skyline': 'behind the skyline',
      'sun-never-sets': 'the Sun does not set',
    },
    note: {
      'only-if-air-is-clear': 'It never gets easy in this Moon.',
      'skyline-hides-it-longer': 'The skyline hides it longer than flat ground would.',
      'moon-does-not-set': 'The Moon does not set that night.',
      'sun-does-not-rise': 'The Sun does not rise on that day.',
    },
    word: {
      easy: 'easy',
      'if-air-is-clear': 'if the air is clear',
      'not-by-eye': 'not by eye',
    },
  },

  next: {
    title: 'Next first crescent',
    day: 'Evening of about {{day}}',
  },

  table: {
    caption: 'Moons of {{year}} at {{place}}',
    month: 'Month',
    new: 'New Moon',
    crescent: 'First crescent, evening of',
    full: 'Full Moon',
    at: '{{day}}, {{time}}',
    range: '{{from}} to {{to}}',
    ofYear: 'of {{year}}',
    holdsSign: 'holds the sign',
  },

  venus: {
    title: 'Venus this year',
    appearance: {
      'morning-first': 'First morning',
      'morning-last': 'Last morning',
      'evening-first': 'First evening',
      'evening-last': 'Last evening',
    },
    meaning: {
      'morning-first': 'It comes back as the morning star.',
      'morning-last': 'It is lost in the dawn, on its way behind the Sun.',
      'evening-first': 'It comes back as the evening star.',
      'evening-last': 'It is lost in the dusk, on its way to the mornings.',
    },
    morningOf: 'Morning: {{days}}.',
    eveningOf: 'Evening: {{days}}.',
    withinADay: 'about {{day}}, give or take a day',
    'none-in-this-year': 'None in {{year}}: Venus takes about nineteen months for one round.',
    'never-dark-enough': 'The nights are too light, or Venus stays below the skyline.',
    note: {
      'never-disappears':
        'It is seen in the evening and in the morning around this day: nothing is lost and found.',
      'weak-marker': 'A weak sign: its range is over three weeks.',
      'lost-in-light-nights': 'Light nights end or begin it, not Venus itself.',
    },
  },

  eyes: 'Never look for the Moon or Venus while any part of the Sun is up, and never point binoculars or a phone lens towards it. Begin after sunset; stop before sunrise.',
  nights: 'On night watches go in pairs, and mind animals, water and roads.',
  witnesses:
    'Computed evenings do not replace looking. Many communities begin a month when their own witnesses have seen the Moon.',
  basis:
    'First crescent by two published tests together (Yallop 1997, Odeh 2004), at four ninths of the time from sunset to moonset; Venus by Ptolemy’s five degrees. Phases and places by astronomy-engine; Dawnpeg’s engine {{version}}.',
} as const;
