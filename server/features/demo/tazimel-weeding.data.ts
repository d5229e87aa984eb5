import { days, demoEntry, onTheDayOf, type DemoEntry } from './demo-entry.js';

/** Both weedings of Upper Tazimel wait for the day on which the long millet is really sown. */
export const TAZIMEL_WEEDING: readonly DemoEntry[] = [
  demoEntry('A07', {
    titleVillage: 'Kùlu ŋɔ́rɛ̃',
    titleOfficer: 'First weeding',
    kind: 'farm',
    icon: 'weed',
    crop: 'millet',
    notes: 'Women and youth mostly; work-parties.',
    lead: onTheDayOf('A04'),
    offsets: days(16, 19, 26, 36),
    otherSigns: 'Seedlings at four leaves',
    ifLate: 'Weed the best plots first',
    giver: 'The officer',
  }),
  demoEntry('A08', {
    titleVillage: 'Kùlu tsʼíɗa̰',
    titleOfficer: 'Second weeding',
    kind: 'farm',
    icon: 'hoe',
    crop: 'millet',
    notes: 'Mixed work-parties.',
    lead: onTheDayOf('A04'),
    offsets: days(29, 35, 47, 55),
    otherSigns: 'One of these: Sirius seen at dawn; crop knee high',
    ifLate: 'Skip on poor plots',
    giver: 'Elder A-1',
  }),
];
