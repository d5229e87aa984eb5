import type { AuditAction } from '#shared/contracts/audit.js';
import {
  NOTE_ANSWERS_MAX,
  NOTES_PER_SUBJECT_MAX,
  type Note,
  type NoteAnswerInput,
  type NoteInput,
  type NoteSubject,
} from '#shared/contracts/notes.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { NoteAnswerEntity } from '../../db/entities/note-answer.entity.js';
import { NoteEntity } from '../../db/entities/note.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { figureIdOf } from '../../policy/entry-sight.js';
import { maySee, type Shared } from '../../policy/policy.js';
import { insertSharing, sharedById } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { voicesOfNotes, type NoteVoices } from '../attachments/note-voices.service.js';
import { recordAudit } from '../audit/audit.service.js';
import { personNames } from '../people/person-names.service.js';
import { hasQuote, notedTexts, type NotedTexts } from './note-subjects.service.js';
import { toNote } from './notes.mapper.js';

interface SeenNote {
  row: NoteEntity;
  shared: Shared;
  voices: NoteVoices;
}

/**
 * Remarks pinned to things. A note is seen by those who see its subject now and whom its own level names: it can be
 * narrower than what it is about, and never wider. Closing and opening is its writer's alone.
 */
export class NotesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, { subjectType, subjectId }: NoteSubject): Promise<Note[]> {
    const { manager } = this.dataSource;
    const { communityId } = actor;
    await this.expectSubject(manager, actor, { subjectType, subjectId });
    const rows = await manager.find(NoteEntity, {
      where: { communityId, subjectType, subjectId },
      order: { writtenAt: 'ASC', id: 'ASC' },
    });
    return this.describe(manager, actor, rows);
  }

  async add(actor: Actor, { level, isSpoken: _isSpoken, ...input }: NoteInput): Promise<Note> {
    const { communityId, person } = actor;
    const { subjectType, subjectId } = input;
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      const texts = await this.expectSubject(manager, actor, input);
      const { pin } = input;
      if (pin.at === 'words' && !texts.some((each) => hasQuote(each, pin.field, pin.quote))) {
        throw invalidField('pin', 'words-not-there');
      }
      const count = await manager.countBy(NoteEntity, { communityId, subjectType, subjectId });
      if (count >= NOTES_PER_SUBJECT_MAX) throw conflict('too-many-notes');
      const writtenAt = this.clock.now();
      await manager.insert(NoteEntity, {
        id,
        communityId,
        ...input,
        authorId: person.id,
        typedBy: actor.helper?.id ?? null,
        writtenAt,
        closedAt: null,
      });
      await insertSharing(manager, {
        itemType: 'note',
        itemId: id,
        communityId,
        level,
        details: PLAIN_DETAILS,
        giverId: person.id,
      });
      await this.record(manager, actor, 'note-added', { id, ...input });
      return this.one(manager, actor, id);
    });
  }

  async answer(actor: Actor, noteId: string, { text }: NoteAnswerInput): Promise<Note> {
    return this.write(actor, noteId, async (manager, row) => {
      if (row.closedAt !== null) throw conflict('note-closed');
      if ((await manager.countBy(NoteAnswerEntity, { noteId })) >= NOTE_ANSWERS_MAX) {
        throw conflict('too-many-notes');
      }
      const writtenAt = this.clock.now();
      await manager.insert(NoteAnswerEntity, {
        id: randomUUID(),
        noteId,
        text,
        authorId: actor.person.id,
        typedBy: actor.helper?.id ?? null,
        writtenAt,
      });
      await this.record(manager, actor, 'note-answered', row);
    });
  }

  async close(actor: Actor, noteId: string): Promise<Note> {
    return this.setClosed(actor, noteId, this.clock.now());
  }

  async reopen(actor: Actor, noteId: string): Promise<Note> {
    return this.setClosed(actor, noteId, null);
  }

  private async setClosed(actor: Actor, noteId: string, closedAt: Date | null): Promise<Note> {
    return this.write(actor, noteId, async (manager, row) => {
      if (row.authorId !== actor.person.id) throw conflict('not-the-writer');
      if ((row.closedAt === null) === (closedAt === null)) return;
      await manager.update(NoteEntity, { id: noteId }, { closedAt });
      await this.record(manager, actor, closedAt === null ? 'note-reopened' : 'note-closed', row);
    });
  }

  private write(
    actor: Actor,
    noteId: string,
    work: (manager: EntityManager, row: NoteEntity) => Promise<void>,
  ): Promise<Note> {
    return inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOne(NoteEntity, {
        where: { id: noteId, communityId: actor.communityId },
        lock: { mode: 'pessimistic_write' },
      });
      if (row === null) throw notFound();
      await this.expectSubject(manager, actor, row);
      if ((await this.seen(manager, actor, [row])).length === 0) throw notFound();
      await work(manager, row);
      return this.one(manager, actor, noteId);
    });
  }

  /** Somebody who does not see what a note is about learns nothing of it, nor whether there is one. */
  private async expectSubject(
    manager: EntityManager,
    actor: Actor,
    subject: NoteSubject,
  ): Promise<NotedTexts[]> {
    const texts = await notedTexts(manager, await this.viewer(manager, actor), subject);
    if (texts === null) throw notFound();
    return texts;
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }

  /** A note that was to be spoken is its writer's alone until it has been. */
  private async seen(manager: EntityManager, actor: Actor, rows: readonly NoteEntity[]): Promise<SeenNote[]> {
    const viewer = await this.viewer(manager, actor);
    const ids = rows.map(({ id }) => id);
    const shared = await sharedById(manager, 'note', ids);
    const voicesOf = await voicesOfNotes(manager, viewer, ids);
    return rows.flatMap((row) => {
      const own = shared.get(row.id);
      const voices = voicesOf(row.id);
      if (own === undefined || !maySee(viewer, own)) return [];
      if (row.text === '' && !voices.isSaid && row.authorId !== viewer.personId) return [];
      return [{ row, shared: own, voices }];
    });
  }

  private async one(manager: EntityManager, actor: Actor, id: string): Promise<Note> {
    const [note] = await this.describe(manager, actor, [await manager.findOneByOrFail(NoteEntity, { id })]);
    if (!note) throw notFound();
    return note;
  }

  private async describe(manager: EntityManager, actor: Actor, rows: readonly NoteEntity[]): Promise<Note[]> {
    const seen = await this.seen(manager, actor, rows);
    const answers = await manager.find(NoteAnswerEntity, {
      where: { noteId: In(seen.map(({ row }) => row.id)) },
      order: { writtenAt: 'ASC', id: 'ASC' },
    });
    const viewer = await this.viewer(manager, actor);
    const newest = await this.newestTexts(manager, actor, rows);
    const names = await personNames(manager, [
      ...seen.flatMap(({ row }) => [row.authorId, row.typedBy]),
      ...answers.flatMap(({ authorId, typedBy }) => [authorId, typedBy]),
    ]);
    return seen.map(({ row, shared, voices }) =>
      toNote({
        row,
        shared,
        viewer,
        wordsStand: row.pin.at !== 'words' || hasQuote(newest, row.pin.field, row.pin.quote),
        voices: voices.heard,
        names,
        answers: answers.filter(({ noteId }) => noteId === row.id),
      }),
    );
  }

  /** Notes are read one subject at a time: whether quoted words stand is asked of its text as it is now. */
  private async newestTexts(
    manager: EntityManager,
    actor: Actor,
    [first]: readonly NoteEntity[],
  ): Promise<NotedTexts | undefined> {
    return first === undefined ? undefined : (await this.expectSubject(manager, actor, first))[0];
  }

  /** In the records it belongs to what it is about, so that it shows there to the same people. */
  private async record(
    manager: EntityManager,
    actor: Actor,
    action: AuditAction,
    { id, subjectType, subjectId }: NoteSubject & { id: string },
  ): Promise<void> {
    const figureId = subjectType === 'marker' ? figureIdOf(subjectId) : null;
    const subject =
      subjectType === 'marker'
        ? ({ type: figureId === null ? 'note' : 'figure', id: figureId ?? id } as const)
        : { type: subjectType, id: subjectId };
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: subject.type,
      subjectId: subject.id,
      details: { noteId: id },
    });
  }
}
