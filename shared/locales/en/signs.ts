/** English texts for the village's signs of nature. Keys with _one and _other follow i18next's plural rules. */
export const texts = {
  title: 'Signs',

  in: {
    prepare: 'Prepare.',
    'signs-are-in': 'Signs are in: you decide.',
    needed_one: 'One of {{total}} is needed.',
    needed_other: '{{count}} of {{total}} are needed.',
    /** Read aloud in place of the marks. */
    forEars_one: 'One sign of {{total}} is in',
    forEars_other: '{{count}} signs of {{total}} are in',
    areIn: 'In: {{names}}.',
    notWithout: 'Not without: {{name}}.',
    ownWords: 'Cannot be marked as seen, so look for yourself: {{names}}.',
    see: 'I saw a sign of this entry',
    stop: 'Stop on {{day}} ({{source}}).',
  },

  board: {
    title: 'Signs of nature',
    areIn: 'Signs that are in',
    none: 'No sign was seen in the last sixty days.',
    seenOn: '{{name}}: {{day}}, {{who}}',
    see: 'I saw a sign',
    all: 'All signs of the village',
  },

  see: {
    title: 'A sign was seen',
    which: 'Which sign',
    day: 'On which day',
    who: 'Who saw it',
    whoHint: 'A name, or a house: as people say it here.',
    save: 'Mark as seen',
    saved: 'Marked as seen: {{name}}.',
    takeBack: 'Take back',
    takeBackAbout: 'Take back that {{name}} was seen on {{day}}',
    takenBack: 'Taken back.',
  },

  list: {
    lead: 'What people here look for. Entries of a calendar refer to these, and everybody may say when one was seen.',
    none: 'No sign is in the list yet',
    noneHint:
      'A sign is described once: a bird, a plant, wet soil, a wind. Many entries can then wait for it.',
    add: 'Add a sign',
    seen: 'Mark as seen',
    seenAbout: 'Mark {{name}} as seen',
    notSeen: 'Not seen in the last months.',
    lastSeen: 'Seen:',
    usual: 'usually {{from}} to {{to}}',
    change: 'Change',
    changeAbout: 'Change {{name}}',
    takeOut: 'Take out of the list',
    takeOutSure: 'Take {{name}} out of the list?',
    takeOutWhat: 'Versions that name it keep it. It can be put back.',
    takeOutYes: 'Take it out',
    takenOut: '{{name}} is out of the list.',
  },

  form: {
    new: 'A new sign',
    change: 'Change the sign',
    drafts: 'Drafts that wait for it say the new words, too. Versions keep the old ones.',
    level: 'Who may see this sign',
    levelHint: 'Entries that more people see cannot wait for it.',
    save: 'Save the sign',
    saved: 'The sign is saved.',
    stale:
      'Somebody saved this sign meanwhile. What stands there now is: {{name}}. Save once more to write over it.',
  },

  entry: {
    fromList: 'From the village’s list',
    choose: 'Choose from the village’s list',
    chooseNone: 'choose a sign',
    toList: 'Put on the village’s list',
    toListHint: 'Then other entries can wait for it, too.',
    onList: '{{name}} is on the village’s list.',
  },
} as const;
