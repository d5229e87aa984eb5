import { unnamedMoons, type LocalMonth } from '#shared/contracts/local-months.js';
import type { CommunityInput, Role } from '#shared/contracts/people.js';
import type { FigureInput } from '#shared/contracts/figures.js';
import type { PlaceInput } from '#shared/contracts/places.js';

/**
 * Invented villages, people and languages. The coordinates are whole degrees and the relief is invented, so no
 * real settlement is meant; nothing here is anybody's custom.
 */
export interface DemoPerson {
  /** Mailbox at dawnpeg.example. */
  mailbox: string;
  displayName: string;
  roles: Role[];
  /** False: a person of the village without an account that one can sign in to. */
  account: boolean;
}

export interface DemoVillage {
  settings: Omit<CommunityInput, 'signOffRule'>;
  rule: { minElders: number; mustSign: string[]; oneOf: string[]; steward: boolean };
  people: DemoPerson[];
  place: PlaceInput;
  /** Written down by the first officer. */
  figures: FigureInput[];
}

/** Known to everybody: such accounts exist in demo databases only, and those listen on loopback only. */
export const DEMO_PASSWORD = 'limewash-and-pegs';
export const DEMO_DOMAIN = 'dawnpeg.example';

function skyline(table: string): PlaceInput['skyline'] {
  return table.split(' ').map((pair) => {
    const [azimuthDeg = 0, altitudeDeg = 0] = pair.split(':').map(Number);
    return { azimuthDeg, altitudeDeg };
  });
}

/** The twelve months with those that are named, 1 to 12. */
function months(...named: number[]): PlaceInput['rainMonths'] {
  return Array.from({ length: 12 }, (_, index) => named.includes(index + 1));
}

/** Months by the days on which they begin, `MM-DD`. */
function named(begins: Record<string, string>): LocalMonth[] {
  return Object.entries(begins).map(([day, name]) => {
    const [month = 1, dayOfMonth = 1] = day.split('-').map(Number);
    return { name, begins: { month, day: dayOfMonth } };
  });
}

export const UPPER_TAZIMEL: DemoVillage = {
  settings: {
    name: 'Upper Tazimel',
    villageLanguage: { tag: 'art-x-tazimel', name: 'Tazimeli' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: {
      date: { month: 6, day: 8 },
      note: 'The day after the Cluster’s first dawn; moons are counted',
    },
    localMonths: named({
      '06-08': 'Ŋɔ́rɛ̃',
      '07-05': 'Ɓèŋu̍',
      '08-01': 'Wírra̰m',
      '09-06': 'Ɗòŋɛ̃',
      '10-03': 'Kʼáselu',
      '10-30': 'Tsʼíɗa̰',
      '11-28': 'Màvɔru',
      '12-28': 'Hɛ́lɛ̃zi',
      '01-30': 'Zɔ̀ɗu',
      '03-01': 'Chʼárɔ̃',
      '04-02': 'Nìvɛ́la',
      '05-05': 'Rúŋɔ̃ti',
    }),
    // The one that comes in some years only; the others go by their number.
    moonNames: [...unnamedMoons().slice(1), 'Zìɓɔ́n'],
    weatherContact: 'National weather service, call 900',
    agricultureContact: 'District agricultural office, call 901',
  },
  rule: { minElders: 2, mustSign: ['elder2'], oneOf: ['elder', 'elder3'], steward: true },
  people: [
    { mailbox: 'steward', displayName: 'Ostrel', roles: ['steward'], account: true },
    { mailbox: 'officer', displayName: 'Beyno', roles: ['officer'], account: true },
    { mailbox: 'elder', displayName: 'Elder A-1', roles: ['elder'], account: true },
    { mailbox: 'elder2', displayName: 'Elder A-2', roles: ['elder'], account: true },
    { mailbox: 'elder3', displayName: 'Elder A-3', roles: ['elder'], account: true },
    { mailbox: 'staff', displayName: 'Irvel', roles: ['staff'], account: true },
    { mailbox: 'observer', displayName: 'Sanwe', roles: ['observer'], account: true },
  ],
  place: {
    name: 'Upper terraces',
    latitudeDeg: 12,
    longitudeDeg: 39,
    elevationM: 1950,
    timeZone: 'Africa/Addis_Ababa',
    skyline: skyline('0:1.5 45:2.5 60:3 90:3 110:3.5 135:2 180:1 225:1.5 270:2 315:2 360:1.5'),
    clarityByMonth: [
      'clear',
      'ordinary',
      'hazy',
      'hazy',
      'hazy',
      'ordinary',
      'hazy',
      'hazy',
      'ordinary',
      'clear',
      'clear',
      'clear',
    ],
    // One rainy season from the middle of June to early October.
    rainMonths: months(6, 7, 8, 9),
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  },
  figures: [],
};

export const VARDESCA_TERRACES: DemoVillage = {
  settings: {
    name: 'Vardesca Terraces',
    villageLanguage: { tag: 'art-x-vardesca', name: 'Vardescan' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: { date: { month: 6, day: 23 }, note: 'The first morning the Belt is seen' },
    localMonths: [],
    moonNames: unnamedMoons(),
    weatherContact: 'Mountain weather service, call 910',
    agricultureContact: 'Provincial agricultural office, call 911',
  },
  rule: { minElders: 2, mustSign: ['elder-b2'], oneOf: [], steward: true },
  people: [
    { mailbox: 'officer2', displayName: 'Lume', roles: ['officer'], account: true },
    { mailbox: 'steward2', displayName: 'Osca', roles: ['steward'], account: true },
    { mailbox: 'elder-b1', displayName: 'Elder B-1', roles: ['elder'], account: true },
    { mailbox: 'elder-b2', displayName: 'Elder B-2', roles: ['elder'], account: true },
    { mailbox: 'elder-b3', displayName: 'Elder B-3', roles: ['elder'], account: false },
    { mailbox: 'observer2', displayName: 'Pesra', roles: ['observer'], account: true },
  ],
  place: {
    name: 'Painted reservoir',
    latitudeDeg: -14,
    longitudeDeg: -70,
    elevationM: 3800,
    timeZone: 'America/Lima',
    skyline: skyline('0:4 45:7 70:8 90:8 110:7 135:6 180:3 225:4 270:5 315:5 360:4'),
    clarityByMonth: [
      'hazy',
      'hazy',
      'hazy',
      'ordinary',
      'clear',
      'clear',
      'clear',
      'clear',
      'ordinary',
      'ordinary',
      'ordinary',
      'hazy',
    ],
    // Rains from late September.
    rainMonths: months(10, 11, 12, 1, 2, 3),
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  },
  figures: [
    {
      names: [
        { tag: 'art-x-vardesca', name: 'Vàrdek' },
        { tag: 'en', name: 'The four steps' },
      ],
      story:
        'Four steps stand in the wall of the night. Whoever sees the lowest step before the morning light looks to the clods: wet ones wait, dry ones break.',
      variants: [
        {
          toldBy: 'Elder B-3',
          text: 'The lowest step is cold. Only the day that is as long as its night warms it.',
        },
      ],
      memberHrs: [4656, 4730, 4763, 4853],
      indicatorHr: 4730,
      patch: null,
      ownDepths: null,
      sharingLevel: 'open',
    },
    {
      names: [
        { tag: 'art-x-vardesca', name: 'Tilɵ̄' },
        { tag: 'en', name: 'The dark sack' },
      ],
      story:
        'Beside the steps lies a sack of which nobody has seen the bottom. On clear nights it is emptiest.',
      variants: [],
      memberHrs: [],
      indicatorHr: null,
      // Beside the Southern Cross; the place is rounded, the dark has no middle.
      patch: { rightAscensionDeg: 192, declinationDeg: -62.5, patchClass: 'full-night' },
      ownDepths: null,
      sharingLevel: 'village',
    },
  ],
};

export const THOLMERE_LANDING: DemoVillage = {
  settings: {
    name: 'Tholmere Landing',
    villageLanguage: { tag: 'art-x-tholmere', name: 'Tholmer' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: { date: { month: 8, day: 1 }, note: 'The first dark evening after the light nights' },
    localMonths: [],
    moonNames: unnamedMoons(),
    weatherContact: 'Coast weather service, call 920',
    agricultureContact: 'Northern agricultural office, call 921',
  },
  rule: { minElders: 2, mustSign: [], oneOf: [], steward: true },
  people: [
    { mailbox: 'officer3', displayName: 'Ranve', roles: ['officer'], account: true },
    { mailbox: 'steward3', displayName: 'Orsel', roles: ['steward'], account: true },
    { mailbox: 'elder-c1', displayName: 'Elder C-1', roles: ['elder'], account: true },
    { mailbox: 'elder-c2', displayName: 'Elder C-2', roles: ['elder'], account: true },
    { mailbox: 'elder-c3', displayName: 'Elder C-3', roles: ['elder'], account: true },
    { mailbox: 'observer3', displayName: 'Ivik', roles: ['observer'], account: true },
  ],
  place: {
    name: 'Landing stage',
    latitudeDeg: 66,
    longitudeDeg: 23,
    elevationM: 15,
    timeZone: 'Europe/Stockholm',
    skyline: skyline('0:3 45:3 90:3 135:2.5 180:2 205:1 225:0 270:0.5 315:2 360:3'),
    clarityByMonth: [
      'ordinary',
      'clear',
      'clear',
      'clear',
      'ordinary',
      'ordinary',
      'ordinary',
      'ordinary',
      'ordinary',
      'hazy',
      'hazy',
      'hazy',
    ],
    rainMonths: months(),
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  },
  figures: [
    {
      names: [
        { tag: 'art-x-tholmere', name: 'Ranvǭ' },
        { tag: 'en', name: 'The long sledge' },
      ],
      story:
        'The sledge never leaves the sky. In the dark months it drives once around the pole each night, and its runner shows the hour.',
      variants: [],
      memberHrs: [4295, 4301, 4554, 4660, 4905, 5054, 5191],
      indicatorHr: 5191,
      patch: null,
      ownDepths: null,
      sharingLevel: 'open',
    },
    {
      names: [
        { tag: 'art-x-tholmere', name: 'Mësk' },
        { tag: 'en', name: 'Three in a row' },
      ],
      story: 'Three boats come in over the ice. When they stand in the south at nine, the winter has turned.',
      variants: [
        { toldBy: 'Elder C-1', text: 'Three men carry the net. The one in the middle calls the stroke.' },
      ],
      memberHrs: [1852, 1903, 1948],
      indicatorHr: 1903,
      patch: null,
      ownDepths: null,
      sharingLevel: 'village',
    },
  ],
};
