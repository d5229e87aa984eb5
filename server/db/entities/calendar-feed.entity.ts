import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn, sha256Column } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { PersonEntity } from './person.entity.js';

/** An address under which a person’s telephone fetches the village’s calendar. The row holds a hash: it opens nothing. */
@Entity({ name: 'calendar_feed' })
@Index('calendar_feed_person', ['communityId', 'personId'])
export class CalendarFeedEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_calendar_feed_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_calendar_feed_person' })
  person!: Relation<PersonEntity>;

  @Index('calendar_feed_key', { unique: true })
  @Column({ name: 'key_hash', ...sha256Column })
  keyHash!: string;

  @Column({ name: 'made_at', ...instantColumn })
  madeAt!: Date;

  /** The village’s day, and no more: when somebody looks at their telephone is nobody’s business. */
  @Column({ name: 'fetched_on', type: 'date', nullable: true })
  fetchedOn!: string | null;
}
