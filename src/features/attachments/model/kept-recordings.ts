import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { AttachmentInput, AttachmentSubject } from '#shared/contracts/attachments.js';

/** Who may see it, and whose it is. */
export type SharingOfAttachment = Pick<AttachmentInput, 'sharingLevel' | 'sharing' | 'giverId'>;

/** A recording that is on this device and has not been sent. */
export interface KeptRecording extends AttachmentSubject, SharingOfAttachment {
  clientId: string;
  personId: string;
  communityId: string;
  title: string;
  speaker: string;
  language: string;
  mimeType: string;
  /** ISO instant. */
  beganAt: string;
}

/** Part 0 is the spoken consent. */
export interface KeptPart {
  part: number;
  content: Blob;
  seconds: number;
}

interface KeptSlice {
  clientId: string;
  part: number;
  index: number;
  /** Plain bytes: not every browser stores Blobs well. */
  bytes: ArrayBuffer;
  seconds: number;
}

interface Schema extends DBSchema {
  recording: { key: string; value: KeptRecording; indexes: { person: string } };
  slice: { key: [string, number, number]; value: KeptSlice };
}

const NAME = 'dawnpeg.recordings';
let opened: Promise<IDBPDatabase<Schema>> | null = null;

function database(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>(NAME, 1, {
    upgrade: (db) => {
      db.createObjectStore('recording', { keyPath: 'clientId' }).createIndex('person', 'personId');
      db.createObjectStore('slice', { keyPath: ['clientId', 'part', 'index'] });
    },
    terminated: () => {
      opened = null;
    },
  }).catch((cause: unknown) => {
    opened = null;
    throw cause;
  });
  return opened;
}

/** Begins one, or keeps what was changed about it. */
export async function keepRecording(recording: KeptRecording): Promise<void> {
  await (await database()).put('recording', recording);
}

export async function keepSlice(
  clientId: string,
  slice: { part: number; index: number; content: Blob; seconds: number },
): Promise<void> {
  const { part, index, seconds } = slice;
  const bytes = await slice.content.arrayBuffer();
  await (await database()).put('slice', { clientId, part, index, bytes, seconds });
}

/** What was recorded, part by part, as far as it was kept. */
export async function keptParts({ clientId, mimeType }: KeptRecording): Promise<KeptPart[]> {
  const slices = await (await database()).getAll('slice', everythingOf(clientId));
  const parts = new Map<number, KeptSlice[]>();
  for (const slice of slices) parts.set(slice.part, [...(parts.get(slice.part) ?? []), slice]);
  return [...parts].map(([part, own]) => ({
    part,
    content: new Blob(
      own.map(({ bytes }) => bytes),
      { type: mimeType },
    ),
    seconds: own.at(-1)?.seconds ?? 0,
  }));
}

/** Recordings of a person on this device that belong to a thing, oldest first. */
export async function keptRecordings(personId: string, subject: AttachmentSubject): Promise<KeptRecording[]> {
  const all = await (await database()).getAllFromIndex('recording', 'person', personId);
  return all
    .filter(
      ({ subjectType, subjectId }) => subjectType === subject.subjectType && subjectId === subject.subjectId,
    )
    .sort((a, b) => a.beganAt.localeCompare(b.beganAt));
}

export async function hasKeptRecordings(personId: string): Promise<boolean> {
  return (await (await database()).countFromIndex('recording', 'person', personId)) > 0;
}

/** Everything of a person: they leave a device that is not theirs. */
export async function dropEverythingOf(personId: string): Promise<void> {
  const all = await (await database()).getAllFromIndex('recording', 'person', personId);
  for (const { clientId } of all) await dropRecording(clientId);
}

/** Takes away one part: what was said is said anew. */
export async function dropPart(clientId: string, part: number): Promise<void> {
  await (
    await database()
  ).delete('slice', IDBKeyRange.bound([clientId, part, 0], [clientId, part, Infinity]));
}

/** Once it is sent, or thrown away. */
export async function dropRecording(clientId: string): Promise<void> {
  const work = (await database()).transaction(['recording', 'slice'], 'readwrite');
  await Promise.all([
    work.objectStore('recording').delete(clientId),
    work.objectStore('slice').delete(everythingOf(clientId)),
    work.done,
  ]);
}

function everythingOf(clientId: string): IDBKeyRange {
  return IDBKeyRange.bound([clientId, 0, 0], [clientId, Infinity, Infinity]);
}

/** What belongs to things that were taken back, whoever recorded it on this device. */
export async function dropRecordingsOf(goneIds: ReadonlySet<string>): Promise<void> {
  const all = await (await database()).getAll('recording');
  const gone = all.filter(
    ({ clientId, subjectId }) => goneIds.has(clientId) || [...goneIds].some((id) => subjectId.includes(id)),
  );
  for (const { clientId } of gone) await dropRecording(clientId);
}
