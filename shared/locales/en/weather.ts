/** English texts for notices of the weather service and the rain record. */
export const texts = {
  notice: {
    of: 'Notice of {{issuer}}',
    dates: 'Issued on {{issued}}, holds until {{expires}}.',
    first: 'It stands above all work: where it says otherwise, go by the notice.',
    takeDown: 'Take it down',
    takeDownSure: 'Take this notice down?',
    takeDownWhat: 'It is gone for everybody at once. Do this when the office has taken it back.',
    takeDownYes: 'Take it down',
    takenDown: 'The notice is down.',
  },

  board: {
    title: 'Weather and rain',
    writeNotice: 'Write down a notice',
    writeRain: 'Write down rain',
    rain: 'Rain of the last days',
    noRain: 'No rain is written down for the last sixty days.',
    all: 'All of the last sixty days',
  },

  rain: {
    mm: '{{day}}: {{mm}} mm',
    words: '{{day}}: {{words}}',
    both: '{{day}}: {{mm}} mm, {{words}}',
    by: 'written down by {{name}}',
    takeOut: 'Take out',
    takeOutAbout: 'Take out the rain of {{day}}',
    takenOut: 'Taken out.',
  },

  form: {
    noticeTitle: 'A notice of the weather service',
    text: 'What it says',
    textHint: 'In the words of the office, as short as it is.',
    issuer: 'Who issued it',
    issuedOn: 'Issued on',
    expiresOn: 'Holds until',
    expiresHint: 'After this day it is shown no more.',
    saveNotice: 'Show the notice',
    noticeSaved: 'The notice stands above the work now.',
    rainTitle: 'Rain of a day',
    day: 'On which day',
    mm: 'Millimetres, where it was measured',
    rainWords: 'In words',
    rainWordsHint: 'For instance: a short shower; wet to a hand depth.',
    saveRain: 'Keep it',
    rainSaved: 'The rain is written down.',
  },
} as const;
