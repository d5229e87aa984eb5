import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { codeColumn, instantColumn, sha256Column } from './columns.js';
import { PersonEntity } from './person.entity.js';

/**
 * A code that lets somebody set a password once: for a person whom a steward added, for the first steward, or after
 * a forgotten password.
 */
@Entity({ name: 'one_time_code' })
export class OneTimeCodeEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column(codeColumn(16))
  purpose!: 'join' | 'first-steward' | 'reset';

  @Index('one_time_code_person')
  @Column({ name: 'person_id', type: 'uuid', nullable: true })
  personId!: string | null;

  @ManyToOne(() => PersonEntity, { nullable: true, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_one_time_code_person' })
  person!: Relation<PersonEntity> | null;

  @Column({ name: 'code_hash', ...sha256Column })
  codeHash!: string;

  @Column({ name: 'failed_tries', type: 'int', default: 0 })
  failedTries!: number;

  @Column({ name: 'expires_at', ...instantColumn })
  expiresAt!: Date;

  @Column({ name: 'used_at', ...instantColumn, nullable: true })
  usedAt!: Date | null;
}
