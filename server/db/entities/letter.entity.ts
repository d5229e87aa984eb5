import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { PersonEntity } from './person.entity.js';

/** A new kind joins here, and the test that reads one of each. */
export const LETTER_KINDS = ['invitation', 'password-reset', 'review', 'reminder', 'digest'] as const;
export type LetterKind = (typeof LETTER_KINDS)[number];

/**
 * `waiting` → `sending` → `sent`; back to `waiting` where nothing was handed over. `unsure`: the connection broke
 * while it was handed over, so it is never sent again by itself. `in-digest`: told by that day's digest.
 */
export type LetterState = 'waiting' | 'in-digest' | 'sending' | 'sent' | 'unsure' | 'given-up' | 'dropped';

/** The outbox: what is to be sent, to whom and why. The words are written when it is sent; no secret is kept. */
@Entity({ name: 'letter' })
@Unique('letter_once', ['onceKey'])
@Index('letter_due', ['state', 'nextAt'])
export class LetterEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column(codeColumn(16))
  kind!: LetterKind;

  /** The same occasion makes the same key, so it is written about once. */
  @Column({ name: 'once_key', ...codeColumn(120) })
  onceKey!: string;

  @Index('letter_person')
  @Column({ name: 'person_id', type: 'uuid', nullable: true })
  personId!: string | null;

  @ManyToOne(() => PersonEntity, { nullable: true, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_letter_person' })
  person!: Relation<PersonEntity> | null;

  /** Only where somebody asked to choose a new password: whose it is, is looked up when the letter goes. */
  @Column({ type: 'varchar', length: 190, nullable: true })
  email!: string | null;

  @Index('letter_community')
  @Column({ name: 'community_id', type: 'uuid', nullable: true })
  communityId!: string | null;

  @ManyToOne(() => CommunityEntity, { nullable: true, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_letter_community' })
  community!: Relation<CommunityEntity> | null;

  @Column({ name: 'version_id', type: 'uuid', nullable: true })
  versionId!: string | null;

  @Column(codeColumn(16))
  state!: LetterState;

  /** Why it did not go, or not yet. */
  @Column({ ...codeColumn(24), nullable: true })
  reason!: string | null;

  @Column({ type: 'int', default: 0 })
  attempts!: number;

  /** When it may go; while it is being sent, since when. */
  @Column({ name: 'next_at', ...instantColumn })
  nextAt!: Date;

  @Column({ name: 'give_up_at', ...instantColumn })
  giveUpAt!: Date;

  @Column({ name: 'created_at', ...instantColumn })
  createdAt!: Date;

  @Column({ name: 'sent_at', ...instantColumn, nullable: true })
  sentAt!: Date | null;
}
