import type { SharedItemType, SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** How a thing was shared, and whose it was. */
export interface SharedAs {
  level: SharingLevel;
  details: SharingDetails;
  giverId: string | null;
}

/** What was changed about a thing, so that a note made by mistake can be undone. */
export interface DoneAfterDeath {
  itemType: SharedItemType;
  itemId: string;
  before: SharedAs;
  after: SharedAs;
}

/** That somebody of the village died, as its steward noted it. */
@Entity({ name: 'death' })
export class DeathEntity {
  @PrimaryColumn({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @PrimaryColumn({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_death_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'died_on', type: 'date' })
  diedOn!: string;

  @Column({ name: 'noted_by', type: 'uuid' })
  notedBy!: string;

  @Column({ name: 'noted_at', ...instantColumn })
  notedAt!: Date;

  @Column({ type: 'json' })
  done!: DoneAfterDeath[];

  /** How many things were removed for good. */
  @Column({ type: 'int', default: 0 })
  removed!: number;
}
