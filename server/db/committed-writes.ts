import type { DataSource, EntitySubscriberInterface, InsertEvent, QueryRunner } from 'typeorm';
import { AuditEventEntity } from './entities/audit-event.entity.js';

type Told = (communityId: string) => void;

/**
 * Tells of every write that was recorded for a community, once it is committed and can be read: each of them leaves a row
 * of the records in its transaction, so none is missed.
 * @returns ends the telling
 */
export function onCommittedWrite(dataSource: DataSource, told: Told): () => void {
  const watch = new RecordWatch(told);
  dataSource.subscribers.push(watch);
  return () => {
    const at = dataSource.subscribers.indexOf(watch);
    if (at >= 0) dataSource.subscribers.splice(at, 1);
  };
}

class RecordWatch implements EntitySubscriberInterface<AuditEventEntity> {
  private readonly waiting = new WeakMap<QueryRunner, Set<string>>();

  constructor(private readonly told: Told) {}

  listenTo(): typeof AuditEventEntity {
    return AuditEventEntity;
  }

  afterInsert({ entity, queryRunner }: InsertEvent<AuditEventEntity>): void {
    const { communityId } = entity;
    if (communityId === null) return;
    if (!queryRunner.isTransactionActive) {
      this.told(communityId);
      return;
    }
    const waiting = this.waiting.get(queryRunner) ?? new Set();
    this.waiting.set(queryRunner, waiting.add(communityId));
  }

  afterTransactionCommit({ queryRunner }: { queryRunner: QueryRunner }): void {
    const waiting = this.waiting.get(queryRunner) ?? [];
    this.waiting.delete(queryRunner);
    for (const communityId of waiting) this.told(communityId);
  }

  afterTransactionRollback({ queryRunner }: { queryRunner: QueryRunner }): void {
    this.waiting.delete(queryRunner);
  }
}
