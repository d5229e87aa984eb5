import type { CardEnd } from '#shared/contracts/cards.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { codeColumn, instantColumn, sha256Column } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { PersonEntity } from './person.entity.js';

/** A printed card that, with its PIN, signs a person in to one village. The row opens nothing: it holds hashes. */
@Entity({ name: 'sign_in_card' })
@Unique('sign_in_card_one_live', ['liveFor', 'communityId'])
@Index('sign_in_card_person', ['communityId', 'personId'])
export class SignInCardEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_sign_in_card_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_sign_in_card_person' })
  person!: Relation<PersonEntity>;

  /** The person while the card lives, null once it has ended: so nobody has two that live. */
  @Column({ name: 'live_for', type: 'uuid', nullable: true })
  liveFor!: string | null;

  @Index('sign_in_card_code', { unique: true })
  @Column({ name: 'code_hash', ...sha256Column })
  codeHash!: string;

  /** argon2id; null until the person has chosen the PIN. */
  @Column({ name: 'pin_hash', type: 'varchar', length: 255, nullable: true })
  pinHash!: string | null;

  /** Since the last right one. */
  @Column({ name: 'failed_tries', type: 'int', default: 0 })
  failedTries!: number;

  @Column({ name: 'locked_until', ...instantColumn, nullable: true })
  lockedUntil!: Date | null;

  @Column({ name: 'made_by', type: 'uuid' })
  madeBy!: string;

  @Column({ name: 'made_at', ...instantColumn })
  madeAt!: Date;

  @Column({ name: 'last_used_at', ...instantColumn, nullable: true })
  lastUsedAt!: Date | null;

  @Column({ name: 'ended_at', ...instantColumn, nullable: true })
  endedAt!: Date | null;

  @Column({ name: 'ended_why', ...codeColumn(16), nullable: true })
  endedWhy!: CardEnd | null;
}
