import type {
  ConsentAnswer,
  ConsentContent,
  ConsentItemType,
  ConsentUse,
} from '#shared/contracts/consents.js';
import type { SharingLevel } from '#shared/contracts/sharing.js';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  VersionColumn,
  type Relation,
} from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** The part of a consent that no rule looks at. */
export type ConsentDetails = Omit<ConsentContent, 'answer' | 'giverId' | 'uses' | 'until' | 'reviewBy'> & {
  /** How the thing was shared when they answered. */
  level: SharingLevel;
};

/** What one person or group agreed to about one thing. */
@Entity({ name: 'consent' })
@Index('consent_item', ['itemType', 'itemId'])
export class ConsentEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('consent_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_consent_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'item_type', ...codeColumn(16) })
  itemType!: ConsentItemType;

  @Column({ name: 'item_id', type: 'uuid' })
  itemId!: string;

  @Index('consent_giver')
  @Column({ name: 'giver_id', type: 'uuid', nullable: true })
  giverId!: string | null;

  /** As it was last said; a consent lapses by its day, not by a row that changes. */
  @Column(codeColumn(24))
  state!: ConsentAnswer | 'withdrawn';

  @Column({ type: 'json' })
  uses!: ConsentUse[];

  @Column({ type: 'date', nullable: true })
  until!: string | null;

  @Column({ name: 'review_by', type: 'date' })
  reviewBy!: string;

  @Column({ type: 'json' })
  details!: ConsentDetails;

  @Column({ name: 'recorded_by', type: 'uuid' })
  recordedBy!: string;

  @Column({ name: 'recorded_at', ...instantColumn })
  recordedAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;
}
