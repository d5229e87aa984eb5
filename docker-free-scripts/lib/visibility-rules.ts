/**
 * Who sees what, said once more in plain rules that know nothing of the server's own. The guide prints them, and
 * `tests/api/levels.test.ts` asks the product for a thing of every combination as everybody here.
 */

/** Each stands for one relation to a thing and has no other; giver and successor are elders. */
export const PEOPLE = [
  'visitor',
  'officer of another village',
  'observer',
  'staff',
  'officer',
  'steward',
  'elder',
  'member of the group',
  'giver',
  'successor',
] as const;
export type Someone = (typeof PEOPLE)[number];

export const LEVELS = ['open', 'village', 'group', 'elders', 'sealed'] as const;
export type Level = (typeof LEVELS)[number];

/** Of the telling season: there is none, today is in it, today is not. */
export const SEASONS = ['none', 'inside', 'outside'] as const;
export type Season = (typeof SEASONS)[number];

export const CONSENTS = [
  'nobody asked',
  'yes',
  'only to be shown',
  'only to be kept',
  'no answer yet',
  'refused',
  'lapsed',
  'taken back',
  'paused',
] as const;
export type ConsentGiven = (typeof CONSENTS)[number];

export interface Combination {
  level: Level;
  season: Season;
  consent: ConsentGiven;
}

export const COMBINATIONS: readonly Combination[] = LEVELS.flatMap((level) =>
  SEASONS.flatMap((season) => CONSENTS.map((consent) => ({ level, season, consent }))),
);

const VILLAGE: readonly Someone[] = [
  ...(['observer', 'staff', 'officer', 'steward', 'elder'] as const),
  ...(['member of the group', 'giver', 'successor'] as const),
];

/** What is open is for people of the village; the village's page for everybody has a rule of its own. */
const CIRCLES: Readonly<Record<Level, readonly Someone[]>> = {
  open: VILLAGE,
  village: VILLAGE,
  group: ['giver', 'member of the group'],
  elders: ['giver', 'successor', 'elder'],
  sealed: ['giver', 'successor'],
};

/** Whoever compiles, reviews or signs: drafts, answers and consents are theirs to read, as far as the level goes. */
const KEEPERS: readonly Someone[] = ['officer', 'steward', 'elder', 'giver', 'successor'];

/** By level and telling season alone: outside the season everything is as if it were sealed. */
export function isOfCircle(
  person: Someone,
  { level, season }: Pick<Combination, 'level' | 'season'>,
): boolean {
  return CIRCLES[season === 'outside' ? 'sealed' : level].includes(person);
}

const HIDING: readonly ConsentGiven[] = ['only to be kept', 'refused', 'lapsed', 'taken back', 'paused'];

/** Kept but not to be shown, a no, a yes that has ended or was taken back, paused: nobody sees it, its giver included. */
export function isHidden({ consent }: Pick<Combination, 'consent'>): boolean {
  return HIDING.includes(consent);
}

export function sees(person: Someone, thing: Combination): boolean {
  return isOfCircle(person, thing) && !isHidden(thing);
}

export function isKeeper(person: Someone): boolean {
  return KEEPERS.includes(person);
}

/** On the village's board, whoever prints it: open or the village's today, and nobody said no to printing. */
export function isOnBoard({ level, season, consent }: Combination): boolean {
  const isVillages = (level === 'open' || level === 'village') && season !== 'outside';
  return isVillages && (consent === 'nobody asked' || consent === 'yes');
}

/** Voices and pictures themselves, where somebody was asked, need a yes of their own; whoever brought them has them. */
export function mayBeOpened(person: Someone, { consent }: Combination): boolean {
  return (consent !== 'only to be shown' && consent !== 'no answer yet') || person === 'giver';
}
