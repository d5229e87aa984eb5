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
import { CommunityEntity } from './community.entity.js';

/** Weavers, herders, a family: people who share what is theirs alone. */
@Entity({ name: 'village_group' })
export class VillageGroupEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('village_group_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_village_group_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'varchar', length: 60 })
  name!: string;

  @VersionColumn({ type: 'int' })
  version!: number;
}
