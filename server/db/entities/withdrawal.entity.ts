import type { SharedItemType } from '#shared/contracts/sharing.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** A published version that held what was withdrawn: its sheet may hang on a wall. */
export interface PublishedTrace {
  calendarId: string;
  number: number;
  label: string;
}

/** That something was taken back, when and by whom; nothing of what it was. */
@Entity({ name: 'withdrawal' })
export class WithdrawalEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('withdrawal_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_withdrawal_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'item_type', ...codeColumn(16) })
  itemType!: SharedItemType;

  @Column({ name: 'item_id', type: 'uuid' })
  itemId!: string;

  @Column({ name: 'asked_by', type: 'uuid', nullable: true })
  askedBy!: string | null;

  @Column({ name: 'done_by', type: 'uuid', nullable: true })
  doneBy!: string | null;

  @Column({ ...instantColumn })
  at!: Date;

  @Column({ type: 'json' })
  published!: PublishedTrace[];

  /** When somebody said that the printed sheets were taken down; null while they may still hang. */
  @Column({ name: 'sheets_replaced_at', ...instantColumn, nullable: true })
  sheetsReplacedAt!: Date | null;
}
