import type { SharedItemType, SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
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

/** A wider level that waits for two people. */
export interface AskedSharing {
  level: SharingLevel;
  details: SharingDetails;
  askedBy: string;
  giverAgreed: boolean;
  stewardAgreed: boolean;
}

/** `shared` as the level says; `paused` and `withdrawn` are seen by nobody, whatever the level. */
export type SharingState = 'shared' | 'paused' | 'withdrawn';

/** Who may see one thing. The policy reads nothing else, so a thing without such a row is seen by nobody. */
@Entity({ name: 'item_sharing' })
export class ItemSharingEntity {
  @PrimaryColumn({ name: 'item_type', type: 'varchar', length: 16, charset: 'ascii', collation: 'ascii_bin' })
  itemType!: SharedItemType;

  @PrimaryColumn({ name: 'item_id', type: 'uuid' })
  itemId!: string;

  @Index('item_sharing_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_item_sharing_community' })
  community!: Relation<CommunityEntity>;

  @Column(codeColumn(16))
  level!: SharingLevel;

  @Column({ type: 'json' })
  details!: SharingDetails;

  /** Whose it is: the source person, or whoever wrote it where nobody else is named. */
  @Index('item_sharing_giver')
  @Column({ name: 'giver_id', type: 'uuid', nullable: true })
  giverId!: string | null;

  @Column({ type: 'json', nullable: true })
  asked!: AskedSharing | null;

  @Column({ default: 'shared', ...codeColumn(16) })
  state!: SharingState;

  @Column({ name: 'state_at', ...instantColumn, nullable: true })
  stateAt!: Date | null;

  /** Of a withdrawn thing: whether older versions say that one entry was withdrawn. */
  @Column({ name: 'leaves_trace', type: 'boolean', default: false })
  leavesTrace!: boolean;

  /** The last day on which what was agreed lets it be shown; null where no consent says so. */
  @Column({ name: 'shown_until', type: 'date', nullable: true })
  shownUntil!: string | null;

  @VersionColumn({ type: 'int' })
  version!: number;
}
