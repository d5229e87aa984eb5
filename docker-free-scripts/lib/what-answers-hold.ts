import {
  isKeeper,
  isOfCircle,
  isOnBoard,
  mayBeOpened,
  sees,
  type Combination,
  type Someone,
} from './visibility-rules.js';

/**
 * What is given to the village and looked for in every answer. `led entry` goes by a figure, `later entry` stands in
 * the draft and in the submission in review alone; `sound`, `picture` and `thumbnail` are the files themselves, for
 * which `recording` and `picture title` stand in lists.
 */
export const PLANTED_KINDS = [
  ...([
    'entry',
    'led entry',
    'later entry',
    'variant',
    'kept variant',
    'answer',
    'note',
    'lesson',
    'decision',
    'figure',
    'story',
    'sign',
  ] as const),
  ...(['consent', 'figure consent'] as const),
  ...(['recording', 'sound', 'picture title', 'picture', 'thumbnail'] as const),
] as const;
export type PlantedKind = (typeof PLANTED_KINDS)[number];

/** A word that stands in one thing alone; what that thing is, and how it is shared today. */
export interface Planted extends Combination {
  word: string;
  kind: PlantedKind;
}

type Rule = (person: Someone, thing: Combination) => boolean;
type Holds = Readonly<Partial<Record<PlantedKind, Rule>>>;

/** Drafts, reviews and records: whoever compiles, reviews and signs, of what they see. */
const keptSeen: Rule = (person, thing) => isKeeper(person) && sees(person, thing);
/** Consents go on being read while they hide their thing; a pause hides the thing from them, too. */
const agreedOn: Rule = (person, thing) =>
  isKeeper(person) &&
  isOfCircle(person, thing) &&
  thing.consent !== 'nobody asked' &&
  thing.consent !== 'paused';
const opened: Rule = (person, thing) => sees(person, thing) && mayBeOpened(person, thing);
const onBoard: Rule = (person, thing) => sees(person, thing) && isOnBoard(thing);
const paused: Rule = (person, thing) =>
  isKeeper(person) && isOfCircle(person, thing) && thing.consent === 'paused';
const bringers: Rule = (person) => person === 'giver';
const both =
  (one: Rule, other: Rule): Rule =>
  (person, thing) =>
    one(person, thing) && other(person, thing);
const either =
  (one: Rule, other: Rule): Rule =>
  (person, thing) =>
    one(person, thing) || other(person, thing);
/** The figure that an entry goes by. */
const leading: Rule = (person, thing) => thing.level === 'elders' && sees(person, thing);

/**
 * Kept by its own people and theirs to answer: elders who see it, the group, giver and successor. Whoever wrote it, here
 * the giver, answers only where nobody but giver and successor could.
 */
const theirs: Rule = (person, thing) => {
  const isVillages = (thing.level === 'open' || thing.level === 'village') && thing.season === 'none';
  if (isVillages || !sees(person, thing)) return false;
  if (person === 'giver') return isLone(thing);
  return person === 'elder' || person === 'successor' || thing.level === 'group';
};
const isLone = ({ level, season }: Combination) => level === 'sealed' || season !== 'none';

/** Where one entry is asked for after the other, one for each value of an axis stands for all combinations. */
export function isLookedAt({ level, season, consent }: Combination): boolean {
  const isPlain = consent === 'nobody asked' && season === 'none';
  return isPlain || (level === 'village' && (season === 'none' || consent === 'nobody asked'));
}
/** Open or the village's, for the whole year: the officer decides about each that is looked at. */
const decided: Rule = (_person, thing) =>
  isLookedAt(thing) && (thing.level === 'open' || thing.level === 'village') && thing.season === 'none';
const looked = (rule: Rule): Rule => both((_person, thing) => isLookedAt(thing), rule);

/** Entries with a sign in their own words, which was seen. */
export function hasOwnSign({ season, consent }: Combination): boolean {
  return season === 'none' && consent === 'nobody asked';
}

/** Figures whose sky is asked for one by one. */
export function isAskedFigure({ level, season, consent }: Combination): boolean {
  if (season !== 'none') return false;
  const isPlain = consent === 'nobody asked' && ['village', 'group', 'elders'].includes(level);
  return isPlain || consent === 'only to be kept';
}
const askedFigure = (rule: Rule): Rule => both((_person, thing) => isAskedFigure(thing), rule);

const ALL_FIGURES: Holds = { figure: sees };
const ONE_FIGURE: Holds = { figure: askedFigure(sees) };
const ENTRIES: Holds = {
  entry: sees,
  'led entry': sees,
  'later entry': keptSeen,
  variant: sees,
  'kept variant': sees,
};
const BOARD: Holds = { entry: onBoard, 'later entry': both(keptSeen, onBoard) };
const ONE_CONSENT: Holds = { consent: looked(agreedOn), entry: looked(agreedOn) };
/** Of voices and pictures a file has a list. */
const LISTED_FILES: Holds = { recording: onBoard, 'picture title': onBoard };
const WHOLE_FILE: Holds = {
  ...{ ...BOARD, variant: both(sees, onBoard), ...LISTED_FILES },
  // What the year taught, beside entries that are in the file, for those who read drafts.
  ...{ lesson: both(keptSeen, onBoard), decision: both(keptSeen, onBoard) },
};
const TITLED_FILES: Holds = { recording: sees, 'picture title': sees };

/**
 * What of all that is planted the answers of each endpoint hold together, and for whom. A test asks for exactly this:
 * neither a word more nor a word less.
 */
export const HOLDS: Readonly<Record<string, Holds>> = {
  listStars: ALL_FIGURES,
  exportStarsCsv: ALL_FIGURES,
  listSkylineEffects: ALL_FIGURES,
  findMarkers: ALL_FIGURES,
  listMarkerNames: ALL_FIGURES,
  readStar: ONE_FIGURE,
  readDrift: ONE_FIGURE,
  exportDriftCsv: ONE_FIGURE,
  readLook: ONE_FIGURE,
  printLook: ONE_FIGURE,
  readStarAir: ONE_FIGURE,
  readMoons: ALL_FIGURES,
  exportMoonsCsv: ONE_FIGURE,
  listFigures: { figure: sees, story: sees },
  readFigure: { figure: sees, story: sees, 'led entry': keptSeen },
  listSigns: { sign: sees },
  listOwnSignsSeen: { entry: both(sees, (_person, thing) => hasOwnSign(thing)) },
  listEntries: { entry: keptSeen, 'led entry': keptSeen, 'later entry': keptSeen },
  listVariants: { variant: keptSeen, 'kept variant': keptSeen },
  // The officer who rolled over neither sees nor counts what is kept.
  readRollover: { entry: keptSeen, 'led entry': keptSeen, 'later entry': keptSeen },
  readSeasonReview: {
    ...{ entry: keptSeen, 'led entry': keptSeen, 'later entry': keptSeen },
    // The star that leads is named, a figure too.
    ...{ lesson: keptSeen, decision: keptSeen, figure: both(keptSeen, leading) },
  },
  // A task names the entry that it is about.
  listSeasonTasks: { entry: both(keptSeen, decided), decision: keptSeen },
  readVersion: { ...ENTRIES, figure: leading },
  compareVersions: ENTRIES,
  readLongLook: { entry: sees, 'led entry': sees, 'later entry': keptSeen },
  listAnswers: { answer: keptSeen },
  readOwnEntries: {
    ...{ entry: theirs, 'led entry': sees, 'kept variant': theirs, figure: leading },
    answer: both(bringers, (_person, thing) => isLone(thing)),
  },
  printSheet: BOARD,
  previewSheet: BOARD,
  // Who says yes here says it to every use, so files to take along hold what the board holds.
  exportCalendarIcs: BOARD,
  // Whole: other timings stand beside their entries, as far as the board may go by them.
  exportCalendarCsv: { ...BOARD, variant: both(sees, onBoard) },
  exportCalendarJson: WHOLE_FILE,
  // The very same file, and the bytes of what it lists.
  exportCalendarArchive: { ...WHOLE_FILE, sound: onBoard, picture: onBoard },
  // The feed of somebody who sees what the village sees, fetched by whoever has its key.
  readFeed: { entry: (_person, thing) => isOnBoard(thing) },
  // For whoever has the address, of the village or not: what is open, and agreed to be handed on.
  readOpenPage: {
    entry: (_person, thing) => thing.level === 'open' && thing.consent === 'yes' && isOnBoard(thing),
  },
  // What is open and does not stand there, for those who keep the page.
  listLeftOutOfOpenPage: {
    entry: both(
      (person) => person === 'officer' || person === 'steward',
      (person, thing) => thing.level === 'open' && thing.consent !== 'yes' && sees(person, thing),
    ),
  },
  printReadBack: { entry: both(keptSeen, onBoard), 'later entry': both(keptSeen, onBoard) },
  listAttachments: TITLED_FILES,
  readAttachment: TITLED_FILES,
  readAttachmentPart: { sound: opened, picture: opened },
  readAttachmentThumbnail: { thumbnail: opened },
  listNotes: { note: sees },
  readItemState: {
    ...{ entry: looked(either(sees, paused)), 'led entry': sees, figure: askedFigure(sees) },
    ...TITLED_FILES,
  },
  listPausedItems: { entry: paused, figure: paused },
  listConsents: { consent: agreedOn, 'figure consent': agreedOn, entry: agreedOn, figure: agreedOn },
  readItemConsents: {
    ...{ entry: looked(either(sees, agreedOn)), 'led entry': sees, consent: looked(agreedOn) },
    ...{ figure: askedFigure(either(sees, agreedOn)), 'figure consent': askedFigure(agreedOn) },
  },
  readConsent: ONE_CONSENT,
  printConsentCard: ONE_CONSENT,
  listAuditEvents: {
    ...{ entry: keptSeen, 'led entry': keptSeen, 'later entry': keptSeen, figure: keptSeen },
    ...{ recording: keptSeen, 'picture title': keptSeen, sign: keptSeen },
  },
  // What an elder asks the officer to change stands among what waits.
  readToday: { entry: sees, answer: both((person) => person === 'officer', sees) },
  // What somebody wrote and brought is theirs to have, also while it is hidden.
  exportOwnData: {
    ...{ note: bringers, recording: bringers, 'picture title': bringers },
    // Who saw a sign, as the person marked it.
    entry: both(bringers, (_person, thing) => hasOwnSign(thing)),
    ...{ lesson: bringers, decision: (person) => person === 'officer' },
  },
};

/** Why an endpoint holds nothing of what is planted. Every other one has its line above, or a test says so. */
export const HOLDS_NOTHING: Readonly<Record<string, string>> = {
  readTodaysEngine:
    'names entries only where another engine reckoned them; what it reads is cut like a version',
  readTakeAlong: 'counts voices and pictures that the person knows of, and names none',
  readHealth: 'tells of the machine alone',
  readOpenApi: 'is the contracts',
  readSession: 'names the person and their villages',
  listDevices: 'names browsers and times',
  readPrivacy: 'names tables and purposes',
  listCards: 'names people and times',
  readLetterService: 'is a yes or no',
  readLetterChoice: 'is the person’s own choice',
  listStillToAsk: 'names people and submissions',
  listCommunities: 'names villages',
  readCommunity: 'is the village’s settings',
  listPeople: 'names people',
  readAfterDeath: 'is a day, numbers, and the names that a giver left something to',
  listPlaces: 'is places and their skylines',
  readPlace: 'is one place and its skyline',
  findTimeZone: 'is a name of a zone',
  readWeather: 'is notices of an office and rain, which all of the village read',
  listNotices: 'is notices of an office',
  readWordLists: 'is what all of the village call kinds, work and crops',
  listSkyMarkers: 'names signs of the Sun and of stars of the table',
  readChart: 'is stars of the table',
  listCalendars: 'counts what the person sees',
  readCalendar: 'counts what the person sees',
  watchDraft: 'is ids and numbers of what the person sees',
  listVersions: 'counts what the person sees',
  listHelpable: 'names elders, and observers for keepers',
  readOpenPageState: 'is a key and how much of the place is told',
  drawOpenPageCode: 'is an address',
  printOpenPageCard: 'is an address',
  listFeeds: 'is ids and days, of the person alone',
  listGroups: 'names groups and, to their people, members',
  listAskedSharing: 'is levels and ids',
  readSharing: 'is levels, people and ids',
  listWithdrawn: 'is ids',
  listSheetsToReplace: 'is numbers of versions',
};

/** The words that an endpoint has for somebody. */
export function heldFor(endpointId: string, person: Someone, planted: readonly Planted[]): Planted[] {
  return planted.filter((thing) => holds(endpointId, person, thing));
}

export function holds(
  endpointId: string,
  person: Someone,
  { kind, ...thing }: Combination & { kind: PlantedKind },
): boolean {
  return HOLDS[endpointId]?.[kind]?.(person, thing) === true;
}
