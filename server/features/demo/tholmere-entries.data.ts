import { byStar, bySign, days, demoEntry, type DemoEntry } from './demo-entry.js';

const BELT_AT_NINE = bySign({
  kind: 'due-meridian',
  markerKey: 'orion-belt',
  facing: 'south',
  solarHour: 21,
});
/** The first night after the light nights on which bright stars come out. */
const FIRST_STARS = bySign({ kind: 'dark-night', end: 'first', depthDeg: 6 });

/**
 * The year of Tholmere Landing, an invented village: titles, windows and customs are made up for this product and need
 * an agronomist before any real use. The ice road (C05), oats (C07) and potato planting (C08) go by signs of nature;
 * no entry can be led by one yet, so they stay out, and with them the variants that they carry.
 */
export const THOLMERE_ENTRIES: readonly DemoEntry[] = [
  demoEntry('C01', {
    titleVillage: 'Thóλe ran',
    titleOfficer: 'Sun back over the south ridge',
    kind: 'marker-only',
    icon: 'blossom',
    notes: 'Children watch, and never stare at the Sun.',
    caution: 'Never look at the Sun; watch where its light falls.',
    lead: bySign({ kind: 'noon-sun', passage: 'back', ridgeName: 'south ridge' }),
    offsets: days(-3, 0, 4, 8),
    otherSigns: 'Light on the hill-top birch',
    ifLate: 'Cloudy: take the date',
    giver: 'Elder C-1',
  }),
  demoEntry('C02', {
    titleVillage: 'Mësk thóλe',
    titleOfficer: 'Three-in-a-row due south at nine in the evening',
    kind: 'marker-only',
    icon: 'community',
    lead: BELT_AT_NINE,
    offsets: days(-5, -2, 3, 7),
    ifLate: 'Cloudy: take the date',
    giver: 'Elder C-1',
  }),
  demoEntry('C03', {
    titleVillage: 'Ëlda ranvǭ',
    titleOfficer: 'Order seed potato and oats',
    kind: 'farm',
    icon: 'seed',
    crop: 'early potato, oats',
    lead: BELT_AT_NINE,
    offsets: days(2, 6, 29, 44),
    ifLate: 'Ask the agricultural office for late supply',
    giver: 'The officer',
  }),
  demoEntry('C04', {
    titleVillage: 'Ëlda thíl',
    titleOfficer: 'Chit seed potato',
    kind: 'farm',
    icon: 'plant',
    crop: 'early potato',
    lead: bySign({ kind: 'sun-season', season: 'march-equinox' }),
    offsets: days(26, 31, 46, 56),
    otherSigns: 'Snow buntings in the yard',
    ifLate: 'Plant unchitted',
    giver: 'Elder C-2',
  }),
  demoEntry('C06', {
    titleVillage: 'Nǭst mësk',
    titleOfficer: 'Net and boat overhaul',
    kind: 'household',
    icon: 'fish',
    lead: bySign({ kind: 'dark-night', end: 'last', depthDeg: 6 }),
    offsets: days(-11, -7, 8, 13),
    otherSigns: 'River ice dark and lifting',
    ifLate: 'Do indoors first',
    giver: 'Elder C-1',
    sharingLevel: 'village',
  }),
  demoEntry('C09', {
    titleVillage: 'Λëva ran',
    titleOfficer: 'Hay',
    kind: 'farm',
    icon: 'harvest',
    crop: 'meadow',
    lead: bySign({ kind: 'sun-season', season: 'june-solstice' }),
    offsets: days(19, 24, 45, 55),
    otherSigns: 'Two of these: meadow grass in flower; three dry days promised by the met service',
    ifLate: 'Cut small lots',
    giver: 'Elder C-2',
  }),
  demoEntry('C10', {
    titleVillage: 'Thóλe mën',
    titleOfficer: 'First star again',
    kind: 'marker-only',
    icon: 'community',
    lead: FIRST_STARS,
    offsets: days(-3, 0, 11, 16),
    otherSigns: 'Any star seen by two people',
    ifLate: 'Cloudy: take the date',
    giver: 'Elder C-1',
  }),
  demoEntry('C12', {
    titleVillage: 'Ëlda nǭst',
    titleOfficer: 'Lift potato before frost',
    kind: 'farm',
    icon: 'frost',
    crop: 'early potato',
    lead: bySign({ kind: 'dark-night', end: 'first', depthDeg: 15 }),
    offsets: days(-10, -5, 14, 22),
    otherSigns: 'One of these: frost notice from the met service; low grass white at dawn',
    ifLate: 'Lift all on first frost notice',
    giver: 'Elder C-2',
  }),
  demoEntry('C13', {
    titleVillage: 'Ranvǭ thíl',
    titleOfficer: 'Sirius sets over the strait at dawn',
    kind: 'marker-only',
    icon: 'community',
    notes: 'Only from the shore; at most about seven degrees high.',
    lead: byStar('hr2491', 'cosmical-setting'),
    offsets: days(-5, 0, 6, 10),
    ifLate: 'Hidden by hills: leave out',
    giver: 'Elder C-1',
    sharingLevel: 'village',
  }),
];

/** Where the berries are is the pickers' to know. */
export const BERRY_WEEK: DemoEntry = demoEntry('C11', {
  titleVillage: 'Mën λëva',
  titleOfficer: 'Berry week',
  kind: 'household',
  icon: 'gather',
  notes: 'Shared places stay among the pickers.',
  caution: 'Local rules on gathering come first.',
  lead: FIRST_STARS,
  offsets: days(7, 11, 31, 37),
  otherSigns: 'Marsh berries soft on the south side',
  ifLate: 'Go by ripeness',
  giver: 'Elder C-3',
  agreedToPrint: false,
});
