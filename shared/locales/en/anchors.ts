/** English texts for what an entry's days are counted from, beside stars, signs and fixed dates. */
export const texts = {
  another: 'other work',
  countedFrom: 'Counted from',
  'as-seen': {
    name: 'A star as seen this year',
    note: 'The computed day, until people have seen it.',
  },
  nature: { name: 'A sign of nature', note: 'What grows, flies or blows, on its usual days.' },
  'entry-planned': {
    name: 'A planned day of other work',
    note: 'For instance ten days after sowing is planned.',
  },
  'entry-actual': { name: 'The day other work is done', note: 'Counted once that day is known.' },
  day: {
    earliest: 'its earliest day',
    bestFrom: 'its first best day',
    bestTo: 'its last best day',
    lastAdvised: 'its last advised day',
  },
  lead: {
    nature: 'Goes by a sign of nature: {{name}}, usually {{from}} to {{to}}',
    planned: 'Goes by “{{title}}”: {{day}}, as planned',
    actual: 'Goes by “{{title}}”: the day on which it is done',
    seen: 'Goes by {{marker}}: {{phenomenon}}, as seen this year',
    signSeen: 'Goes by {{sign}}, as seen this year',
    moonSeen: 'Goes by {{sign}}, number {{nth}} of the year, as seen this year',
  },
  leadAlone: {
    nature: '{{name}}, usually {{from}} to {{to}}',
    planned: '“{{title}}”: {{day}}, as planned',
    actual: '“{{title}}”: the day on which it is done',
    seen: '{{marker}}: {{phenomenon}}, as seen this year',
    signSeen: '{{sign}}, as seen this year',
    moonSeen: '{{sign}}, number {{nth}} of the year, as seen this year',
  },
  /** `beside` says the other counting, too. */
  counted: {
    seen: {
      known: 'Counted from {{days}}, when it was seen.',
      none: 'Counted from the day on which it was seen.',
      beside:
        'Counted from {{days}}, when it was seen. By the computed day the best days would be {{other}}.',
    },
    usual: {
      known: 'Counted from its usual days, {{days}}: early days from the first, late days from the last.',
      none: 'Counted from its usual days.',
    },
    planned: {
      known: 'Counted from {{days}}, as planned.',
      none: 'The work before it has no planned day this year.',
    },
    actual: {
      known: 'Counted from {{days}}, when it was done.',
      none: 'Counted from the day on which it was done.',
      beside: 'Counted from {{days}}, when it was done. As planned, the best days would have been {{other}}.',
    },
    waiting: {
      known: 'Counted once the day is known.',
      none: 'Counted once the day is known.',
      beside: 'Counted once the day is known. If all goes as planned, the best days are {{other}}.',
    },
    gone: {
      known: 'The work that it is counted from is not here any more.',
      none: 'The work that it is counted from is not here any more.',
    },
  },
  form: {
    chooseFirst: 'Its days are counted once a work is chosen that does not wait for this one.',
    asSeen: 'Counted from the day on which people see it',
    asSeenHint: 'Until then the computed day stands. Both countings are shown.',
    seen: 'It was seen this year',
    seenOn: 'On which morning or evening',
    seenBy: 'Who saw it',
    agreedBy: 'Which elder says so, too',
    farFromComputed_one:
      'This is {{count}} day from the computed day. Look once more at the day, and at what was seen.',
    farFromComputed_other:
      'This is {{count}} days from the computed day. Look once more at the day, and at what was seen.',
    natureName: 'As people call it',
    usualFrom: 'Usually from',
    usualTo: 'Usually to',
    natureSource: 'Who says that these are its days',
    entry: 'Which work',
    chooseEntry: 'choose one',
    noEntries: 'Save another entry first; then this one can be counted from it.',
    whichDay: 'From which of its days',
    circle: 'These wait for each other in a circle: {{chain}}.',
    link: ' → ',
  },
  actual: {
    title: 'When it was really done',
    nothing: 'Not written down yet.',
    said: 'Done {{days}}. {{saidBy}} said so; typed by {{typedBy}}, {{when}}.',
    saidPlots: 'Done {{days}}, {{plots}}. {{saidBy}} said so; typed by {{typedBy}}, {{when}}.',
    write: 'Write down the day',
    change: 'Change the day',
    from: 'First day',
    to: 'Last day, where it took several',
    saidBy: 'Who said so',
    plots: 'Whose or which plots, where not all at once',
    save: 'Keep this day',
    remove: 'Take the day back',
    saved: 'The day is written down. What is counted from it has its days now.',
    removed: 'The day is taken back. What is counted from it waits again.',
  },
} as const;
