import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { PlaceEntity } from './place.entity.js';

/** A place's calendar of one civil year: its one draft (the entries) and the versions frozen from it. */
@Entity({ name: 'calendar' })
@Unique('calendar_place_year', ['placeId', 'year'])
export class CalendarEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('calendar_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_calendar_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'place_id', type: 'uuid' })
  placeId!: string;

  @ManyToOne(() => PlaceEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'place_id', foreignKeyConstraintName: 'fk_calendar_place' })
  place!: Relation<PlaceEntity>;

  /** Civil Gregorian year. */
  @Column({ type: 'int' })
  year!: number;

  /** Submission that is in review or signed off; the draft is locked while it is set. */
  @Column({ name: 'out_number', type: 'int', nullable: true })
  outNumber!: number | null;

  @Column({ name: 'published_number', type: 'int', nullable: true })
  publishedNumber!: number | null;

  /** How many submissions and how many published labels there have been. */
  @Column({ name: 'submission_count', type: 'int', default: 0 })
  submissionCount!: number;

  @Column({ name: 'label_count', type: 'int', default: 0 })
  labelCount!: number;

  @Column({ name: 'created_at', ...instantColumn })
  createdAt!: Date;

  @Column({ name: 'updated_at', ...instantColumn })
  updatedAt!: Date;
}
