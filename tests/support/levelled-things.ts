import type { FigureInput } from '#shared/contracts/figures.js';
import type { VariantInput } from '#shared/contracts/variants.js';
import sharp from 'sharp';
import { CONSENTS, type Combination } from '../../docker-free-scripts/lib/visibility-rules.js';
import { addPicture, addRecording } from './attachment-api.js';
import type { Client, TestApi } from './api.js';
import { setRoles } from './calendar-api.js';
import { addFigure } from './figure-api.js';
import { sharingOf, type Circle } from './levelled-entries.js';
import type { Plant } from './levelled-village.js';
import { randomFrom } from './seeded-random.js';
import { addSign } from './sign-api.js';
import { addVariant } from './variant-api.js';

/** Of figures and files there is one for each value of an axis; entries have all combinations. */
const PLAIN: Combination = { level: 'village', season: 'none', consent: 'nobody asked' };
export const plainAt = (level: Combination['level']): Combination => ({ ...PLAIN, level });
export const VILLAGE_THINGS: readonly Combination[] = [
  ...CONSENTS.filter((consent) => consent !== 'nobody asked').map((consent) => ({
    ...PLAIN,
    consent,
  })),
  ...(['inside', 'outside'] as const).map((season) => ({ ...PLAIN, season })),
];

export interface LevelledFigure extends Combination {
  id: string;
  markerKey: string;
}

/** Figures are the officers' to write down; the giver is one for a moment. The village's own has a story of its elders. */
export async function addLevelledFigures(
  api: TestApi,
  circle: Circle,
  combinations: readonly Combination[],
  plant: Plant,
): Promise<LevelledFigure[]> {
  const { giver } = circle;
  const figures: LevelledFigure[] = [];
  await setRoles(api, giver, ['elder', 'officer']);
  for (const combination of combinations) {
    const word = plant('figure', combination);
    const { consent, level, season } = combination;
    const isPlain = consent === 'nobody asked' && level === 'village' && season === 'none';
    const story = isPlain ? plant('story', plainAt('elders')) : word;
    const input: Partial<FigureInput> = {
      names: [{ tag: 'en', name: word }],
      story,
      variants: [{ toldBy: story, text: story }],
      sharingLevel: level,
      sharing: sharingOf(combination, circle),
      ...(isPlain ? { storyLevel: 'elders' } : {}),
    };
    const { id, markerKey } = await addFigure(giver, input);
    figures.push({ ...combination, id, markerKey });
  }
  await setRoles(api, giver, ['elder']);
  return figures;
}

/** Signs of the village's list are the officers' to write down, as figures are. */
export async function addLevelledSigns(
  api: TestApi,
  circle: Circle,
  combinations: readonly Combination[],
  plant: Plant,
): Promise<string[]> {
  const { giver } = circle;
  const ids: string[] = [];
  await setRoles(api, giver, ['elder', 'officer']);
  for (const combination of combinations) {
    const word = plant('sign', combination);
    const said = { name: word, look: word, where: word, sharingLevel: combination.level };
    ids.push((await addSign(giver, { ...said, sharing: sharingOf(combination, circle) })).id);
  }
  await setRoles(api, giver, ['elder']);
  return ids;
}

/** Another keeper's timing beside an entry. `seen` is the narrower of its own level and of the entry's. */
export async function addLevelledVariant(
  giver: Client,
  calendarId: string,
  entryId: string,
  sharingLevel: VariantInput['sharingLevel'],
  word: string,
): Promise<string> {
  const said = { giver: word, note: word, otherSigns: word, ifLate: word };
  return (await addVariant(giver, calendarId, entryId, { ...said, sharingLevel })).variantId;
}

/** A voice and a picture on an entry. A voice holds its word; bytes of the drawn picture are the picture's own. */
export async function addLevelledFiles(
  { giver, ...circle }: Circle,
  subject: { entryId: string; level: Combination['level'] },
  seen: Combination,
  plant: Plant,
): Promise<string[]> {
  const shared = {
    ...{ subjectType: 'entry' as const, subjectId: subject.entryId, sharingLevel: subject.level },
    sharing: sharingOf(plainAt(subject.level), { giver, ...circle }),
  };
  const title = plant('recording', seen);
  const recording = await addRecording(giver, subject.entryId, { ...shared, title, speaker: title }, [
    plant('sound', seen),
  ]);
  const named = plant('picture title', seen);
  const file = await grainyPicture(named);
  const { id } = await addPicture(giver, subject.entryId, { ...shared, title: named }, file);
  plant('picture', seen, await grainOf(giver, `/api/attachments/${id}/parts/1`));
  plant('thumbnail', seen, await grainOf(giver, `/api/attachments/${id}/thumbnail`));
  return [recording.id, id];
}

/** No two look alike. */
function grainyPicture(name: string): Promise<Buffer> {
  const side = 40;
  const grain = randomFrom(Number(/\d+/u.exec(name)?.[0] ?? '0'));
  const pixels = Buffer.from(Array.from({ length: side * side * 3 }, () => Math.floor(grain() * 256)));
  return sharp(pixels, { raw: { width: side, height: side, channels: 3 } })
    .png()
    .toBuffer();
}

/** Some bytes from the middle of the picture as it is served. */
async function grainOf(client: Client, path: string): Promise<string> {
  const { body } = (await client.get(path).expect(200)) as { body: Buffer };
  const middle = Math.floor(body.length / 2);
  return body.subarray(middle, middle + 32).toString('latin1');
}
