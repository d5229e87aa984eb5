/** English sentences of what changed between two versions. */
export const sentence = {
  added: 'New: {{window}}.',
  addedUndated: 'New; it has no date in {{year}}.',
  removed: 'Taken out. It was {{window}}.',
  removedUndated: 'Taken out. It had no date.',
  allMove: {
    later_one: 'All its days move <1>{{count}} day later</1>: {{window}}.',
    later_other: 'All its days move <1>{{count}} days later</1>: {{window}}.',
    earlier_one: 'All its days move <1>{{count}} day earlier</1>: {{window}}.',
    earlier_other: 'All its days move <1>{{count}} days earlier</1>: {{window}}.',
  },
  earliest: {
    later_one: 'The earliest day moves <1>{{count}} day later</1>, from {{before}} to <3>{{after}}</3>.',
    later_other: 'The earliest day moves <1>{{count}} days later</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_one: 'The earliest day moves <1>{{count}} day earlier</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_other:
      'The earliest day moves <1>{{count}} days earlier</1>, from {{before}} to <3>{{after}}</3>.',
  },
  bestFrom: {
    later_one: 'Best from moves <1>{{count}} day later</1>, from {{before}} to <3>{{after}}</3>.',
    later_other: 'Best from moves <1>{{count}} days later</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_one: 'Best from moves <1>{{count}} day earlier</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_other: 'Best from moves <1>{{count}} days earlier</1>, from {{before}} to <3>{{after}}</3>.',
  },
  bestTo: {
    later_one: 'Best to moves <1>{{count}} day later</1>, from {{before}} to <3>{{after}}</3>.',
    later_other: 'Best to moves <1>{{count}} days later</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_one: 'Best to moves <1>{{count}} day earlier</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_other: 'Best to moves <1>{{count}} days earlier</1>, from {{before}} to <3>{{after}}</3>.',
  },
  lastAdvised: {
    later_one: 'The last advised day moves <1>{{count}} day later</1>, from {{before}} to <3>{{after}}</3>.',
    later_other:
      'The last advised day moves <1>{{count}} days later</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_one:
      'The last advised day moves <1>{{count}} day earlier</1>, from {{before}} to <3>{{after}}</3>.',
    earlier_other:
      'The last advised day moves <1>{{count}} days earlier</1>, from {{before}} to <3>{{after}}</3>.',
  },
  otherDaysStay: 'The other days stay.',
  windowGone: 'It has no days any more; before, it was {{before}}.',
  windowCame: 'It has days now: <1>{{after}}</1>.',
  planMoves: {
    later_one:
      'While it waits for the work before it, its plan moves <1>{{count}} day later</1>: best from {{after}} instead of {{before}}.',
    later_other:
      'While it waits for the work before it, its plan moves <1>{{count}} days later</1>: best from {{after}} instead of {{before}}.',
    earlier_one:
      'While it waits for the work before it, its plan moves <1>{{count}} day earlier</1>: best from {{after}} instead of {{before}}.',
    earlier_other:
      'While it waits for the work before it, its plan moves <1>{{count}} days earlier</1>: best from {{after}} instead of {{before}}.',
  },
  otherCounting: 'Counted the other way it would be best from {{after}}; before, from {{before}}.',
  noDateMoves: 'No day moves.',
  lead: 'It goes by <1>{{after}}</1> now; before, by {{before}}.',
  markerMoved: {
    later_one: '{{marker}} is expected {{count}} day later, about {{after}} instead of {{before}}.',
    later_other: '{{marker}} is expected {{count}} days later, about {{after}} instead of {{before}}.',
    earlier_one: '{{marker}} is expected {{count}} day earlier, about {{after}} instead of {{before}}.',
    earlier_other: '{{marker}} is expected {{count}} days earlier, about {{after}} instead of {{before}}.',
  },
  rangeMoved: 'How sure {{marker}} is has changed. {{after}}; before: {{before}}.',
  lastDateNew: 'It has a last date now: <1>{{after}}</1>.',
  lastDateGone: 'It has no last date any more; before, it was {{before}}.',
  lastDateChanged: 'The last date is now <1>{{after}}</1>; before, it was {{before}}.',
  watchNew: 'It is a protective watch now.',
  watchGone: 'It is no protective watch any more.',
  title: 'Its name is now “{{after}}”; before, “{{before}}”.',
  titleVillage: {
    changed: 'Its name in the words of the village is now “{{after}}”; before, “{{before}}”.',
    added: 'It has a name in the words of the village: “{{after}}”.',
    removed: 'Its name in the words of the village, “{{before}}”, is taken out.',
  },
  kind: 'It counts as {{after}} now; before, as {{before}}.',
  icon: 'Its picture is now “{{after}}”; before, “{{before}}”.',
  crop: {
    changed: 'The crop is now “{{after}}”; before, “{{before}}”.',
    added: 'A crop is named: “{{after}}”.',
    removed: 'The crop, “{{before}}”, is taken out.',
  },
  notes: {
    changed: 'The notes now read “{{after}}”; before, “{{before}}”.',
    added: 'It has notes now: “{{after}}”.',
    removed: 'The notes, “{{before}}”, are taken out.',
  },
  caution: {
    changed: 'The caution now reads “{{after}}”; before, “{{before}}”.',
    added: 'It has a caution now: “{{after}}”.',
    removed: 'The caution, “{{before}}”, is taken out.',
  },
  otherSigns: {
    changed: 'The other signs are now “{{after}}”; before, “{{before}}”.',
    added: 'Other signs are named: “{{after}}”.',
    removed: 'The other signs, “{{before}}”, are taken out.',
  },
  record: {
    changed: 'Its record for elders and the field was changed: land, signs, people, trust or checks.',
    added: 'It has a record for elders and the field now.',
    removed: 'Its record for elders and the field is taken out.',
  },
  ifLate: {
    changed: 'What to do if it is late is now “{{after}}”; before, “{{before}}”.',
    added: 'It says what to do if it is late: “{{after}}”.',
    removed: 'What to do if it is late, “{{before}}”, is taken out.',
  },
  giver: {
    changed: 'The giver is now {{after}}; before, {{before}}.',
    added: 'Its giver is named: {{after}}.',
    removed: 'Its giver, {{before}}, is no longer named.',
  },
  agreedNew: 'Its giver was asked and agreed to print.',
  agreedGone: 'It is no longer agreed that it is printed.',
  level: 'Who may see it: {{after}} now; before, {{before}}.',
  warnings: 'What is to be looked at about its days has changed.',
  offsetsOnly: 'The days counted from the lead changed; the dates come out the same.',
  header: {
    order: 'The order of the entries changed.',
    weatherContact: 'The contact of the weather service is now “{{after}}”; before, “{{before}}”.',
    agricultureContact: 'The contact of the agricultural office is now “{{after}}”; before, “{{before}}”.',
    communityName: 'The village is now called {{after}}; before, {{before}}.',
    languages: 'The languages of the calendar changed.',
    place: {
      name: 'The place is now called {{after}}; before, {{before}}.',
      skyline: 'The skyline of the place changed.',
      clarityByMonth: 'How clear the air is by month changed.',
      thresholds: 'The eye-and-air rule of the place changed.',
      where: 'The coordinates, the elevation or the clock of the place changed.',
      skylineRule: 'How the skyline counts changed.',
      figures: 'A figure of the village that entries go by is described differently.',
    },
    engineVersion: 'The version of the reckoning is now {{after}}; before, {{before}}.',
    other: 'Something else that the version rests on changed.',
  },
} as const;
