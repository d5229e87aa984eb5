/** English texts that say why a day moved. Keys with _one and _other follow plural rules. */
export const texts = {
  title: 'Why:',
  only: 'Why: {{cause}}.',
  cause: {
    year: 'the year',
    place: 'the place lies elsewhere, higher or lower, or goes by another clock',
    skyline: 'the skyline',
    threshold: 'the eye-and-air rule, or how clear the air is',
    figure: 'the figure is described differently',
    engine: 'another version of the reckoning',
    lead: 'it goes by something else, changed by hand',
    seen: 'the day on which the sign was seen',
    anchor: 'the other work from which it is counted',
    offsets: 'the days from the lead, changed by hand',
    'last-date': 'the last date or the watch, changed by hand',
  },
  line: {
    later_one: '{{count}} day later: {{cause}}',
    later_other: '{{count}} days later: {{cause}}',
    earlier_one: '{{count}} day earlier: {{cause}}',
    earlier_other: '{{count}} days earlier: {{cause}}',
    whole: 'This alone gives it days or takes them away: {{cause}}',
  },
  together: {
    later_one: '{{count}} day later: several of these acting together',
    later_other: '{{count}} days later: several of these acting together',
    earlier_one: '{{count}} day earlier: several of these acting together',
    earlier_other: '{{count}} days earlier: several of these acting together',
    only: 'Several changes acting together; none of them does it alone.',
  },
  /** Of the day that moved most. */
  point: {
    earliest: 'Why the earliest day moved:',
    bestFrom: 'Why best from moved:',
    bestTo: 'Why best to moved:',
    lastAdvised: 'Why the last advised day moved:',
  },
} as const;
