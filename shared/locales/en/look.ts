/** English texts of "where to look": the page, its picture and the printed watch card. */
export const texts = {
  title: 'Where to look',
  underOf: 'Where to look, {{place}}',
  under: { dawn: '{{place}}, morning of {{day}}', dusk: '{{place}}, evening of {{day}}' },
  noPlace: 'No watching place yet',
  noPlaceHint: 'Where to look depends on the place: its latitude and its skyline.',
  trouble: 'Where to look could not be fetched',
  noStar: 'Choose a star first',
  noStarHint: 'Open a star and follow “Where to look”.',
  toStars: 'To the stars',

  day: {
    label: 'Day',
    previous: 'The day before',
    next: 'The next day',
    pick: 'Another day, morning or evening',
    toExpected: 'To {{day}}',
  },
  side: { label: 'Morning or evening', dawn: 'Morning', dusk: 'Evening' },

  limit: {
    dawn: 'Stop at {{time}}',
    dusk: 'Begin at {{time}}',
    polarNight: 'The Sun does not come up on this day.',
    neverSun: 'Never look at the Sun.',
  },

  outcome: {
    seen: 'Look for <b>{{marker}}</b> at about <b>{{time}}</b> in the {{compass}}, {{hands}} above the skyline.',
    seenOn: 'Look for <b>{{marker}}</b> at about <b>{{time}}</b> in the {{compass}}, just above the skyline.',
    'too-light':
      '<b>{{marker}}</b> stands above the skyline in the {{compass}}, but the sky is too light for it on this day.',
    'not-up': '<b>{{marker}}</b> is not above the skyline while people can look on this day.',
    'never-rises': '<b>{{marker}}</b> never rises here: it stays below the ground all year.',
    'below-skyline': '<b>{{marker}}</b> never clears this skyline: the hills stand higher than it climbs.',
    'sun-stays-up': 'The Sun does not set long enough on this day: no star can be seen.',
  },
  /** The same without marks, for the printed card. */
  plain: {
    seen: 'Look for {{marker}} at about {{time}} in the {{compass}}, {{hands}} above the skyline.',
    seenOn: 'Look for {{marker}} at about {{time}} in the {{compass}}, just above the skyline.',
    'too-light':
      '{{marker}} stands above the skyline in the {{compass}}, but the sky is too light for it on this day.',
    'not-up': '{{marker}} is not above the skyline while people can look on this day.',
    'never-rises': '{{marker}} never rises here: it stays below the ground all year.',
    'below-skyline': '{{marker}} never clears this skyline: the hills stand higher than it climbs.',
    'sun-stays-up': 'The Sun does not set long enough on this day: no star can be seen.',
  },
  degrees: '{{azimuth}}° on the compass, {{altitude}}° high; the Sun is {{depth}}° below the ground then.',

  hands: {
    none: 'less than half a hand',
    half: 'half a hand',
    some_one: '{{hands}} hand',
    some_other: '{{hands}} hands',
  },
  handRod: '1 hand',
  handHint: '1 hand: your fist at the end of your straight arm, about 10°.',

  times: {
    title: 'Times',
    comesUp: 'It comes up over the skyline at {{time}}.',
    comesUpBefore: 'It is already up when you begin to look.',
    comesUpAfter: 'It comes up at {{time}}, too late to look.',
    goesDown: 'It goes down behind the skyline at {{time}}.',
    goesDownBefore: 'It has gone down at {{time}}, before you can look.',
    neverSets: 'It never sets here.',
    seen_one: 'In good air it can be seen from {{from}} to {{to}}, about {{count}} minute.',
    seen_other: 'In good air it can be seen from {{from}} to {{to}}, about {{count}} minutes.',
    seenUntil: 'In good air it can be seen until {{to}}.',
    air: {
      clear: 'The air of this month is mostly clear here.',
      ordinary: '',
      hazy: 'The air of this month is usually hazy here: look longer, and on more days.',
    },
  },

  /** What the thick part of the path goes by. */
  sight: {
    show: 'How the thick line is reckoned',
    model:
      'By a model of light, air and eyes, minute by minute. It is set so that {{marker}} just shows on the day that the village’s rule gives: {{phenomenon}}, about {{day}}.',
    keener:
      'For that, eyes count as keener than the model has them by {{mag}} magnitudes; one magnitude is two and a half times the light.',
    duller:
      'For that, eyes count as less keen than the model has them by {{mag}} magnitudes; one magnitude is two and a half times the light.',
    even: 'For that, next to nothing had to be changed in it.',
    plain: 'Left to itself the model would show it from {{from}} to {{to}} in this watch.',
    plainNone: 'Left to itself the model would not show it in this watch.',
    dates: {
      'no-day':
        'By the village’s rule for dates. The star has no first or last day here on this side of the night, so the model of light, air and eyes could not be set by it.',
      'not-in-watch':
        'By the village’s rule for dates. On its own day the star is not up while people can look, so the model of light, air and eyes could not be set by it.',
      'too-far':
        'By the village’s rule for dates. For this star the model of light, air and eyes is too far from that rule here to be set by it: trust neither alone, and look on several days.',
    },
  },

  pointers: {
    title: 'Start from',
    one: '<b>{{name}}</b>, in the {{compass}}: from it go {{hands}} {{way}}.',
    none: 'No bright star stands near it then. Use the skyline.',
  },
  way: {
    up: 'up',
    'up-right': 'up to the right',
    right: 'to the right',
    'down-right': 'down to the right',
    down: 'down',
    'down-left': 'down to the left',
    left: 'to the left',
    'up-left': 'up to the left',
  },

  planets: {
    title: 'Not to be taken for it',
    brighter:
      '<b>{{planet}}</b> is brighter and stands {{hands}} {{place}} {{marker}}. It is a planet, not the star.',
    like: '<b>{{planet}}</b> looks much like it and stands {{hands}} {{place}} {{marker}}. It is a planet, not the star.',
    none: 'No planet stands near it.',
  },
  /** Where the planet stands to the star. */
  besideIt: {
    up: 'above',
    'up-right': 'above and to the right of',
    right: 'to the right of',
    'down-right': 'below and to the right of',
    down: 'below',
    'down-left': 'below and to the left of',
    left: 'to the left of',
    'up-left': 'above and to the left of',
  },
  planet: { mercury: 'Mercury', venus: 'Venus', mars: 'Mars', jupiter: 'Jupiter', saturn: 'Saturn' },

  moon: {
    title: 'The Moon',
    up: '{{shape}}, in the {{compass}}, {{hands}} above the skyline.',
    down: '{{shape}}, not up while you look.',
    shape: {
      new: 'New Moon',
      'waxing-crescent': 'A growing crescent',
      'first-quarter': 'Half Moon, growing',
      'waxing-gibbous': 'More than half, growing',
      full: 'Full Moon',
      'waning-gibbous': 'More than half, shrinking',
      'last-quarter': 'Half Moon, shrinking',
      'waning-crescent': 'A shrinking crescent',
    },
    light: {
      none: 'It takes nothing from the star.',
      some: 'Its light makes the star a little harder to see.',
      strong: 'Its light makes the star much harder to see: look on other days too.',
    },
  },

  season: {
    title: 'Its season',
    within: {
      'heliacal-rising': 'These are the days of its first morning: {{about}}.',
      'cosmical-setting': 'These are the days on which it is first seen setting before dawn: {{about}}.',
      'acronychal-rising': 'These are the days on which it is last seen rising after dusk: {{about}}.',
      'heliacal-setting': 'These are the days of its last evening: {{about}}.',
    },
    before: '{{phenomenon}}: {{about}}. That is still to come.',
    after: 'This year’s days are over. Next, {{phenomenon}}: {{about}}.',
    neverSets: 'It never sets here and is no sign of the season: it has no first and no last day.',
    neverClears: 'It is no sign of the season here.',
    neverDark: 'At that time of year the nights here are too light for it.',
    none: 'It has no such day here in these years.',
    aboutInYear: 'about {{day}}, {{between}}',
    neverDisappears: 'It is never hidden here, so this is no return.',
    weak: 'A weak sign here: its range is longer than three weeks.',
    alternative: 'Another star that serves here: <a>{{marker}}</a>, {{phenomenon}}, {{about}}.',
    noAlternative: 'No bright star has such a day here in the coming year. Use other signs.',
  },

  picture: {
    what: '{{marker}} over the skyline, in the {{compass}}.',
    seen: 'It can be seen from {{from}} to {{to}}.',
    notSeen: 'It cannot be seen on this day.',
    stop: 'Stop looking at {{time}}.',
    start: 'Begin to look at {{time}}.',
    comesUp: '{{time}} comes up',
    goesDown: '{{time}} goes down',
    tooLight: '{{time}} too light',
    darkEnough: '{{time}} dark enough',
    stopLabel: '{{time}} stop',
    startLabel: '{{time}} begin',
    key: 'Thick line: it can be seen. Dotted: the sky is too light, or it stands too low.',
  },

  table: {
    show: 'Show as a table',
    caption: 'Where {{marker}} stands, minute by minute',
    time: 'Time',
    compass: 'Direction',
    height: 'Above the skyline',
    heightOf: '{{hands}}, {{value}}°',
    sun: 'Sun below the ground',
    seen: 'Seen',
    isSeen: 'yes',
    tooLight: 'too light or low',
    no: 'no',
    behind: 'behind the skyline',
    deg: '{{value}}°',
  },

  care: {
    eyes: 'Eyes only: no phone camera, no binoculars, and never the Sun.',
    night:
      'Go in pairs, carry a light, mind animals, water and the edges of terraces. From the home yard is always enough.',
  },
  print: 'Print a card to take along',
  toStar: 'More about {{marker}}',

  /** The printed card: short sentences, so that everything finds room at a size that is read at dawn. */
  card: {
    fileName: '{{place}} {{date}} {{marker}}',
    title: 'Look for {{marker}}',
    stop: 'Stop at {{time}}',
    start: 'Not before {{time}}',
    noLimit: 'The Sun stays down',
    noWatch: 'No watch on this day',
    seen: 'In good air it can be seen from {{from}} to {{to}}.',
    brighter: 'Not {{planet}}, a planet: brighter, {{hands}} {{way}}.',
    like: 'Not {{planet}}, a planet: much like it, {{hands}} {{way}}.',
    pointer: 'From {{name}}, in the {{compass}}, go {{hands}} {{way}}.',
    moonUp: 'The Moon: {{shape}}, in the {{compass}}. {{light}}',
    moonDown: 'The Moon: {{shape}}, not up while you look.',
    days: '{{phenomenon}}: {{about}}.',
    hand: '1 hand: your fist at the end of your straight arm.',
    night: 'Go in pairs with a light; mind animals, water and edges. The home yard is always enough.',
    computed: 'For clear air: haze, cloud, hills and eyes can move a sighting by days.',
    basis: 'Stars tell the season, not the rain. Dawnpeg, engine {{engineVersion}}.',
  },
  /** Where the planet stands, seen from the star. */
  cardWay: {
    up: 'above',
    'up-right': 'up and to the right',
    right: 'to the right',
    'down-right': 'down and to the right',
    down: 'below',
    'down-left': 'down and to the left',
    left: 'to the left',
    'up-left': 'up and to the left',
  },
  cardMoon: {
    shape: {
      new: 'new',
      'waxing-crescent': 'a growing crescent',
      'first-quarter': 'half, growing',
      'waxing-gibbous': 'more than half, growing',
      full: 'full',
      'waning-gibbous': 'more than half, shrinking',
      'last-quarter': 'half, shrinking',
      'waning-crescent': 'a shrinking crescent',
    },
    light: {
      none: '',
      some: 'It makes the star a little harder to see.',
      strong: 'It makes the star much harder to see.',
    },
  },
} as const;
