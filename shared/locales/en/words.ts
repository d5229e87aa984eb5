/** English texts for what a village calls kinds of events, kinds of work, and crops. */
export const texts = {
  title: 'Words of this village',
  lead: 'What the village calls things. Drafts follow at once; versions keep the words of the day on which they were frozen.',
  asks: {
    kinds: 'For a new word alone elders are not asked again: the kind and its rules stay.',
    operations: 'For a new word alone elders are not asked again: the work and its rules stay.',
    crops:
      'Where a crop is called otherwise, elders are asked again about the entries that follow: nothing but its name says what is grown.',
  },
  everybody: 'Everybody of the village reads these words. A name that is to be kept does not belong here.',
  readOnly: 'The officer of the village changes these words.',
  list: {
    label: 'Which words',
    kinds: 'Kinds of events',
    operations: 'Kinds of work',
    crops: 'Crops',
  },
  about: {
    kinds:
      'A kind keeps its rules whatever it is called: what belief keeps to the elders, what farm work and safety must say.',
    operations: 'Sowing, harvest, fire and the like keep their rules whatever they are called.',
    crops:
      'Crops are offered where an entry is written, with their days from sowing to harvest. An entry keeps the days that were written in it.',
  },
  row: {
    usual: 'usually “{{name}}”',
    like: 'behaves like “{{name}}”',
    own: 'the village’s own',
    hidden: 'not offered',
    days: '{{from}} to {{to}} days',
    daysFrom_one: 'at least {{count}} day',
    daysFrom_other: 'at least {{count}} days',
    daysTo_one: 'at most {{count}} day',
    daysTo_other: 'at most {{count}} days',
  },
  change: 'Change',
  changeAbout: 'Change “{{name}}”',
  up: 'Move “{{name}}” up',
  down: 'Move “{{name}}” down',
  moved: '“{{name}}” is number {{place}} of {{count}} now.',
  saved: 'Saved.',
  add: 'Add a word',
  addCrop: 'Add a crop',
  none: 'No crops yet',
  noneHint: 'Add those that are grown here, with their days from sowing to harvest.',
  stale:
    'Somebody else changed this list meanwhile. It is shown as it is now; what you wrote is still here. Save again.',
  form: {
    new: 'A word of the village’s own',
    newCrop: 'A crop that is grown here',
    rename: 'What the village calls it',
    word: 'Word',
    wordHint: 'Leave it empty to go back to “{{name}}”.',
    like: 'It behaves like',
    renames: {
      kinds:
        'Once this is saved, every entry of a draft that is called “{{before}}” is called “{{now}}”. Versions keep “{{before}}”.',
      operations:
        'Once this is saved, every entry of a draft that says “{{before}}” for its work says “{{now}}”. Versions keep “{{before}}”.',
      crops:
        'Once this is saved, every entry of a draft whose crop is just “{{before}}” says “{{now}}”. Where more is written there, it stays as it is. Versions keep “{{before}}”.',
    },
    asks: {
      kinds: 'Elders are not asked again for that: what they said to these entries stands.',
      operations: 'Elders are not asked again for that: what they said to these entries stands.',
      crops: 'With the next submission elders are asked again about these entries.',
    },
    likeHint: 'Its rules are that one’s for good. What belongs to belief begins with the elders.',
    fromDays: 'Days from sowing to harvest, at least',
    toDays: 'At most',
    offered: 'It is offered for new entries',
    offeredHint: 'Entries that use it keep it all the same.',
    save: 'Save',
  },
  entry: {
    link: 'Words of this village',
    useDays: 'Take {{days}} from the list of crops',
  },
} as const;
