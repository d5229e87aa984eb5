import type { CommunityInput, Role } from '#shared/contracts/people.js';
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

export const UPPER_TAZIMEL: DemoVillage = {
  settings: {
    name: 'Upper Tazimel',
    villageLanguage: { tag: 'art-x-tazimel', name: 'Tazimeli' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: {
      date: { month: 6, day: 8 },
      note: 'The day after the Cluster’s first dawn; moons are counted',
    },
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
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  },
};

export const VARDESCA_TERRACES: DemoVillage = {
  settings: {
    name: 'Vardesca Terraces',
    villageLanguage: { tag: 'art-x-vardesca', name: 'Vardescan' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: { date: { month: 6, day: 23 }, note: 'The first morning the Belt is seen' },
    weatherContact: 'Mountain weather service, call 910',
    agricultureContact: 'Provincial agricultural office, call 911',
  },
  rule: { minElders: 2, mustSign: ['elder-b2'], oneOf: [], steward: true },
  people: [
    { mailbox: 'officer2', displayName: 'Lume', roles: ['officer'], account: true },
    { mailbox: 'steward-b', displayName: 'Osca', roles: ['steward'], account: false },
    { mailbox: 'elder-b1', displayName: 'Elder B-1', roles: ['elder'], account: false },
    { mailbox: 'elder-b2', displayName: 'Elder B-2', roles: ['elder'], account: false },
    { mailbox: 'elder-b3', displayName: 'Elder B-3', roles: ['elder'], account: false },
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
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  },
};
