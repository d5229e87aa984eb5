/** English texts of what an entry warns of, and of the ways out. */
export const warning = {
  title: 'Look at this',
  stillSaves: 'You can save the draft all the same.',
  'no-lead-yet': 'It goes by nothing yet, so it has no days. Choose that before elders are asked about it.',
  'no-date-this-year': '{{marker}} has no {{phenomenon}} in {{year}}, so this entry has no days.',
  'star-does-not-serve': '{{marker}} has no first or last days here, so no days can be counted from it.',
  'sign-not-here': '{{sign}}: this never happens here, so no days can be counted from it. {{reason}}',
  'one-occurrence-only': '{{marker}}: {{phenomenon}} happens only once in {{year}}.',
  'weak-marker':
    'The day of {{marker}} may vary by more than three weeks. Let other signs decide, or choose a sharper star.',
  'never-disappears':
    '{{marker}} is never hidden here, so people cannot notice that it comes back. Other signs should lead.',
  'lost-in-light-nights':
    '{{marker}} is lost in the light nights of summer, not behind the Sun; its return only says that nights are dark again.',
  'window-closed-by-last-date':
    'The last date, {{day}}, comes before the best days begin. Nothing is left of the window.',
  'window-shortened-by-last-date':
    'The last date, {{day}}, ends the window earlier than the days counted from the lead.',
  'belief-not-agreed-to-print': 'An entry of belief is printed only after its giver was asked and agreed.',
  'windows-overlap':
    'Its best days and those of {{others}} lie within each other, and both are farm work on the same crop.',
  'waits-for-actual-day':
    'It is counted once the work before it is done. Write that day down at the other entry when it is known.',
  'anchor-without-days': 'The work that it is counted from has no days this year.',
  'anchor-gone':
    'The work that it is counted from is not in the draft any more, or fewer people may see it than this entry.',
  sign: {
    'no-date-this-year': '{{sign}}: not in {{year}}, so this entry has no days.',
    'one-occurrence-only': '{{sign}}: {{year}} has fewer of them than this entry counts.',
  },
  way: {
    otherStar: 'Choose another star',
    otherSign: 'Choose another sign',
    otherDay: 'Go by its {{phenomenon}}',
    useFirst: 'Go by the first one',
    changeDays: 'Change the days',
    changeLastDate: 'Change the last date',
    writeSigns: 'Write other signs',
    fixedDate: 'Go by a fixed date',
    byPlanned: 'Go by its planned day',
    otherPeople: 'Say who else does it',
    writeCaution: 'Write the caution',
    seeDrift: 'See how it moved',
  },
} as const;
