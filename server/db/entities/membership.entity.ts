import type { Role } from '#shared/contracts/people.js';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  Unique,
  VersionColumn,
  type Relation,
} from 'typeorm';
import { CommunityEntity } from './community.entity.js';
import { PersonEntity } from './person.entity.js';

@Entity({ name: 'membership' })
@Unique('membership_person_community', ['personId', 'communityId'])
export class MembershipEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, (person) => person.memberships, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_membership_person' })
  person!: Relation<PersonEntity>;

  @Index('membership_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_membership_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'json' })
  roles!: Role[];

  @VersionColumn({ type: 'int' })
  version!: number;
}
