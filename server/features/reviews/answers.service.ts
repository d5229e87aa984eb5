import {
  answeredCount,
  entryOutcome,
  type AnswerFact,
  type ReviewedEntry,
  type ReviewState,
} from '#shared/calendar/sign-off.js';
import type {
  Answer,
  AnswerInput,
  ElderProgress,
  Outcome,
  SpokenAnswerInput,
} from '#shared/contracts/reviews.js';
import type { VersionEntry } from '#shared/contracts/versions.js';
import type { DataSource, EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import type { IncomingFile } from '../attachments/attachment-files.service.js';
import type { ProofsService } from '../attachments/proofs.service.js';
import type { CardSignInService } from '../cards/card-sign-in.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { personNames } from '../people/person-names.service.js';
import { answersHashes } from '../versions/answers-across-words.service.js';
import { frozenContent, frozenEntry, visibleVersion } from '../versions/frozen-content.service.js';
import { answersOf, readReviewState, reviewedVersion } from '../versions/review-state.service.js';
import { seenOfVersion, thingOf } from '../versions/seen-content.service.js';
import { evidenceOf } from './answer-evidence.js';
import { handOf } from './answer-hand.js';
import {
  expectNotOwn,
  expectUnsigned,
  findAnswer,
  recordAnswer,
  writeAnswer,
  type Asked,
} from './answer-writing.js';
import { toAnswer } from './reviews.mapper.js';
import { elderIdsOf } from './reviews.repository.js';

export interface AnswerList {
  items: Answer[];
  nextCursor: null;
  progress: ElderProgress[];
  outcomes: Outcome[];
}

/** Elders' words on entries. They belong to entry and content, and never move the state by themselves. */
export class AnswersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly pins: Pick<CardSignInService, 'provePin'>,
    private readonly proofs: Pick<ProofsService, 'keepWith'>,
  ) {}

  async list(actor: Actor, calendarId: string, number: number): Promise<AnswerList> {
    const { manager } = this.dataSource;
    const version = await visibleVersion(manager, actor, calendarId, number);
    const review = await readReviewState(manager, version);
    const seen = await this.seenEntries(manager, actor, version);
    const hashes = await answersHashes(manager, version.id);
    const reviewed = seen.map(({ entryId, hash }) => ({ entryId, hash: hashes.get(entryId) ?? hash }));
    const frozen = new Set(reviewed.map(({ entryId, hash }) => `${entryId} ${hash}`));
    const ownHash = new Map(seen.map(({ entryId, hash }) => [entryId, hash]));
    const given = await answersOf(manager, calendarId);
    const counted = new Set(review.answers.map(keyOf));
    const rows = given.filter(
      (row) => frozen.has(`${row.entryId} ${row.entryHash}`) && counted.has(keyOf(row)),
    );
    const elderIds = await elderIdsOf(manager, actor.communityId);
    const names = await personNames(manager, [
      ...elderIds,
      ...review.signatures.map(({ personId }) => personId),
      ...rows.flatMap(({ elderId, recordedBy }) => [elderId, recordedBy]),
    ]);
    const evidence = await evidenceOf(manager, await viewerOf(manager, actor, this.clock.now()), rows);
    return {
      items: rows.map((row) => ({
        ...toAnswer(row, names, actor.person.id, evidence(row)),
        entryHash: ownHash.get(row.entryId) ?? row.entryHash,
      })),
      nextCursor: null,
      outcomes: seen.map(({ entryId, hash, variants = [] }) => ({
        entryId,
        outcome: entryOutcome(
          { entryId, hash: hashes.get(entryId) ?? hash },
          review.answers,
          review.writerIds,
          variants.length > 0,
        ),
      })),
      progress: progressOf(review, elderIds, names).map((elder) =>
        elder.elderId === actor.person.id ? ownProgress(elder, reviewed, review) : elder,
      ),
    };
  }

  private async seenEntries(
    manager: EntityManager,
    actor: Actor,
    version: CalendarVersionEntity,
  ): Promise<VersionEntry[]> {
    const { header, entries } = await frozenContent(manager, version);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    return (await seenOfVersion(manager, viewer, version, header, entries)).entries;
  }

  /** A PIN is tried before anything else is done, so that a wrong one is counted. */
  async put(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    input: AnswerInput,
  ): Promise<Answer> {
    const pin = input.pin ?? null;
    const hand = handOf(actor, input, { pin: pin !== null, voice: false });
    if (hand.proof === 'pin') await this.pins.provePin(actor.communityId, hand.elderId, pin ?? '');
    return this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const row = await writeAnswer(asked, actor, this.clock.now(), hand, input);
      return this.describe(asked, actor, row);
    });
  }

  /** Another hand writes, and the elder's own voice proves it: a clip that is kept with the answer. */
  async putSpoken(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    input: SpokenAnswerInput,
    file: IncomingFile,
  ): Promise<Answer> {
    const { communityId } = actor;
    const hand = handOf(actor, { ...input, witness: null }, { pin: false, voice: true });
    const { elderId, recordedBy } = hand;
    if (recordedBy === null) throw conflict('no-proof-needed');
    // Whoever may not answer here is refused before anything is kept.
    await this.inReview(actor, calendarId, number, entryId, () => Promise.resolve());
    return this.proofs.keepWith('recording', file, (attach) =>
      this.inReview(actor, calendarId, number, entryId, async (asked) => {
        const { manager } = asked;
        const speaker = (await personNames(manager, [elderId])).get(elderId) ?? '';
        const about = { communityId, subjectType: 'answer', speaker, giverId: elderId, addedBy: recordedBy };
        const row = await writeAnswer(asked, actor, this.clock.now(), hand, input, (answerId) =>
          attach(manager, { ...about, subjectType: 'answer', subjectId: answerId }),
        );
        return this.describe(asked, actor, row);
      }),
    );
  }

  async takeBack(actor: Actor, calendarId: string, number: number, entryId: string): Promise<void> {
    await this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const row = await findAnswer(asked, actor.person.id);
      if (row === null) throw notFound();
      await expectUnsigned(asked, actor.person.id, 'already-signed');
      if (actor.helper !== undefined) expectNotOwn(row);
      await asked.manager.delete(AnswerEntity, { id: row.id });
      await recordAnswer(asked, actor, this.clock.now(), 'answer-taken-back', { answer: row.answer });
    });
  }

  /** Also open to an elder who has signed: it takes nothing back, it only stops being in the way. */
  async letStand(actor: Actor, calendarId: string, number: number, entryId: string): Promise<Answer> {
    return this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const row = await findAnswer(asked, actor.person.id);
      if (row?.answer !== 'change-this') throw conflict('no-change-asked');
      if (!row.letStand) {
        row.letStand = true;
        await asked.manager.update(AnswerEntity, { id: row.id }, { letStand: true });
        await recordAnswer(asked, actor, this.clock.now(), 'difference-let-stand', {});
      }
      return this.describe(asked, actor, row);
    });
  }

  private inReview<T>(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    work: (asked: Asked) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      const version = await reviewedVersion(manager, calendarId, number);
      const entry = await manager.findOneBy(VersionEntryEntity, { versionId: version.id, entryId });
      if (entry === null || !(await this.sees(manager, actor, entry))) throw notFound();
      return work({ manager, version, entry });
    });
  }

  /** What somebody does not see is not there to be answered, by themselves or for others. */
  private async sees(manager: EntityManager, actor: Actor, entry: VersionEntryEntity): Promise<boolean> {
    const thing = thingOf(frozenEntry(entry));
    const sight = await entrySight(manager, await viewerOf(manager, actor, this.clock.now()), [thing]);
    return sight.appearance(thing) === 'full';
  }

  private async describe({ manager, entry }: Asked, actor: Actor, row: AnswerEntity): Promise<Answer> {
    const names = await personNames(manager, [row.elderId, row.recordedBy]);
    const evidence = await evidenceOf(manager, await viewerOf(manager, actor, this.clock.now()), [row]);
    return { ...toAnswer(row, names, actor.person.id, evidence(row)), entryHash: entry.hash };
  }
}

function keyOf({ entryId, entryHash, elderId }: Omit<AnswerFact, 'answer' | 'letStand'>): string {
  return `${entryId} ${entryHash} ${elderId}`;
}

/** One's own count goes over everything that one sees, also what its people keep. */
function ownProgress(
  elder: ElderProgress,
  seen: readonly ReviewedEntry[],
  { answers }: ReviewState,
): ElderProgress {
  return { ...elder, answered: answeredCount(elder.elderId, seen, answers), of: seen.length };
}

/** Elders of today, and whoever signed as one and is none any more. */
function progressOf(
  review: ReviewState,
  elderIds: readonly string[],
  names: ReadonlyMap<string, string>,
): ElderProgress[] {
  const signed = new Set(
    review.signatures.filter(({ role }) => role === 'elder').map(({ personId }) => personId),
  );
  return [...new Set([...elderIds, ...signed])]
    .map((elderId) => ({
      elderId,
      elderName: names.get(elderId) ?? '',
      answered: answeredCount(elderId, review.entries, review.answers),
      of: review.entries.length,
      signed: signed.has(elderId),
      wroteTheDraft: review.writerIds.has(elderId),
    }))
    .sort((a, b) => (a.elderName === b.elderName ? 0 : a.elderName < b.elderName ? -1 : 1));
}
