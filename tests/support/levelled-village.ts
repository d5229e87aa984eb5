import { randomUUID } from 'node:crypto';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ConsentContent } from '#shared/contracts/consents.js';
import type { FigureInput } from '#shared/contracts/figures.js';
import { PLAIN_DETAILS, SHARED_ITEM_TYPES, type SharingChange } from '#shared/contracts/sharing.js';
import type { Client, TestApi } from './api.js';
import {
  addEntry,
  beginCalendar,
  entryInput,
  openVillage,
  publish,
  says,
  setRoles,
  submit,
  versionPath,
  type Village,
} from './calendar-api.js';
import type { Variant, VariantInput } from '#shared/contracts/variants.js';
import { variantInput } from './variant-api.js';
import { addConsent } from './consent-api.js';
import { addRecording } from './attachment-api.js';
import { addFigure, figureInput } from './figure-api.js';
import { addNote } from './notes-api.js';
import { addGroup, details } from './sharing-api.js';

/** A word that stands in one thing alone, and who may read it on the test's day. */
export interface Planted {
  word: string;
  where: string;
  for: ReadonlySet<string>;
}

export interface LevelledVillage extends Village {
  staff: Client;
  observer: Client;
  officer2: Client;
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
}

const OFFICE = ['steward', 'officer', 'giver', 'heir', 'weaver'];
const VILLAGE = [...OFFICE, 'staff', 'observer of the group'];

/**
 * A village with an entry and a figure at every level, published as far as their people agreed, and a second
 * submission in review. The giver of all that is kept is elder A-1; A-2 is their successor; A-3 and an observer
 * belong with them to a group.
 */
export async function furnishLevels(api: TestApi): Promise<LevelledVillage> {
  await api.reset();
  const village = await openVillage(api);
  const [staff, observer, officer2] = await Promise.all([
    api.signIn('staff'),
    api.signIn('observer'),
    api.signIn('officer2'),
  ]);
  const { elder, elder2, elder3, officer } = village;
  const planted: Planted[] = [];
  const plant = (where: string, seers: readonly string[]): string => {
    const word = `Zq${planted.length}xw${where.replace(/\W/gu, '')}`;
    planted.push({ word, where, for: new Set(seers) });
    return word;
  };
  const group = await addGroup(elder, 'Weavers', [elder, elder3, observer]);
  const calendar = await beginCalendar(village);
  const wordy = (word: string): Partial<EntryInput> => ({
    titleOfficer: `Do ${word}`,
    titleVillage: word,
    notes: word,
    caution: word,
    otherSigns: word,
    ifLate: word,
    giver: word,
  });
  const give = (where: string, by: Client, seers: readonly string[], changes: Partial<EntryInput>) =>
    addEntry(by, calendar.id, { ...wordy(plant(where, seers)), ...changes });

  const figures = {
    village: await addFigure(
      officer,
      named(plant('village figure', VILLAGE), plant('elders story', ['giver', 'officer', 'heir', 'weaver']), {
        storyLevel: 'elders',
      }),
    ),
    group: await addFigureBy(
      api,
      elder,
      { sharingLevel: 'group', sharing: details({ groupId: group.id }) },
      plant('group figure', ['giver', 'weaver', 'observer of the group']),
    ),
    elders: await addFigureBy(
      api,
      elder,
      { sharingLevel: 'elders' },
      plant('elders figure', ['giver', 'heir', 'weaver']),
    ),
  };
  const open = await give('open entry', officer, VILLAGE, { sharingLevel: 'open' });
  await give('village entry', officer, VILLAGE, { sharingLevel: 'village' });
  const kept = [
    await give('group entry', elder, ['giver', 'weaver', 'observer of the group'], {
      sharingLevel: 'group',
      sharing: details({ groupId: group.id }),
    }),
    await give('elders entry', elder, ['giver', 'heir', 'weaver'], {
      sharingLevel: 'elders',
      kind: 'belief',
    }),
    await give('sealed entry', elder, ['giver', 'heir'], {
      sharingLevel: 'sealed',
      sharing: details({ successorId: elder2.personId }),
    }),
    await give('season entry', elder, ['giver'], {
      sharingLevel: 'village',
      sharing: details({ tellingSeason: { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } } }),
    }),
    await give('entry by a kept figure', elder, ['giver', 'heir', 'weaver'], {
      sharingLevel: 'elders',
      lead: {
        type: 'marker',
        markerKey: figures.elders.markerKey,
        phenomenon: 'heliacal-rising',
        occurrence: 1,
      },
    }),
  ];
  const variant = async (
    where: string,
    entryId: string,
    seers: readonly string[],
    level: VariantInput['sharingLevel'],
  ) => {
    const word = plant(where, seers);
    const path = `/api/calendars/${calendar.id}/entries/${entryId}/variants`;
    const body = variantInput({
      giver: word,
      note: word,
      otherSigns: word,
      ifLate: word,
      sharingLevel: level,
    });
    return (await elder.post(path, body).expect(201)).body as Variant;
  };
  const variants = [
    await variant('village variant', open.id, VILLAGE, 'village'),
    await variant('elders variant', open.id, ['giver', 'heir', 'weaver'], 'elders'),
    await variant('variant of a kept entry', kept[1]?.id ?? '', ['giver', 'heir', 'weaver'], 'village'),
  ];
  const first = await submit(officer, calendar.id);
  for (const entry of kept) {
    for (const client of [elder, elder2, elder3]) {
      await client.put(`${versionPath(first)}/entries/${entry.id}/answer`, says());
    }
  }
  const published = await publish(village, first);
  await give('later entry', officer, OFFICE, { sharingLevel: 'village' });
  const reviewed = await submit(officer, calendar.id);
  for (const entry of kept) {
    const word = plant(`answer on ${entry.content.sharingLevel} ${kept.indexOf(entry)}`, [
      'giver',
      ...answerers(entry.content),
    ]);
    await elder.put(
      `${versionPath(reviewed)}/entries/${entry.id}/answer`,
      says({ answer: 'change-this', note: word }),
    );
  }
  const consents = [
    await addConsent(officer, 'entry', open.id, {
      ...agreed(plant('consent on the open entry', OFFICE)),
      uses: ['keep', 'show', 'print'],
    }),
    await addConsent(elder, 'figure', figures.elders.id, {
      ...agreed(plant('consent on the elders figure', ['giver', 'heir', 'weaver'])),
      giverId: elder.personId,
    }),
  ];
  for (const entry of kept) {
    const { sharingLevel } = entry.content;
    const word = plant(`consent on ${sharingLevel} ${kept.indexOf(entry)}`, [
      'giver',
      ...answerers(entry.content),
    ]);
    consents.push(await addConsent(elder, 'entry', entry.id, { ...agreed(word), giverId: elder.personId }));
  }
  const [openEntry] = reviewed.entries;
  const recordings = [];
  for (const [level, seers, changes] of [
    ['village', VILLAGE, {}],
    ['elders', ['giver', 'heir', 'weaver'], {}],
    ['group', ['giver', 'weaver', 'observer of the group'], { groupId: group.id }],
    ['sealed', ['giver', 'heir'], { successorId: elder2.personId }],
  ] as const) {
    const title = plant(`${level} recording`, seers);
    recordings.push(
      await addRecording(elder, openEntry?.entryId ?? '', {
        ...{ subjectType: 'entry', title, speaker: title, sharingLevel: level, sharing: details(changes) },
      }),
    );
  }
  for (const [index, entry] of [open, ...kept].entries()) {
    const { sharingLevel } = entry.content;
    const seers = entry === open ? VILLAGE : ['giver', ...readers(entry.content)];
    await addNote(elder, { subjectId: entry.id, text: plant(`note on ${sharingLevel} ${index}`, seers) });
  }
  const forElders = plant('note for the elders', ['giver', 'heir', 'weaver']);
  await addNote(elder, { subjectId: open.id, text: forElders, level: 'elders' });
  await addNote(elder, {
    ...{ subjectType: 'figure', subjectId: figures.elders.id },
    text: plant('note on the elders figure', ['giver', 'heir', 'weaver']),
  });
  const numbers = [String(published.number), String(reviewed.number)];
  const [sealed] = kept.slice(2);
  return {
    ...village,
    ...{ staff, observer, officer2, planted },
    calendarId: calendar.id,
    publishedNumber: published.number,
    reviewedNumber: reviewed.number,
    hiddenEntryId: sealed?.id ?? '',
    hiddenFigureId: figures.elders.id,
    content: entryInput(),
    figure: figureInput(),
    sharingChange: { sharing: { level: 'sealed', ...PLAIN_DETAILS }, version: 1 },
    params: {
      communityId: [officer.communityId],
      placeId: [village.placeId],
      calendarId: [calendar.id],
      entryId: [open, ...kept].map(({ id }) => id),
      number: [...numbers, 'draft'],
      figureId: Object.values(figures).map(({ id }) => id),
      markerKey: Object.values(figures).map(({ markerKey }) => markerKey),
      itemType: [...SHARED_ITEM_TYPES],
      itemId: [...kept, ...Object.values(figures), ...recordings].map(({ id }) => id),
      groupId: [group.id],
      variantId: variants.map(({ variantId }) => variantId),
      consentId: consents.map(({ id }) => id),
      noteId: [randomUUID()],
      withdrawalId: [randomUUID()],
      attachmentId: recordings.map(({ id }) => id),
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
      findMarkers: ['?year=2027&from=06-10', '?year=2027&from=01-10', '?year=2027&from=10-10'],
      readDrift: ['?from=1500&to=2027'],
      exportDriftCsv: ['?from=1500&to=2027'],
      readLook: Object.values(figures).map(({ markerKey }) => `?marker=${markerKey}&date=2027-06-10`),
      printLook: Object.values(figures).map(({ markerKey }) => `?marker=${markerKey}&date=2027-06-10`),
      compareVersions: [`?from=1&to=2`, '?from=1&to=draft', '?from=2&to=draft'],
      readSheet: ['?layout=month-cards', '?layout=year-board'],
      printSheet: ['?layout=month-cards'],
      listAuditEvents: ['?limit=200'],
      listNotes: [open, ...kept, ...Object.values(figures)].map(
        ({ id }) =>
          `?subjectType=${Object.values(figures).some((one) => one.id === id) ? 'figure' : 'entry'}&subjectId=${id}`,
      ),
      listAttachments: [{ id: openEntry?.entryId ?? '' }, ...kept, ...Object.values(figures)].map(
        ({ id }) =>
          `?subjectType=${Object.values(figures).some((figure) => figure.id === id) ? 'figure' : 'entry'}&subjectId=${id}`,
      ),
    },
  };
}

/** The words that somebody gives with their yes. */
function agreed(word: string): Partial<ConsentContent> {
  return { giverName: word, spokeFor: word, conditions: word, benefits: word, explainedBy: word };
}

/** Who reads a published entry besides its giver. */
function readers(content: EntryInput): string[] {
  const group = content.sharingLevel === 'group' ? ['observer of the group'] : [];
  return [...answerers(content), ...group];
}

/** Who reads what an elder said about an entry: its own people who see reviews. */
function answerers({ sharingLevel, sharing }: EntryInput): string[] {
  if (sharing?.tellingSeason) return [];
  return { open: OFFICE, village: OFFICE, group: ['weaver'], elders: ['heir', 'weaver'], sealed: ['heir'] }[
    sharingLevel
  ];
}

function named(word: string, story: string, changes: Partial<FigureInput>): Partial<FigureInput> {
  return {
    names: [{ tag: 'en', name: word }],
    story,
    variants: [{ toldBy: story, text: story }],
    ...changes,
  };
}

/** Figures are the officers' to write down; here an elder is one for a moment. */
async function addFigureBy(api: TestApi, elder: Client, changes: Partial<FigureInput>, word: string) {
  await setRoles(api, elder, ['elder', 'officer']);
  const figure = await addFigure(elder, named(word, word, changes));
  await setRoles(api, elder, ['elder']);
  return figure;
}
