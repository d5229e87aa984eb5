import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn, sha256Column } from './columns.js';
import { PersonEntity } from './person.entity.js';

export type WriteCounts = Readonly<Record<string, number>>;

/** That a write with a key was done, so that the same one that comes again changes nothing. No word of it is kept. */
@Entity({ name: 'write_key' })
export class WriteKeyEntity {
  /** Of person and key together. */
  @PrimaryColumn({ name: 'key_hash', ...sha256Column })
  keyHash!: string;

  /**
   * Of the key and of what was asked with it; without the key nobody can try out words against it. Empty for what was
   * brought in before these were kept.
   */
  @Column({ name: 'call_hash', ...sha256Column })
  callHash!: string;

  @Index('write_key_person')
  @Column({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_write_key_person' })
  person!: Relation<PersonEntity>;

  /** What was written: its present state is the answer. */
  @Column({ name: 'result_id', type: 'uuid' })
  resultId!: string;

  /** How much it was, where the answer tells that; null elsewhere. */
  @Column({ type: 'json', nullable: true })
  counts!: WriteCounts | null;

  @Index('write_key_done')
  @Column({ name: 'done_at', ...instantColumn })
  doneAt!: Date;
}
