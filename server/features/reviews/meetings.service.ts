import type { MeetingInput, TypedMeeting } from '#shared/contracts/meetings.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { MeetingEntity } from '../../db/entities/meeting.entity.js';
import { SignatureEntity } from '../../db/entities/signature.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import type { IncomingFile } from '../attachments/attachment-files.service.js';
import type { ProofsService } from '../attachments/proofs.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { frozenEntry } from '../versions/frozen-content.service.js';
import { reviewedVersion } from '../versions/review-state.service.js';
import { thingOf } from '../versions/seen-content.service.js';
import { findAnswer, writeAnswer, type Asked } from './answer-writing.js';

/** Thumbs and marks on paper become answers, all or none of them, and the paper's picture is their proof. */
export class MeetingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly proofs: Pick<ProofsService, 'keepWith'>,
  ) {}

  async type(
    actor: Actor,
    calendarId: string,
    number: number,
    input: MeetingInput,
    picture: IncomingFile,
  ): Promise<TypedMeeting> {
    // What cannot be written is refused before a picture is kept.
    await this.inReview(calendarId, number, (manager, version) => this.look(manager, actor, version, input));
    return this.proofs.keepWith('picture', picture, (attach) =>
      this.inReview(calendarId, number, async (manager, version) => {
        const { open, stood } = await this.look(manager, actor, version, input);
        const { heldOn, witness } = input;
        const id = randomUUID();
        const { communityId, person } = actor;
        const now = this.clock.now();
        await manager.insert(MeetingEntity, {
          ...{ id, versionId: version.id, heldOn, witness },
          ...{ typedBy: person.id, typedAt: now },
        });
        await attach(manager, {
          ...{ communityId, subjectType: 'meeting', subjectId: id, speaker: '' },
          ...{ giverId: person.id, addedBy: person.id },
        });
        for (const { asked, word } of open) {
          const hand = { elderId: word.elderId, recordedBy: person.id, proof: 'paper', witness } as const;
          await writeAnswer(asked, actor, now, hand, word, () => Promise.resolve(id));
        }
        return { id, written: open.length, stood };
      }),
    );
  }

  /** What the paper says that may be written, and what stands as its elder gave it. */
  private async look(
    manager: EntityManager,
    actor: Actor,
    version: CalendarVersionEntity,
    { heldOn, answers }: MeetingInput,
  ) {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    if (heldOn > viewer.today) throw invalidField('heldOn', 'in-the-future');
    const rows = await manager.findBy(VersionEntryEntity, { versionId: version.id });
    const entries = new Map(rows.map((row) => [row.entryId, row]));
    const sight = await entrySight(
      manager,
      viewer,
      rows.map((row) => thingOf(frozenEntry(row))),
    );
    const signatures = await manager.findBy(SignatureEntity, { versionId: version.id, role: 'elder' });
    const signed = new Set(signatures.map(({ personId }) => personId));
    const open: { asked: Asked; word: MeetingInput['answers'][number] }[] = [];
    const stood: TypedMeeting['stood'] = [];
    for (const word of answers) {
      const entry = entries.get(word.entryId);
      if (entry === undefined || sight.appearance(thingOf(frozenEntry(entry))) !== 'full') throw notFound();
      const asked = { manager, version, entry };
      const before = await findAnswer(asked, word.elderId);
      const isOwn = before !== null && before.recordedBy === null;
      if (isOwn || signed.has(word.elderId)) stood.push({ elderId: word.elderId, entryId: word.entryId });
      else open.push({ asked, word });
    }
    if (open.length === 0) throw conflict('own-answer-stands');
    return { open, stood };
  }

  private inReview<T>(
    calendarId: string,
    number: number,
    work: (manager: EntityManager, version: CalendarVersionEntity) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      return work(manager, await reviewedVersion(manager, calendarId, number));
    });
  }
}
