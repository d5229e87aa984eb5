import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { EntryEntity } from './entry.entity.js';

/** That a sign in an entry's own words was seen on a day. It goes with its entry. */
@Entity({ name: 'own_sighting' })
export class OwnSightingEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('own_sighting_entry')
  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @ManyToOne(() => EntryEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'fk_own_sighting_entry' })
  entry!: Relation<EntryEntity>;

  /** Which of the entry's signs. */
  @Column({ name: 'own_id', type: 'uuid' })
  ownId!: string;

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
