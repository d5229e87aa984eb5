/** English words of data protection: what is kept and why, taking one's data along, leaving. */
export const texts = {
  title: 'What we keep and why',
  lead: 'Everything is kept on the machine that serves this page. Nobody follows you about: no trackers, nothing from elsewhere, nothing sold or handed on.',
  purpose: {
    account: {
      name: 'Account',
      what: 'Name, e-mail address and a hash of the password, so that each person is known as themselves.',
      until: 'Until the person leaves.',
    },
    membership: {
      name: 'Villages',
      what: 'Who belongs to which village and group, and in which role.',
      until: 'Until the membership ends.',
    },
    'signing-in': {
      name: 'Signing in',
      what: 'Where a person is signed in, codes and cards to come in with, addresses for the calendars of their telephones.',
      until:
        'Sessions for {{session}} days without use; codes, links and cards for {{endedWayIn}} days after their end; addresses until they are ended.',
    },
    letters: {
      name: 'Letters',
      what: 'Which letters were sent and how a person wants to be asked. Letters tell no content.',
      until: 'Letters for {{letter}} days; how a person wants to be asked until they leave.',
    },
    places: {
      name: 'Places',
      what: 'Where the village watches the sky, with its skyline and air.',
      until: 'As long as the village uses the product.',
    },
    knowledge: {
      name: 'Calendar and figures',
      what: 'What people gave, who gave it, and who may see it. It may tell what people believe.',
      until: 'Until it is taken back.',
    },
    review: {
      name: 'Review',
      what: 'What elders answered and signed.',
      until: 'As long as the version; with what was taken back it goes.',
    },
    voices: {
      name: 'Voices and pictures',
      what: 'Recordings with their spoken agreement, pictures, and written-out words.',
      until: 'Until they are taken back.',
    },
    agreement: {
      name: 'Agreements',
      what: 'What each giver agreed to, and who wrote it down.',
      until: 'As long as what it is about.',
    },
    records: {
      name: 'Records',
      what: 'Who did what and when, and who read what is kept; no content.',
      until: 'As long as the village uses the product.',
    },
    'taking-back': {
      name: 'Taking back',
      what: 'That something was taken back, when and by whom; nothing of what it was.',
      until: 'As long as the village uses the product: old copies of the tables could bring it back.',
    },
    'sending-again': {
      name: 'Sending again',
      what: 'That something was saved, so that it counts once where a device without a network sends it twice; nothing of what it was.',
      until: '{{writeKey}} days.',
    },
  },
  who: 'Who sees it: people of the village as far as the level of each thing allows. Whoever runs the machine can reach its tables, and no role of the product reaches past the levels.',
  hosting: 'The machine stands in: {{where}}.',
  hostingUnknown: 'Ask whoever runs it where the machine stands.',
  post: 'Letters go through the mail server that whoever runs it has set; it sees addresses and links.',
  noPost: 'No letters are sent.',

  own: 'Your data',
  ownLead: 'You can take along everything that is kept about you, and leave for good.',
  link: 'What we keep and why',
  download: 'Download what is kept about me',
  leave: 'Leave for good',
  leaveTitle: 'Leave every village for good?',
  leaveWhat:
    'Your name and address, letters and ways to sign in are erased. What you signed says “somebody who left”.',
  given: 'What you gave',
  gives: {
    stays: { name: 'It stays', note: 'Where your name was written into a text, take it off there first.' },
    goes: { name: 'It goes with me', note: 'Everything you gave is taken back for good, without a trace.' },
  },
  password: 'Your password',
  pin: 'The PIN of your card',
  tick: 'I know that this cannot be undone.',
  tickFirst: 'Tick the line above first.',
  yes: 'Yes, leave for good',
  somebodyWhoLeft: 'Somebody who left',
} as const;
