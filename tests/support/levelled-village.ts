import { randomUUID } from 'node:crypto';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ConsentContent } from '#shared/contracts/consents.js';
import type { MadeFeed } from '#shared/contracts/exports.js';
import type { FigureInput } from '#shared/contracts/figures.js';
import { PLAIN_DETAILS, SHARED_ITEM_TYPES, type SharingChange } from '#shared/contracts/sharing.js';
import type { RolledCalendar } from '#shared/contracts/rollovers.js';
import type { Version } from '#shared/contracts/versions.js';
import { LEVELS, type Combination } from '../../docker-free-scripts/lib/visibility-rules.js';
import {
  hasOwnSign,
  isAskedFigure,
  isLookedAt,
  type Planted,
  type PlantedKind,
} from '../../docker-free-scripts/lib/what-answers-hold.js';
import type { Client, TestApi } from './api.js';
import { addEntry, beginCalendar, entryInput, publish, says, submit, versionPath } from './calendar-api.js';
import { figureInput } from './figure-api.js';
import { levelledEntry, settleConsent, type Circle } from './levelled-entries.js';
import { openLevelledPeople, type LevelledPeople } from './levelled-people.js';
import {
  addLevelledFigures,
  addLevelledFiles,
  addLevelledSigns,
  addLevelledVariant,
  plainAt,
  VILLAGE_THINGS,
  type LevelledFigure,
} from './levelled-things.js';
import { addRecording } from './attachment-api.js';
import { lookBack } from './looked-back.js';
import { addNote } from './notes-api.js';
import { waitingForOwn } from './sign-api.js';
import { switchOpenPageOn } from './open-page-api.js';
import { addGroup } from './sharing-api.js';

/** Remembers what a word stands for; makes one where none is given. */
export type Plant = (kind: PlantedKind, combination: Combination, word?: string) => string;

export interface LevelledVillage extends LevelledPeople {
  planted: Planted[];
  calendarId: string;
  publishedNumber: number;
  reviewedNumber: number;
  /** The sealed entry and the elders' figure. */
  hiddenEntryId: string;
  hiddenFigureId: string;
  content: EntryInput;
  figure: FigureInput;
  sharingChange: SharingChange;
  /** What stands for the parameters of paths, and queries to try, by endpoint. */
  params: Record<string, readonly string[]>;
  queries: Record<string, readonly string[]>;
  pairs: readonly Record<string, string>[];
  /** Where drawing takes long: every number is asked for by one of the two. */
  only: Record<string, Record<string, readonly string[]>>;
}

interface LevelledEntry extends Combination {
  id: string;
  content: EntryInput;
}

/** One entry for each level, and one outside its telling season. */
export const ONE_PER_LEVEL: readonly Combination[] = [
  ...LEVELS.map(plainAt),
  { level: 'village', season: 'outside', consent: 'nobody asked' },
];

/**
 * A village with an entry of each combination, one more that goes by an elders' figure, and figures, variants, voices,
 * pictures, notes, answers and consents at every level. All is published as its people agreed, and a second submission
 * is in review; what givers then said about their consent came last, as in life. The giver of everything is elder A-1,
 * A-2 is their successor, A-3 and the demo's observer belong with them to a group.
 */
export async function furnishLevels(
  api: TestApi,
  combinations: readonly Combination[] = ONE_PER_LEVEL,
): Promise<LevelledVillage> {
  await api.reset();
  const village = await openLevelledPeople(api);
  const { elder, elder2, elder3, officer } = village;
  const planted: Planted[] = [];
  const plant: Plant = (kind, { level, season, consent }, word = `Zq${planted.length}xw`) => {
    planted.push({ word, kind, level, season, consent });
    return word;
  };
  const group = await addGroup(elder, 'Weavers', [elder, elder3, village.observer]);
  const circle: Circle = { giver: elder, successor: elder2, groupId: group.id };
  const calendar = await beginCalendar(village);

  const figures = await addLevelledFigures(api, circle, [...LEVELS.map(plainAt), ...VILLAGE_THINGS], plant);
  const signIds = await addLevelledSigns(api, circle, LEVELS.map(plainAt), plant);
  const figureAt = (level: Combination['level']) => expectFound(figures, plainAt(level));
  const entries: LevelledEntry[] = [];
  const give = async (combination: Combination, led: Partial<EntryInput> | null = null) => {
    // An entry is seen by no more people than the figure that it goes by.
    const seen = led === null ? combination : plainAt('elders');
    const word = plant(led === null ? 'entry' : 'led entry', seen);
    const writer = isVillages(combination) ? officer : elder;
    const input = { ...levelledEntry(word, combination, circle, entries.length), ...led };
    const awaits = hasOwnSign(combination) ? { record: waitingForOwn(word) } : {};
    const { id, content } = await addEntry(writer, calendar.id, { ...input, ...awaits });
    for (const { ownId } of content.record?.signs.list ?? []) {
      const path = `/api/calendars/${calendar.id}/entries/${id}/signs/${ownId ?? ''}/seen`;
      await elder.post(path, { day: '2026-11-29', who: word }).expect(201);
    }
    const done = { from: '2027-06-24', to: null, saidBy: word, plots: word };
    await elder.put(`/api/calendars/${calendar.id}/entries/${id}/actual-days`, done).expect(200);
    entries.push({ ...seen, id, content });
  };
  for (const combination of combinations) await give(combination);
  await give({ level: 'village', season: 'inside', consent: 'nobody asked' }, ledBy(figureAt('elders')));
  const open = expectFound(entries, plainAt('open'));
  const kept = entries.filter((entry) => !isVillages(entry));
  const variant = (
    entryId: string,
    level: 'village' | 'elders',
    seen: Combination,
    kind: 'variant' | 'kept variant' = 'variant',
  ) => addLevelledVariant(elder, calendar.id, entryId, level, plant(kind, seen));
  const variantIds = [
    await variant(open.id, 'village', plainAt('village')),
    await variant(open.id, 'elders', plainAt('elders')),
    await variant(expectFound(entries, plainAt('elders')).id, 'village', plainAt('elders'), 'kept variant'),
  ];

  const first = await submit(officer, calendar.id);
  for (const entry of kept) {
    // Somebody besides the giver has to agree: of a group one of its own, of all else the successor.
    const isGroups = entry.level === 'group' && entry.season !== 'outside';
    await answer(isGroups ? elder3 : elder2, first, entry, says());
  }
  const published = await publish(village, first);
  const later = plant('later entry', plainAt('village'));
  await addEntry(officer, calendar.id, {
    ...levelledEntry(later, plainAt('village'), circle, entries.length),
  });
  const reviewed = await submit(officer, calendar.id);
  const looked = entries.filter(isLookedAt);
  // The last entry goes by a figure; its giver has said nothing yet.
  for (const entry of looked.slice(0, -1).filter((one) => !isVillages(one))) {
    await answer(elder, reviewed, entry, says({ answer: 'change-this', note: plant('answer', entry) }));
  }
  const attachmentIds = await addFiles(entries, circle, plant);
  for (const { id, ...entry } of looked) {
    await addNote(elder, { subjectId: id, text: plant('note', entry) });
  }
  await lookBack(village, calendar.id, { all: looked, villages: looked.filter(isVillages) }, plant);
  const forElders = plant('note', plainAt('elders'));
  const note = await addNote(elder, { subjectId: open.id, text: forElders, level: 'elders' });
  const spoken = plant('recording', plainAt('elders'));
  const heard = { title: spoken, speaker: spoken, sharingLevel: 'village' } as const;
  attachmentIds.push((await addRecording(elder, note.id, { subjectType: 'note', ...heard })).id);
  const elders = figureAt('elders');
  await addNote(elder, {
    ...{ subjectType: 'figure', subjectId: elders.id },
    text: plant('note', plainAt('elders')),
  });
  const consentIds = await settleConsents(elder, entries, figures, plant);
  const feed = (await village.observer.post(`/api/communities/${officer.communityId}/feeds`).expect(201))
    .body as MadeFeed;
  const openKey = await switchOpenPageOn(officer);
  const rolled = await officer.post(`/api/calendars/${calendar.id}/next-year`).expect(200);
  const rolledId = (rolled.body as RolledCalendar).calendarId;
  const askedFigures = figures.filter(isAskedFigure);
  const sealed = expectFound(entries, plainAt('sealed'));
  const numbers = [String(published.number), String(reviewed.number)];
  const about = (subjectType: string, things: readonly { id: string }[]) =>
    things.map(({ id }) => `?subjectType=${subjectType}&subjectId=${id}`);
  return {
    ...village,
    planted,
    calendarId: calendar.id,
    publishedNumber: published.number,
    reviewedNumber: reviewed.number,
    hiddenEntryId: sealed.id,
    hiddenFigureId: elders.id,
    content: entryInput(),
    figure: figureInput(),
    sharingChange: { sharing: { level: 'sealed', ...PLAIN_DETAILS }, version: 1 },
    pairs: [
      ...looked.map(({ id }) => ({ itemType: 'entry', itemId: id })),
      ...askedFigures.map(({ id }) => ({ itemType: 'figure', itemId: id })),
      ...askedFigures.map(({ id }) => ({ itemType: 'story', itemId: id })),
      ...attachmentIds.map((id) => ({ itemType: 'attachment', itemId: id })),
      ...variantIds.map((id) => ({ itemType: 'variant', itemId: id })),
    ],
    only: {
      readRollover: { calendarId: [rolledId] },
      listSeasonTasks: { calendarId: [rolledId] },
      listEntries: { calendarId: [calendar.id, rolledId] },
      printSheet: { number: [numbers[0] ?? '', 'draft'] },
      previewSheet: { number: numbers },
    },
    params: {
      communityId: [officer.communityId],
      placeId: [village.placeId],
      calendarId: [calendar.id],
      entryId: looked.map(({ id }) => id),
      number: [...numbers, 'draft'],
      figureId: figures.map(({ id }) => id),
      signId: signIds,
      seenId: [randomUUID()],
      ownId: [randomUUID()],
      markerKey: askedFigures.map(({ markerKey }) => markerKey),
      itemType: [...SHARED_ITEM_TYPES],
      itemId: [...looked, ...figures].map(({ id }) => id),
      groupId: [group.id],
      variantId: variantIds,
      consentId: consentIds,
      noteId: [note.id],
      withdrawalId: [randomUUID()],
      attachmentId: attachmentIds,
      part: ['0', '1'],
      personId: [elder.personId],
      deviceId: ['0'.repeat(64)],
    },
    queries: {
      findTimeZone: ['?latitudeDeg=12&longitudeDeg=39'],
      listStars: ['?year=2027'],
      exportStarsCsv: ['?year=2027'],
      readStar: ['?year=2027'],
      listSkylineEffects: ['?year=2027'],
      listSkyMarkers: ['?year=2027'],
      readStarAir: ['?year=2027'],
      readFeed: [`?key=${feed.key}`],
      readOpenPage: [`?key=${openKey}`],
      readMoons: moonsBy(askedFigures),
      exportMoonsCsv: moonsBy(askedFigures),
      findMarkers: ['?year=2027&from=06-10'],
      readDrift: ['?from=1500&to=2027'],
      readLongLook: [...numbers, 'draft'].map((number) => `?from=2027&years=1&number=${number}`),
      exportDriftCsv: ['?from=1500&to=2027'],
      readLook: askedFigures.map(({ markerKey }) => `?marker=${markerKey}&date=2027-06-10`),
      printLook: askedFigures.map(({ markerKey }) => `?marker=${markerKey}&date=2027-06-10`),
      compareVersions: ['?from=1&to=1', '?from=1&to=2', '?from=2&to=draft'],
      previewSheet: ['?layout=year-board'],
      printSheet: ['?layout=month-cards'],
      listAuditEvents: ['?limit=200'],
      listNotes: [...about('entry', looked), ...about('figure', askedFigures)],
      listAttachments: [
        ...about('entry', looked),
        ...about('figure', askedFigures),
        ...about('note', [note]),
      ],
    },
  };
}

/** Moons numbered by a figure's first morning. */
function moonsBy(figures: readonly LevelledFigure[]): string[] {
  return figures.map(({ markerKey }) => `?year=2027&marker=${markerKey}&phenomenon=heliacal-rising`);
}

function ledBy({ markerKey }: LevelledFigure): Partial<EntryInput> {
  const lead = { type: 'marker', markerKey, phenomenon: 'heliacal-rising', occurrence: 1 } as const;
  return { kind: 'belief', lead, offsets: entryInput().offsets };
}

/** The village's to write, to answer and to sign. */
function isVillages({ level, season }: Combination): boolean {
  return (level === 'open' || level === 'village') && season === 'none';
}

/** Of the village's level, whatever was agreed: voices and pictures belong to these. */
function isOfVillageAxis({ level, season }: Combination): boolean {
  return level === 'village' && season === 'none';
}

async function answer(by: Client, version: Version, { id }: { id: string }, said: object): Promise<void> {
  await by.put(`${versionPath(version)}/entries/${id}/answer`, said).expect(200);
}

/** On the open entry at every level; with the village on what was agreed about it in every way. */
async function addFiles(entries: readonly LevelledEntry[], circle: Circle, plant: Plant): Promise<string[]> {
  const open = expectFound(entries, plainAt('open'));
  const ids: string[] = [];
  for (const level of LEVELS) {
    ids.push(...(await addLevelledFiles(circle, { entryId: open.id, level }, plainAt(level), plant)));
  }
  for (const { id, ...seen } of entries.filter(isOfVillageAxis)) {
    if (seen.consent === 'nobody asked') continue;
    ids.push(...(await addLevelledFiles(circle, { entryId: id, level: 'village' }, seen, plant)));
  }
  return ids;
}

/** What the giver then said about each; a consent that there is says so in words of its own. */
async function settleConsents(
  giver: Client,
  entries: readonly LevelledEntry[],
  figures: readonly LevelledFigure[],
  plant: Plant,
): Promise<string[]> {
  const ids: string[] = [];
  for (const [itemType, things] of [
    ['entry', entries],
    ['figure', figures],
  ] as const) {
    for (const { id, ...thing } of things) {
      if (thing.consent === 'nobody asked' || thing.consent === 'paused') {
        await settleConsent(giver, itemType, id, thing);
        continue;
      }
      const said = agreed(plant(itemType === 'entry' ? 'consent' : 'figure consent', thing));
      const consentId = await settleConsent(giver, itemType, id, thing, said);
      if (consentId !== null && isLookedAt(thing) && itemType === 'entry') ids.push(consentId);
    }
  }
  return ids;
}

/** The words that somebody gives with their yes. */
function agreed(word: string): Partial<ConsentContent> {
  return { giverName: word, spokeFor: word, conditions: word, benefits: word, explainedBy: word };
}

function expectFound<T extends Combination>(things: readonly T[], wanted: Combination): T {
  const found = things.find(
    ({ level, season, consent }) =>
      level === wanted.level && season === wanted.season && consent === wanted.consent,
  );
  if (found === undefined) throw new Error(`Nothing was made at ${JSON.stringify(wanted)}`);
  return found;
}
