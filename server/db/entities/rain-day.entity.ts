import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** Rain of one day, as somebody of the village wrote it down. */
@Entity({ name: 'rain_day' })
@Index('rain_day_community', ['communityId', 'day'])
export class RainDayEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_rain_day_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'date' })
  day!: string;

  /** Null where nobody measured. */
  @Column({ type: 'double', nullable: true })
  mm!: number | null;

  @Column({ type: 'varchar', length: 120 })
  words!: string;

  @Column({ name: 'written_by', type: 'uuid' })
  writtenBy!: string;

  @Column({ name: 'written_at', ...instantColumn })
  writtenAt!: Date;
}
