import type { CalendarFileMedium } from '#shared/contracts/calendar-file.js';
import type { FileImport, MediumFault } from '#shared/contracts/imports.js';
import { randomUUID } from 'node:crypto';
import { rm } from 'node:fs/promises';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import { sha256OfFile } from '../../storage/file-hash.js';
import type { AttachmentFilesService, KeptFile } from '../attachments/attachment-files.service.js';
import type { ListedMediaService } from '../attachments/listed-media.service.js';
import type { KeptMedium, ReturningMediaService } from '../attachments/returning-media.service.js';
import type { CalendarArchive } from './calendar-archive.js';
import type { LandingEntry, LandMedia } from './landing.service.js';

/** A voice or a picture of the file that may come back today. */
export type ComingMedium = CalendarFileMedium & { keptParts: KeptMedium['parts'] };

export interface Looked {
  coming: ComingMedium[];
  /** Everything of which files may have been kept. */
  tried: ComingMedium[];
  unfit: FileImport['unfit'];
}

interface Looking {
  archive: CalendarArchive;
  /** A path of this machine at which nothing stands; one file after the other is put there. */
  besidePath: string;
  /** Whether what fits is kept at once; otherwise it is only looked at. */
  keeps: boolean;
}

/**
 * Voices and pictures that came with a calendar. A file comes back where the village itself lists that very file today, and
 * nowhere else: no voice is taken from a file because the file says whose it is.
 */
export class CarriedMediaService {
  constructor(
    private readonly listed: ListedMediaService,
    private readonly files: AttachmentFilesService,
    private readonly returning: ReturningMediaService,
  ) {}

  /**
   * Unpacks and looks at every file that may come, one at a time. What was kept is taken away again where something throws.
   * @param entryIds of the entries that come in, as the file calls them
   */
  async look(
    { communityId }: Actor,
    media: readonly CalendarFileMedium[],
    entryIds: readonly string[],
    looking: Looking,
  ): Promise<Looked> {
    const today = await this.listed.of(communityId, entryIds);
    const looked: Looked = { coming: [], tried: [], unfit: [] };
    try {
      for (const { medium: known } of inOrderOf(media, today)) {
        const said = media.find(({ attachmentId }) => attachmentId === known.attachmentId);
        if (said?.kind !== known.kind || said.entryId !== known.entryId) continue;
        if (said.parts.length === 0) continue;
        const medium: ComingMedium = { ...known, parts: said.parts, keptParts: [] };
        // Known before anything of it is kept, so that all of it is found again.
        looked.tried.push(medium);
        const fault = await this.takeIn(known, medium, looking);
        if (fault === null) looked.coming.push(medium);
        else if (fault !== 'stays') looked.unfit.push({ kind: known.kind, title: known.title, fault });
      }
      return looked;
    } catch (cause) {
      await this.remove(looked.tried);
      throw cause;
    }
  }

  /**
   * @param onStood hears of those that stand beside an entry now; a transaction that is tried again tells it anew
   */
  landing(
    actor: Actor,
    calendarId: string,
    coming: readonly ComingMedium[],
    onStood: (attachmentIds: ReadonlySet<string>) => void,
  ): LandMedia {
    return async (manager, entries) => {
      const newIdOf = newIds(entries);
      const stillListed = await this.stillListed(manager, actor, coming);
      // In the order of the file also where two were added at the same moment.
      const ids = coming.map(() => randomUUID()).toSorted();
      const stood: ComingMedium[] = [];
      for (const [index, medium] of coming.entries()) {
        const entryId = newIdOf.get(medium.entryId);
        const id = ids[index];
        if (entryId === undefined || id === undefined || !stillListed.has(medium.attachmentId)) continue;
        const standing = { calendarId, entryId, id };
        if (await this.returning.attach(manager, actor, keptOf(medium), standing)) stood.push(medium);
      }
      onStood(new Set(stood.map(({ attachmentId }) => attachmentId)));
      return countsOf(stood);
    };
  }

  remove(media: readonly ComingMedium[]): Promise<void> {
    return this.returning.remove(media.map(keptOf));
  }

  private async stillListed(
    manager: EntityManager,
    { communityId }: Actor,
    coming: readonly ComingMedium[],
  ): Promise<Set<string>> {
    const entryIds = coming.map(({ entryId }) => entryId);
    const rows = await this.listed.rows(manager, communityId, entryIds);
    return new Set(rows.map(({ row }) => row.id));
  }

  private async takeIn(
    known: CalendarFileMedium,
    medium: ComingMedium,
    { archive, besidePath, keeps }: Looking,
  ): Promise<MediumFault | 'stays' | null> {
    const kept: { part: number; file: KeptFile }[] = [];
    medium.keptParts = kept;
    for (const [index, { part, sha256 }] of medium.parts.entries()) {
      // From its first part on, as far as it was spoken then.
      if (part !== index + 1) return 'other-content';
      if (known.parts.find((each) => each.part === part)?.sha256 !== sha256) return 'other-content';
      if (!archive.has(sha256)) return 'missing';
      try {
        if (!(await archive.unpack(sha256, besidePath))) return 'other-content';
        const looked = await this.files.look(known.kind, besidePath);
        if (looked === null) return 'no-such-file';
        if ((await sha256OfFile(besidePath)) !== sha256) return 'other-content';
        if (keeps) kept.push({ part, file: await this.files.keepAgain(looked, sha256) });
      } finally {
        await rm(besidePath, { force: true });
      }
    }
    if (!keeps || known.kind === 'picture') return null;
    const clip = await this.returning.keepClip(known.attachmentId);
    if (clip === null) return 'stays';
    kept.push({ part: 0, file: clip });
    return null;
  }
}

export function countsOf(media: readonly Pick<CalendarFileMedium, 'kind'>[]) {
  const voices = media.filter(({ kind }) => kind === 'recording').length;
  return { voices, pictures: media.length - voices };
}

function inOrderOf<M extends { medium: CalendarFileMedium }>(
  media: readonly CalendarFileMedium[],
  known: readonly M[],
): M[] {
  const place = new Map(media.map(({ attachmentId }, index) => [attachmentId, index]));
  const placeOf = ({ medium }: M) => place.get(medium.attachmentId) ?? media.length;
  return known.toSorted((a, b) => placeOf(a) - placeOf(b));
}

function newIds(entries: readonly LandingEntry[]): Map<string, string> {
  return new Map(entries.flatMap(({ id, sameAs }) => (sameAs === null ? [] : [[sameAs, id]])));
}

function keptOf({ attachmentId, keptParts }: ComingMedium): KeptMedium {
  return { attachmentId, parts: keptParts };
}
