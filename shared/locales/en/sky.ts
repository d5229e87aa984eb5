/** English words of the sky: phenomena, night states, outcomes, clarity, compass. Plain name first, then the trade's term. */
export const texts = {
  phenomenon: {
    'heliacal-rising': 'first morning seen',
    'cosmical-setting': 'first morning setting',
    'acronychal-rising': 'last evening rising',
    'heliacal-setting': 'last evening seen',
  },
  phenomenonTitle: {
    'heliacal-rising': 'First morning seen',
    'cosmical-setting': 'First morning setting',
    'acronychal-rising': 'Last evening rising',
    'heliacal-setting': 'Last evening seen',
  },
  trade: {
    'heliacal-rising': 'The trade says heliacal rising.',
    'cosmical-setting': 'The trade says cosmical setting.',
    'acronychal-rising': 'The trade says acronychal rising.',
    'heliacal-setting': 'The trade says heliacal setting.',
  },
  night: {
    hidden: 'Hidden: not seen at all',
    'before-dawn': 'Seen before dawn',
    'all-night': 'Seen all night',
    'rises-and-sets-in-night': 'Rises and sets in the night',
    'after-dusk': 'Seen after dusk',
    'dusk-and-dawn': 'After dusk and again before dawn',
  },
  dusk: 'dusk',
  dawn: 'dawn',
  howToReadStrip: 'How to read a strip',
  nightRunsDown: 'The night runs down the strip: dusk on top, dawn at the foot.',
  clarity: { clear: 'mostly clear', ordinary: 'ordinary', hazy: 'hazy' },
  window: {
    best: 'best days',
    margin: 'early or late, still possible',
    watch: 'watch',
    fixed: 'a fixed date',
  },
  /** Signs beyond a star's first and last days: how each is called. */
  sign: {
    culmination: {
      dusk: '{{star}} highest at dusk, the Sun {{depth}}° down',
      dawn: '{{star}} highest at dawn, the Sun {{depth}}° down',
    },
    'star-altitude': {
      east: {
        'after-sunset_one': '{{star}} {{altitude}}° up in the east, {{count}} minute after sunset',
        'after-sunset_other': '{{star}} {{altitude}}° up in the east, {{count}} minutes after sunset',
        'before-sunrise_one': '{{star}} {{altitude}}° up in the east, {{count}} minute before sunrise',
        'before-sunrise_other': '{{star}} {{altitude}}° up in the east, {{count}} minutes before sunrise',
        'solar-hour': '{{star}} {{altitude}}° up in the east at {{hour}} by the Sun',
      },
      west: {
        'after-sunset_one': '{{star}} {{altitude}}° up in the west, {{count}} minute after sunset',
        'after-sunset_other': '{{star}} {{altitude}}° up in the west, {{count}} minutes after sunset',
        'before-sunrise_one': '{{star}} {{altitude}}° up in the west, {{count}} minute before sunrise',
        'before-sunrise_other': '{{star}} {{altitude}}° up in the west, {{count}} minutes before sunrise',
        'solar-hour': '{{star}} {{altitude}}° up in the west at {{hour}} by the Sun',
      },
    },
    'due-meridian': {
      south: '{{star}} due south at {{hour}} by the Sun',
      north: '{{star}} due north at {{hour}} by the Sun',
    },
    'about-pole': {
      lowest: '{{star}} straight below the pole at {{hour}} by the Sun',
      highest: '{{star}} straight above the pole at {{hour}} by the Sun',
      left: '{{star}} left of the pole at {{hour}} by the Sun',
      right: '{{star}} right of the pole at {{hour}} by the Sun',
    },
    'sun-season': {
      'march-equinox': 'March equinox, day and night alike',
      'june-solstice': 'June solstice, the Sun turns back',
      'september-equinox': 'September equinox, day and night alike',
      'december-solstice': 'December solstice, the Sun turns back',
    },
    'sun-azimuth': {
      sunrise: { named: 'Sunrise over {{point}}', plain: 'Sunrise in the {{compass}}, at {{azimuth}}°' },
      sunset: { named: 'Sunset over {{point}}', plain: 'Sunset in the {{compass}}, at {{azimuth}}°' },
    },
    'noon-sun': {
      back: { named: 'Noon Sun back over {{ridge}}', plain: 'Noon Sun back over the skyline' },
      gone: { named: 'Noon Sun last seen over {{ridge}}', plain: 'Noon Sun last seen over the skyline' },
    },
    'moon-phase': {
      new: 'New Moon',
      'first-crescent': 'First crescent of the Moon',
      full: 'Full Moon',
    },
    'moon-counted': {
      new: 'New Moon number {{number}} from {{star}}, {{phenomenon}}',
      'first-crescent': 'First crescent number {{number}} from {{star}}, {{phenomenon}}',
      full: 'Full Moon number {{number}} from {{star}}, {{phenomenon}}',
    },
    'venus-appearance': {
      'morning-first': 'Venus, first morning seen',
      'morning-last': 'Venus, last morning seen',
      'evening-first': 'Venus, first evening seen',
      'evening-last': 'Venus, last evening seen',
    },
    'zenith-sun': 'Sun overhead at noon, no shadow',
    'dark-night': {
      last: {
        6: 'Last star night',
        12: 'Last night with all but the faintest stars',
        15: 'Last night with the Milky Way overhead',
        18: 'Last night without any twilight',
      },
      first: {
        6: 'First star night',
        12: 'First night with all but the faintest stars',
        15: 'First night with the Milky Way overhead',
        18: 'First night without any twilight',
      },
    },
  },
  /** Why such a sign has no day; a whole sentence. */
  noSign: {
    'not-in-this-year': 'It does not fall in this year.',
    'star-below-skyline': 'The star stays below the skyline at that moment.',
    'star-passes-other-side': 'The star is highest on the other side of the sky here.',
    'altitude-not-reached': 'The star never passes that height at that hour here.',
    'too-light': 'The sky is too light at that moment.',
    'azimuth-not-reached': 'The Sun never comes to that point of the skyline here.',
    'noon-sun-always-clears': 'The noon Sun clears the skyline all year here.',
    'noon-sun-never-clears': 'The noon Sun never clears the skyline here.',
    'sun-never-overhead': 'The Sun never stands overhead here.',
    'nights-always-dark': 'The nights are never lighter than that here.',
    'nights-never-dark': 'The nights never get so dark here.',
    'crescent-not-seen': 'The young Moon is never seen here in this year: too low, or behind the skyline.',
    'star-gives-no-sign': 'The star has no such day here, so no Moon can be counted from it.',
  },
  /** Why the range of such a sign is as wide as it is. */
  signRange: {
    'eye-direction':
      'The eye judges a direction to two or three degrees, a day for each; haze does not move it.',
    'eye-height': 'The eye judges a height to two or three degrees; haze does not move it.',
    'sun-on-skyline':
      'The day is computed to the hour; watched on the skyline, the Sun stands still for about ten days at a solstice.',
    'sun-width': 'Air near the horizon, and where you stand, move the Sun by its own width.',
    'noon-sun-edge': 'Air, snow and trees on the ridge move the Sun’s edge by half its width.',
    shaft:
      'A plumb line tells the overhead Sun to a tenth of a degree; near the tropics that is about five days.',
    'moon-days':
      'New and full Moon are computed to the minute; a first crescent shows an evening earlier or later.',
    'moon-count': 'The star’s own range may take in another Moon.',
    'venus-depth': 'Haze and eyes move the day on which Venus comes out of the Sun’s light or goes into it.',
    'air-depth': 'Clear or hazy air makes a night darker or lighter, as one degree of the Sun’s depth does.',
  },
  /** What a date of such a sign belongs to; stands before the date. */
  signTimeTitle: {
    morning: 'On the morning',
    noon: 'At noon',
    evening: 'On the evening',
    night: 'In the night',
    day: 'The day',
  },
  compass: {
    n: 'north',
    nne: 'north-north-east',
    ne: 'north-east',
    ene: 'east-north-east',
    e: 'east',
    ese: 'east-south-east',
    se: 'south-east',
    sse: 'south-south-east',
    s: 'south',
    ssw: 'south-south-west',
    sw: 'south-west',
    wsw: 'west-south-west',
    w: 'west',
    wnw: 'west-north-west',
    nw: 'north-west',
    nnw: 'north-north-west',
  },
} as const;
