import type { NoNameInput } from '#shared/contracts/open-page.js';
import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { NoNameEntity } from '../../db/entities/no-name.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { namesFoundIn } from './names-found.service.js';
import { newestPublished } from './newest-published.service.js';
import { toOpenEntry } from './open-page.mapper.js';

/** What was taken for somebody's name and is none: said for one name in certain words of one entry. */
export class NoNamesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly contents: FrozenContentService,
  ) {}

  /** Counts only for what whoever says it has seen; what was said already stays as it was said. */
  async say(actor: Actor, { entryId, word, key }: NoNameInput): Promise<void> {
    const { communityId, person } = actor;
    await this.expectFound(actor, { entryId, word, key });
    const saidAt = this.clock.now();
    await inTransaction(this.dataSource, async (manager) => {
      const about = { entryId, word, foundKey: key };
      const row = { id: randomUUID(), ...about, saidBy: person.id, saidAt };
      await manager.createQueryBuilder().insert().into(NoNameEntity).values(row).orIgnore().execute();
      if (!(await manager.existsBy(NoNameEntity, { id: row.id }))) return;
      await recordAudit(manager, {
        ...{ at: saidAt, communityId, actorId: person.id, action: 'no-name-said' },
        ...{ subjectType: 'entry', subjectId: entryId, details: { word } },
      });
    });
  }

  /** What is taken back already stays so. */
  async takeBack({ communityId, person }: Actor, noNameId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOneBy(NoNameEntity, {
        id: noNameId,
        entry: { calendar: { communityId } },
      });
      if (row === null || (await manager.delete(NoNameEntity, { id: row.id })).affected !== 1) return;
      await recordAudit(manager, {
        ...{ at: this.clock.now(), communityId, actorId: person.id, action: 'no-name-taken-back' },
        ...{ subjectType: 'entry', subjectId: row.entryId, details: { word: row.word } },
      });
    });
  }

  private async expectFound({ communityId }: Actor, { entryId, word, key }: NoNameInput): Promise<void> {
    const { manager } = this.dataSource;
    const newest = await newestPublished(manager, communityId);
    if (newest === null) throw conflict('no-such-name-there');
    const content = await this.contents.readForEverybody(communityId, newest);
    const foundIn = await namesFoundIn(manager, communityId, content);
    const entry = content.open.find((each) => each.entry.entryId === entryId)?.entry;
    const found = entry === undefined ? [] : foundIn(toOpenEntry(entry));
    if (!found.some((each) => each.word === word && each.key === key)) throw conflict('no-such-name-there');
  }
}
