import type { Device } from '#shared/contracts/session.js';
import { MoreThan, Not, type DataSource, type EntityManager, type FindOptionsWhere } from 'typeorm';
import { SessionEntity } from '../../db/entities/session.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Person } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { toDevice } from './devices.mapper.js';

/** Where a person is signed in. A device goes by the hash of its session's id, which opens nothing. */
export class DevicesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(person: Person, hereHash: string): Promise<Device[]> {
    const rows = await this.dataSource.getRepository(SessionEntity).find({
      where: { personId: person.id, expiresAt: MoreThan(this.clock.now()) },
      order: { expiresAt: 'DESC', sidHash: 'ASC' },
    });
    return rows.map((row) => toDevice(row, hereHash));
  }

  /** Somebody else's session is none of the person's devices, so nothing happens to it. */
  async end(person: Person, sidHash: string): Promise<void> {
    await this.remove(person, { sidHash });
  }

  async endOthers(person: Person, hereHash: string): Promise<void> {
    await this.remove(person, { sidHash: Not(hereHash) });
  }

  private async remove(person: Person, which: FindOptionsWhere<SessionEntity>): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { affected } = await manager.delete(SessionEntity, { ...which, personId: person.id });
      if ((affected ?? 0) > 0) await this.record(manager, person, affected ?? 0);
    });
  }

  private record(manager: EntityManager, person: Person, count: number): Promise<void> {
    return recordAudit(manager, {
      at: this.clock.now(),
      communityId: null,
      actorId: person.id,
      action: 'devices-signed-out',
      subjectType: 'person',
      subjectId: person.id,
      details: { count },
    });
  }
}
