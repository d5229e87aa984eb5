import type { LetterChoice, LetterChoiceInput } from '#shared/contracts/letters.js';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { LetterChoiceEntity } from '../../db/entities/letter-choice.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Person } from '../../http/actor.js';
import { stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { fromLetterChoice, toLetterChoice, USUAL_CHOICE } from './letters.mapper.js';

/** How people want to be asked. */
export class LetterChoicesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lettersOn: boolean,
  ) {}

  async read(person: Person): Promise<LetterChoice> {
    const choices = await letterChoicesOf(this.dataSource.manager, [person.id]);
    return { ...(choices.get(person.id) ?? USUAL_CHOICE), lettersOn: this.lettersOn };
  }

  async save(person: Person, input: LetterChoiceInput): Promise<LetterChoice> {
    return inTransaction(this.dataSource, async (manager) => {
      // The person's row is the lock: two first choices at once come one after the other.
      await manager.findOneOrFail(PersonEntity, {
        where: { id: person.id },
        lock: { mode: 'pessimistic_write' },
      });
      const before = (await letterChoicesOf(manager, [person.id])).get(person.id) ?? USUAL_CHOICE;
      if (before.version !== input.version) throw stale({ ...before, lettersOn: this.lettersOn }, input);
      const row = fromLetterChoice(input);
      if (before.version === 0) await manager.insert(LetterChoiceEntity, { personId: person.id, ...row });
      else await manager.update(LetterChoiceEntity, { personId: person.id }, row);
      await recordAudit(manager, {
        at: this.clock.now(),
        communityId: null,
        actorId: person.id,
        action: 'letters-chosen',
        subjectType: 'person',
        subjectId: person.id,
        details: { channel: input.channel, rhythm: input.rhythm, visitMe: input.visitMe },
      });
      const saved = await manager.findOneByOrFail(LetterChoiceEntity, { personId: person.id });
      return { ...toLetterChoice(saved), lettersOn: this.lettersOn };
    });
  }
}

/** Choices by person; whoever has chosen nothing is missing. */
export async function letterChoicesOf(
  manager: EntityManager,
  personIds: readonly string[],
): Promise<Map<string, LetterChoiceInput>> {
  const rows = await manager.findBy(LetterChoiceEntity, { personId: In([...personIds]) });
  return new Map(rows.map((row) => [row.personId, toLetterChoice(row)]));
}
