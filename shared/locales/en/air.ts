/** English words of the second opinion: the model of visibility beside the published rules. */
export const texts = {
  title: '{{star}} in clear and in hazy air',
  titlePlain: 'In clear and in hazy air',
  under: '{{place}}, {{year}}',
  trouble: 'The days in other air could not be fetched',
  noPlace: 'There is no place yet from which somebody watches.',

  lead: 'The days of this village come from a rule of eyes and air. Here is a second opinion: a model of daylight, air and eyesight that looks at every minute of a morning or an evening.',
  disagree:
    'Published rules and models disagree by several days, most of all for faint stars and hazy air. None of them knows your sky: the village’s rule stays, its range tells how far to trust it, and what people here really see counts more than either.',

  outcome: {
    'never-sets': 'It never sets here, so it has no first morning and no last evening in any air.',
    'never-rises': 'It never rises here.',
    'below-skyline': 'It rises, but never above the skyline of this place.',
  },

  rule: 'By the village’s rule',
  ruleAir: {
    clear: 'The air of that month is mostly clear here: that is in it.',
    ordinary: '',
    hazy: 'The air of that month is usually hazy here: that is in it.',
  },
  width: {
    scatter:
      'The range allows for {{half}}° of the Sun’s depth to either side, as far as published sightings scatter. For clearer and hazier air and for other eyes the model would ask for {{model}}° here in that month.',
    model:
      'The range allows for {{half}}° of the Sun’s depth to either side: so much the model asks for here in that month, for clearer and hazier air and for other eyes. Published sightings scatter by {{scatter}}°.',
  },
  noRule: {
    'none-in-this-year': 'The village’s rule has no such day in {{year}}.',
    'never-dark-enough':
      'By the village’s rule the night never gets dark enough for it at that time of year.',
    dated: '',
  },
  modelIn: 'By the model, {{air}}',
  air: { clear: 'clear air', ordinary: 'ordinary air', hazy: 'hazy air' },
  lane: { clear: 'clear', ordinary: 'ordinary', hazy: 'hazy' },
  modelDay: {
    dawn_one: 'morning of {{day}}, {{count}} minute',
    dawn_other: 'morning of {{day}}, {{count}} minutes',
    dusk_one: 'evening of {{day}}, {{count}} minute',
    dusk_other: 'evening of {{day}}, {{count}} minutes',
  },
  modelDayPlain: { dawn: 'morning of {{day}}', dusk: 'evening of {{day}}' },
  noModelDay: 'not seen at that time of year',
  ruleDay: { dawn: 'Morning of {{about}}', dusk: 'Evening of {{about}}' },
  spreadNone: 'From clear to hazy air the day stays the same.',
  spread_one: 'From clear to hazy air the day moves by {{count}} day.',
  spread_other: 'From clear to hazy air the day moves by {{count}} days.',
  within: {
    inside: 'In all three airs the model falls within the rule’s range.',
    partly: 'In some air the model falls outside the rule’s range.',
    outside:
      'In every air the model falls outside the rule’s range: do not trust either alone, and begin to watch early.',
  },
  atSkyline:
    'Here the question is whether the star is seen right at the skyline as it rises or sets, so minutes say nothing.',
  again: 'And again',

  minutes: 'Minutes in which it shows',
  minutesRead:
    'Each column is a day; the higher it stands, the longer the star shows, up to an hour. The bracket on top is the village’s range, its point the expected day.',
  minutesLabel: {
    dawn: 'Minutes in which {{star}} shows in the mornings from {{range}}. {{airs}} {{rule}}',
    dusk: 'Minutes in which {{star}} shows in the evenings from {{range}}. {{airs}} {{rule}}',
  },
  laneSeen: {
    dawn: 'In {{air}} from {{day}}.',
    dusk: 'In {{air}} until {{day}}.',
  },
  laneUnseen: 'In {{air}} not at all.',
  laneRule: 'The village’s day is {{about}}.',
  laneNoRule: 'The village’s rule has no day.',
  minutesCaption: 'Minutes in which {{star}} shows, day by day',
  day: 'Day',
  underMoon: 'with that night’s Moon',
  moonNote:
    'The first three columns leave the Moon out. The last one has the Moon of that night, in the air that is usual here in that month.',

  sets: 'By every published rule',
  setsNote: 'With the place’s shifts, skyline and clarity. The village uses the one that is marked.',
  setInUse: 'in use here',
  set: {
    'three-class': 'three-class rule',
    'linear-magnitude': 'line by magnitude',
    'azimuth-difference': 'rule by the angle between star and Sun',
  },
  noSetDay: 'no such day',

  basis: 'What the model rests on',
  basisAir:
    'Overhead the air of this place takes {{clear}} magnitudes of a star’s light when it is clear, {{ordinary}} when ordinary and {{hazy}} when hazy, in the mean of the year: from its height, its latitude, the season and the humidity. High up, haze makes little difference.',
  basisEyes:
    'Eyes of ordinary sharpness that know where to look; a moonless sky without cloud and without lamps; the skyline of the place. The shifts of the place are not in it.',
  basisSource:
    'Air and sky after Schaefer 1993 and Rozenberg 1966, the eye after Hecht 1947 and Knoll 1946, the Moon after Krisciunas and Schaefer 1991. The variants in print differ by up to a magnitude.',
  basisOpposite:
    'For last risings and first settings the model takes from the rule how high a star stands when its rising counts as seen.',
  basisFigure:
    'Of a figure the model sees the brightest star alone; the light of the others may show it some days sooner.',
  basisEngine: 'Computed by engine {{version}}; the village’s rule: {{source}}.',
} as const;
