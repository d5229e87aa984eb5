/** English texts of the namespace "drift": a marker's day across the centuries. */
export const texts = {
  title: 'How {{star}} moved',
  titlePlain: 'How a star moved',
  under: 'from {{place}}, {{from}} to {{to}}',
  trouble: 'The centuries could not be computed',
  which: 'Which of its days',
  stretch: 'Which years',
  stretches: {
    recent: '1000 to 2100',
    history: '1001 BC to 2100',
    all: '3001 BC to 3000',
  },
  own: 'Other years',
  from: 'From the year',
  to: 'To the year',

  picture: {
    title: 'Its day through the centuries',
    label:
      '{{star}}, {{phenomenon}}, from {{from}} to {{to}}: {{first}} in {{firstYear}}, {{last}} in {{lastYear}}. {{pace}}',
    labelNone: '{{star}}, {{phenomenon}}, from {{from}} to {{to}}: no such day in any of these years.',
    read: 'Earlier days stand above, later days below, in today’s calendar. The line is the expected day, the band its range; leap days, which push single dates by up to a day, are smoothed out.',
    peg: 'The peg stands at {{year}}: about {{day}}.',
    none: 'It has no such day here in any of these years.',
    why: {
      'never-sets': 'It never sets, so it is never lost and never comes back.',
      'never-rises': 'It never rises.',
      'below-skyline': 'It stays below the skyline.',
      'never-clears-skyline': 'It stays below the skyline.',
      'never-dark-enough': 'The sky is never dark enough for it at that time of year.',
    },
  },
  pace: {
    later: 'It moves later by about {{days}} days in a century.',
    earlier: 'It moves earlier by about {{days}} days in a century.',
    still: 'It keeps its day.',
    none: 'Its pace cannot be told from these years.',
  },
  paceWhy:
    'The sky turns slowly behind the seasons (the trade says precession), so a star’s day moves. A calendar that quotes an old day must compute it again.',
  turn: {
    begins: 'It has had this day here since {{year}}. {{before}}',
    ceases: 'It has had no such day here since {{year}}. {{now}}',
    before: {
      'never-sets': 'Before that it never set.',
      'never-rises': 'Before that it never rose.',
      'below-skyline': 'Before that it stayed below the skyline.',
      'never-clears-skyline': 'Before that it stayed below the skyline.',
      'rises-and-sets': 'Before that the sky was never dark enough for it.',
    },
    now: {
      'never-sets': 'From then on it never sets.',
      'never-rises': 'From then on it never rises.',
      'below-skyline': 'From then on it stays below the skyline.',
      'never-clears-skyline': 'From then on it stays below the skyline.',
      'rises-and-sets': 'From then on the sky is never dark enough for it.',
    },
  },
  table: {
    caption: '{{star}}, {{phenomenon}}, from {{from}} to {{to}}',
    year: 'Year',
    gregorian: 'Day in today’s calendar',
    julian: 'Julian calendar',
    sun: 'Sun’s longitude',
    sunNote:
      'The Sun’s longitude is the place in the seasons that no calendar bends: 90° is the June solstice.',
    inUse: '{{year}}, the year on screen',
    noDay: {
      'never-sets': 'never sets',
      'never-clears-skyline': 'never clears the skyline',
      'never-dark-enough': 'never dark enough',
      'none-in-this-year': 'not in this year',
    },
  },
  csv: 'CSV',
  csvLabel: 'The four days through these years as a CSV file',
  paces: 'How fast its four days move',
  pacesNote: 'Days in a century, in today’s calendar, over these years.',
  paceLater: '{{days}} later',
  paceEarlier: '{{days}} earlier',
  paceUnknown: 'not to be told',
  finder: 'Which signs fall on its old day now?',
  basis: 'What these days rest on',
  basisLine:
    'Eye-and-air rule: {{source}}. Sky of each year, with the stars’ own motion; skyline, air and shifts as they are set for {{place}} today. Engine {{version}}.',
  basisCare:
    'In about eight seasons of ten the day falls within its range. How people saw in old times, and how clear their air was, cannot be known.',
} as const;
