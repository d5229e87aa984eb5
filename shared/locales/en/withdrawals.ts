/** English words of taking back: hiding for now, taking a name off, withdrawing for good. */
export const texts = {
  title: 'Take back or hide',
  type: {
    entry: 'An entry of the calendar',
    figure: 'A figure of the sky',
    story: 'The story of a figure',
    note: 'A note',
    attachment: 'A recording or a picture',
    variant: 'Another telling',
    sign: 'A sign of nature',
  },
  lead: 'What was given can always be taken back. No reason is asked for.',
  notYours: 'This is not yours to take back',
  notYoursHint:
    'Its giver, whoever comes after its giver, and the elders who may see it can. The officer or the steward does it for whoever asks them.',

  forWhom: 'On whose request',
  forWhomHint: 'The records say who asked and who did it, and nothing of what it was.',
  forMe: 'My own',

  hide: {
    title: 'Hide it for now',
    what: 'At once nobody sees it any more, neither here nor in versions that were published. It can be brought back as it was.',
    until:
      'For {{count}} days, you and others who may take it back can bring it back; after that only its giver can.',
    ask: 'Hide it',
    sure: 'Hide it for now?',
    yes: 'Yes, hide it',
    done: 'It is hidden. You can bring it back here, or from your own page.',
    since: 'It is hidden since {{when}}. Nobody sees it.',
    back: 'Bring it back',
    backDone: 'It is there again, as it was.',
    onlyGiver: 'The time to bring it back is over for others: only its giver can do it now.',
  },

  correct: {
    title: 'Correct it',
    what: 'Say what it should say instead. It is pinned to it as your note; whoever writes it changes the words, and you close the note when they are right.',
    words: 'What was written out from your voice is yours to put right, where the recording stands.',
    say: 'What it should say',
    ask: 'Ask for the correction',
    done: 'Your note is pinned. It stays open until you close it.',
  },

  sound: {
    title: 'Remove the recording, keep the words',
    what: 'The voice goes for good: every part of it and the spoken agreement. What was written out from it stays, for whom it was, with the names of who wrote it.',
    ask: 'Remove the recording',
    sure: 'Remove the recording and keep the words?',
    yes: 'Yes, remove the recording',
    done: 'The recording is gone. Its words stay.',
  },

  name: {
    title: 'Take the name off',
    what: 'The thing stays; the name of its giver is taken out of the draft, of every version and of what is printed from now on.',
    ask: 'Take the name off',
    sure: 'Take the name off for good?',
    yes: 'Yes, take the name off',
    done: 'The name is gone.',
  },

  gone: {
    title: 'Take it back for good',
    what: 'What will happen:',
    vanishes:
      'It is gone at once, for everybody: here, in old versions, in the records, with its recordings and pictures.',
    prints: 'What is printed or handed out from now on is without it.',
    walls:
      'A sheet that hangs on a wall cannot change: it must be taken down. Whoever prints is asked to do so, and is not told what it was.',
    devices: 'Telephones and computers forget it the next time they reach the village.',
    figure: 'Entries that go by this figure stay; from then on they go by its brightest star.',
    backups:
      'Where an older copy of the tables is put back, it is taken out again before anybody reads: it does not come back.',
    trace: 'What older versions say',
    traces: {
      yes: {
        name: '“One entry was withdrawn”',
        note: 'Others see that something was there, and nothing of it.',
      },
      no: { name: 'Nothing', note: 'Others do not learn that anything was there.' },
    },
    ask: 'Take it back',
    sure: 'Take it back for good?',
    cannot: 'This cannot be undone, by anybody.',
    tick: 'I know that it will be gone for good.',
    tickFirst: 'tick the line above first',
    yes: 'Yes, take it back for good',
    doneTitle: 'It was taken back',
    done: 'It is gone. Nothing of it is kept.',
    doneWalls: 'If a printed sheet still hangs with it, Today asks for it to be taken down.',
    toToday: 'To Today',
  },

  hidden: {
    title: 'Hidden for now',
    lead: 'You can bring these back. Nobody else sees them.',
    line: '{{type}}, hidden {{when}}',
    unseen: 'Kept by its people',
    others: 'Others than its giver can bring it back until {{day}}.',
  },

  sheets: {
    title: 'A sheet to take down',
    lead: 'A sheet on the wall holds something that was taken back. Take it down and print it anew.',
    line: '{{place}} {{year}}, version {{number}}',
    since: 'Taken back {{when}}',
    print: 'Print anew',
    down: 'The old sheet is down',
    sure: 'Is the old sheet down?',
    sureWhat: 'Say so once no old sheet hangs any more. The task then goes away for everybody.',
    yes: 'Yes, it is down',
    done: 'Thank you. The task is done.',
  },
} as const;
