import { Column, Entity, Index, OneToMany, PrimaryColumn, VersionColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { MembershipEntity } from './membership.entity.js';

@Entity({ name: 'person' })
export class PersonEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  /** Null for whoever has none and signs in with a card. */
  @Index('person_email', { unique: true })
  @Column({ type: 'varchar', length: 190, nullable: true })
  email!: string | null;

  @Column({ name: 'display_name', type: 'varchar', length: 80 })
  displayName!: string;

  /** argon2id; null until the one-time code has been used. */
  @Column({ name: 'password_hash', type: 'varchar', length: 255, nullable: true })
  passwordHash!: string | null;

  /** Demo accounts have a public password: a production start refuses a database that holds one. */
  @Column({ name: 'is_demo', type: 'boolean', default: false })
  isDemo!: boolean;

  @Column({ name: 'created_at', ...instantColumn })
  createdAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;

  @OneToMany(() => MembershipEntity, (membership) => membership.person)
  memberships!: Relation<MembershipEntity>[];
}
