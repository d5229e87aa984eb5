import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { SignEntity } from './sign.entity.js';

/** That a sign of the village's list was seen on a day. */
@Entity({ name: 'sign_sighting' })
export class SignSightingEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('sign_sighting_sign')
  @Column({ name: 'sign_id', type: 'uuid' })
  signId!: string;

  @ManyToOne(() => SignEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'sign_id', foreignKeyConstraintName: 'fk_sign_sighting_sign' })
  sign!: Relation<SignEntity>;

  @Column({ type: 'char', length: 10, charset: 'ascii', collation: 'ascii_bin' })
  day!: string;

  /** Who saw it, as they are called. */
  @Column({ type: 'varchar', length: 120 })
  who!: string;

  @Column({ name: 'marked_by', type: 'uuid' })
  markedBy!: string;

  @Column({ name: 'marked_at', ...instantColumn })
  markedAt!: Date;
}
