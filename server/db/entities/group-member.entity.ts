import { Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { PersonEntity } from './person.entity.js';
import { VillageGroupEntity } from './village-group.entity.js';

/** Who belongs to a group. */
@Entity({ name: 'group_member' })
export class GroupMemberEntity {
  @PrimaryColumn({ name: 'group_id', type: 'uuid' })
  groupId!: string;

  @ManyToOne(() => VillageGroupEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'group_id', foreignKeyConstraintName: 'fk_group_member_group' })
  group!: Relation<VillageGroupEntity>;

  @Index('group_member_person')
  @PrimaryColumn({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_group_member_person' })
  person!: Relation<PersonEntity>;
}
