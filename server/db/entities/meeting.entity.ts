import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarVersionEntity } from './calendar-version.entity.js';
import { instantColumn } from './columns.js';

/** A meeting at which a submission was read back; its paper is kept as a picture that belongs to it. */
@Entity({ name: 'meeting' })
export class MeetingEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('meeting_version')
  @Column({ name: 'version_id', type: 'uuid' })
  versionId!: string;

  @ManyToOne(() => CalendarVersionEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'version_id', foreignKeyConstraintName: 'fk_meeting_version' })
  version!: Relation<CalendarVersionEntity>;

  /** Civil day, `YYYY-MM-DD`. */
  @Column({ name: 'held_on', type: 'date' })
  heldOn!: string;

  @Column({ type: 'varchar', length: 120 })
  witness!: string;

  @Column({ name: 'typed_by', type: 'uuid' })
  typedBy!: string;

  @Column({ name: 'typed_at', ...instantColumn })
  typedAt!: Date;
}
