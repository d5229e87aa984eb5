import { texts as files } from './files.js';

/** English texts of tables to be filled in: titles of columns, lines that show how, and words by which a table may say things. */
export const texts = {
  words: {
    /** Twelve months; each may be called by any of its names, which a line parts. */
    months:
      'January, Jan | February, Feb | March, Mar | April, Apr | May | June, Jun | July, Jul | August, Aug | September, Sept, Sep | October, Oct | November, Nov | December, Dec',
    phenomena: {
      'heliacal-rising': 'first morning seen, first morning, first dawn, heliacal rising',
      'cosmical-setting': 'first morning setting, first dawn setting, cosmical setting',
      'acronychal-rising': 'last evening rising, last dusk rising, acronychal rising',
      'heliacal-setting': 'last evening seen, last evening, last dusk, heliacal setting',
    },
    fixedDate: 'fixed date, fixed day, on',
    /** Other ways to write a day, and the three parts of ten days of a month. */
    days: {
      day: '{{day}} of {{month}} | {{day}} of {{month}} {{year}} | {{day}}st {{month}} | {{day}}nd {{month}} | {{day}}rd {{month}} | {{day}}th {{month}} | {{day}}st of {{month}} | {{day}}nd of {{month}} | {{day}}rd of {{month}} | {{day}}th of {{month}} | {{month}} {{day}}st | {{month}} {{day}}nd | {{month}} {{day}}rd | {{month}} {{day}}th',
      tenDays: {
        first:
          'early {{month}} | first ten days of {{month}} | 1st ten days of {{month}} | first dekad of {{month}} | 1st dekad of {{month}} | dekad 1 of {{month}} | {{month}} dekad 1',
        second:
          'mid {{month}} | middle of {{month}} | second ten days of {{month}} | 2nd ten days of {{month}} | second dekad of {{month}} | 2nd dekad of {{month}} | dekad 2 of {{month}} | {{month}} dekad 2',
        third:
          'late {{month}} | last ten days of {{month}} | third ten days of {{month}} | 3rd ten days of {{month}} | third dekad of {{month}} | 3rd dekad of {{month}} | last dekad of {{month}} | dekad 3 of {{month}} | {{month}} dekad 3',
      },
    },
    /** Days before and after a sign. */
    offsets: {
      after: '{{count}} days after {{sign}} | {{count}} day after {{sign}}',
      before: '{{count}} days before {{sign}} | {{count}} day before {{sign}}',
    },
    figures: {
      pleiades: 'Cluster, Seven Sisters',
      hyades: 'Bull’s face',
      'orion-belt': 'Belt, Orion’s Belt, three in a row',
      'ursa-major-seven': 'Seven Stars, Plough, Big Dipper',
      'southern-cross': 'Cross, Southern Cross foot star',
    },
    /**
     * Other ways to name what a line goes by, beside the names that the product itself gives (`sky.ts`, `sign`). A line parts
     * them; what differs stands in double braces, by the names that the product's own texts use.
     */
    phrases: {
      'due-meridian': {
        south: '{{star}} due south at {{hour}} | {{star}} due south at {{hour}} local sun time',
        north: '{{star}} due north at {{hour}} | {{star}} due north at {{hour}} local sun time',
      },
      'about-pole': {
        lowest: '{{star}} straight below the pole at {{hour}} | {{star}} below the pole at {{hour}}',
        highest: '{{star}} straight above the pole at {{hour}} | {{star}} above the pole at {{hour}}',
      },
      'sun-season': {
        'march-equinox': 'March equinox',
        'june-solstice': 'June solstice',
        'september-equinox': 'September equinox',
        'december-solstice': 'December solstice',
      },
      season: {
        spring: 'spring equinox | vernal equinox',
        summer: 'summer solstice | midsummer | midsummer day',
        autumn: 'autumn equinox | fall equinox',
        winter: 'winter solstice | midwinter | midwinter day',
      },
      'noon-sun': {
        back: {
          named: 'Sun back over {{ridge}} at noon | Sun clears {{ridge}} at noon',
          plain: 'Sun back over the skyline at noon | Sun clears the skyline at noon',
        },
        gone: {
          named: 'Sun last over {{ridge}} at noon',
          plain: 'Sun last over the skyline at noon',
        },
      },
      'zenith-sun': 'Sun overhead | Sun overhead at noon | no shadow at noon',
      'dark-night': {
        last: {
          depth:
            'last night with the Sun {{depth}} degrees down | last star night (Sun no deeper than {{depth}} degrees)',
          6: 'last stars before the light nights',
          15: 'last night dark enough for the Milky Way',
        },
        first: {
          depth:
            'first night with the Sun {{depth}} degrees down | first star night (Sun no deeper than {{depth}} degrees)',
          6: 'first star after the light nights | first stars after the light nights',
          15: 'first night dark enough for the Milky Way',
        },
      },
      'moon-phase': {
        new: 'new Moon {{number}} | new Moon number {{number}} of the year',
        'first-crescent': 'first crescent {{number}} | first crescent number {{number}} of the year',
        full: 'full Moon {{number}} | full Moon number {{number}} of the year',
      },
      nature: 'sign of nature: {{name}} | nature: {{name}}',
      /** Days of another line or entry, by its title or number. */
      entry: {
        actual:
          'actual date of {{entry}} | actual day of {{entry}} | actual {{entry}} date | when {{entry}} was done | {{entry}}, done | {{entry}} was really done',
        earliest: 'earliest day of {{entry}} | {{entry}}, earliest day',
        bestFrom:
          'planned date of {{entry}} | planned day of {{entry}} | planned {{entry}} date | start of {{entry}} | first best day of {{entry}} | {{entry}}, first best day',
        bestTo: 'end of {{entry}} | last best day of {{entry}} | {{entry}}, last best day',
        lastAdvised: 'last advised day of {{entry}} | {{entry}}, last advised day',
      },
    },
    kinds: {
      farm: 'farm, field, farming',
      'herd-fish-gather': 'herd, fish, gather, herding, fishing, gathering',
      household: 'household, house',
      community: 'community, village',
      belief: 'belief, belief/ritual, ritual, rite',
      safety: 'safety, caution',
      'marker-only': 'marker only, sign, sign only',
    },
    yes: 'yes, y, true, 1, x',
    /** Other words for what entries say by choosing, beside those of the product itself (`record.ts`). */
    codes: {
      operations: {
        'clear-land': 'clear land, clearing',
        manure: 'manuring, dung',
        plough: 'plow, dig, ploughing, digging',
        'mend-walls': 'mend channels',
        'test-seed': 'seed check, choose seed',
        nursery: 'seedbed',
        sow: 'sowing',
        plant: 'planting',
        'gap-fill': 're-sow, fill gaps',
        thin: 'thinning',
        weed: 'weeding',
        'top-dress': 'top dressing',
        'earth-up': 'earthing up, earthing-up',
        water: 'watering, irrigate',
        guard: 'guarding',
        'pest-check': 'pest check',
        harvest: 'harvesting, reap',
        dry: 'drying',
        thresh: 'threshing',
        store: 'storing',
        'seed-back': 'seed back',
        graze: 'grazing',
        burn: 'burning',
        'move-herd': 'move herd',
        fish: 'fishing',
        gather: 'gathering',
        rest: 'rest, holy day',
        other: 'other',
      },
      repeats: { yearly: 'yes, each year', 'every-n-years': 'every n years', 'some-years': 'some years' },
      confidences: { strong: 'very sure', weak: 'unsure', 'being-tried': 'trying' },
      bases: { 'handed-down': 'tradition', recorded: 'records', trial: 'trial' },
      signTypes: {
        bird: 'bird, birds',
        plant: 'plant, plants, tree, trees',
        insect: 'insect, insects',
        animal: 'animal, animals',
        cloud: 'cloud',
        soil: 'earth',
        'star-look': 'stars, star',
        moon: 'moon',
      },
      stillSeen: { yes: 'yes', seldom: 'seldom', no: 'no' },
    },
    /** Who is said to set a day that a table gives without saying so. */
    source: 'as it stood in a table that was brought in',
  },
  /** Titles of columns: those of our own CSV, and one that no file of ours has. */
  column: { ...files.calendarCsv.column, when: 'sign or day' },
  /** What a table of ours says about itself. */
  file: { state: files.ics.state, byRole: files.sheet.byRole, caution: files.caution },
  /** Other titles that a column may stand under, which a line parts. */
  alias: {
    number: 'number | no | nr | id | line',
    titleVillage: 'village name | local name',
    titleOfficer: 'title | name | event | work',
    kind: 'type',
    icon: 'icon',
    crop: 'crop or variety | crop variety',
    when: 'anchor | sign | star | goes by (words)',
    earliest: 'earliest | window early | early',
    bestFrom: 'from | start | date',
    bestTo: 'to | until | end',
    lastAdvised: 'last | window late | late | latest',
    earliestDays: 'offset early days',
    bestFromDays: 'offset from days | days after | offset',
    bestToDays: 'offset to days',
    lastAdvisedDays: 'offset late days',
    leadSource: 'source of the day',
    usualFrom: 'usual days from',
    usualTo: 'usual days to',
    lastDate: 'deadline',
    lastDateSource: 'office',
    protectiveWatch: 'watch',
    otherSigns: 'signs',
    ifLate: 'if late 1',
    operation: 'operation | task',
    land: 'land | field | terrace | zone',
    readyDays: 'lead days | alert lead days | lag',
    graceDays: 'grace',
    repeats: 'repeats',
    signs: 'list of signs',
    mustHaveSign: 'must have sign | must-have',
    responsible: 'responsible | doer',
    helpers: 'helpers',
    decides: 'decides',
    owns: 'owns',
    inputs: 'inputs | seed rate',
    ifLaterStill: 'if late 2 | second step',
    stopDate: 'stop date | stop',
    askWhom: 'ask',
    confidence: 'confidence',
    confidenceBy: 'confidence by',
    basis: 'basis',
    heardWhere: 'heard at',
    heardDay: 'heard on',
    heardLanguage: 'language',
    caution: 'warning | safety',
    notes: 'note | remarks | work roles',
    giver: 'giver | told by | source alias | source',
  },
  template: {
    fileName: 'dawnpeg-table.csv',
    /** Lines that show how, by their columns; they are passed over where nobody changed them. */
    lines: {
      bySign: {
        number: '1',
        titleOfficer: 'Example: sow the first field',
        kind: 'farm',
        when: 'Pleiades, first morning',
        bestFromDays: '7',
        bestToDays: '23',
        otherSigns: 'Soil wet to a hand depth',
        ifLate: 'Sow the short kind',
        operation: 'sow',
        readyDays: '10',
        graceDays: '5',
        repeats: 'every year',
        signs:
          'bird | weaver birds | nests half done | by the river | 20 May | 5 June\nsoil | wet soil | wet to a hand depth',
        signsNeeded: '1',
        mustHaveSign: '2',
        responsible: 'each household',
        confidence: 'sure',
        basis: 'handed down',
      },
      byWork: {
        number: '2',
        titleOfficer: 'Example: weed it',
        kind: 'farm',
        when: 'actual date of 1',
        bestFromDays: '19',
        bestToDays: '26',
      },
      byDay: {
        number: '3',
        titleOfficer: 'Example: close the store',
        kind: 'household',
        bestFrom: '20 November',
        bestTo: 'first ten days of December',
      },
    },
    /** Lines of templates of before, which people may still have. */
    before: {
      bySign: {
        number: '1',
        titleOfficer: 'Example: sow the first field',
        kind: 'farm',
        when: 'Pleiades, first morning',
        bestFromDays: '7',
        bestToDays: '23',
        otherSigns: 'Soil wet to a hand depth',
      },
      byDay: {
        number: '3',
        titleOfficer: 'Example: close the store',
        kind: 'household',
        bestFrom: '20 November',
        bestTo: 'December 1',
      },
      byTenDays: {
        number: '3',
        titleOfficer: 'Example: close the store',
        kind: 'household',
        bestFrom: '20 November',
        bestTo: 'early December',
      },
    },
  },
} as const;
