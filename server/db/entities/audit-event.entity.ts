import type { AuditAction } from '#shared/contracts/audit.js';
import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';

/** Who did what: ids and codes only, never words that people gave. Rows are added, never changed. */
@Entity({ name: 'audit_event' })
@Index('audit_community', ['communityId', 'sequence'])
export class AuditEventEntity {
  /** Order of writing; pages are cut by it. A string, because BIGINT is read as one. */
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  sequence!: string;

  @Index('audit_id', { unique: true })
  @Column({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid', nullable: true })
  communityId!: string | null;

  @Column({ ...instantColumn })
  at!: Date;

  @Column({ name: 'actor_id', type: 'uuid', nullable: true })
  actorId!: string | null;

  /** For whom the actor did it, where it was not for themself. */
  @Column({ name: 'on_behalf_of', type: 'uuid', nullable: true })
  onBehalfOf!: string | null;

  @Column(codeColumn(40))
  action!: AuditAction;

  @Column({ name: 'subject_type', ...codeColumn(16) })
  subjectType!:
    | 'person'
    | 'community'
    | 'place'
    | 'calendar'
    | 'entry'
    | 'version'
    | 'figure'
    | 'group'
    | 'note'
    | 'attachment'
    | 'sign';

  @Column({ name: 'subject_id', type: 'uuid', nullable: true })
  subjectId!: string | null;

  @Column({ type: 'json' })
  details!: Record<string, unknown>;
}
