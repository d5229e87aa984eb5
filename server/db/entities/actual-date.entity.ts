import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { EntryEntity } from './entry.entity.js';

/** When the work of an entry was really done. An entry belongs to one calendar and so to one year. */
@Entity({ name: 'actual_date' })
export class ActualDateEntity {
  @PrimaryColumn({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @OneToOne(() => EntryEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'fk_actual_date_entry' })
  entry!: Relation<EntryEntity>;

  @Column({ name: 'first_day', type: 'char', length: 10, charset: 'ascii', collation: 'ascii_bin' })
  firstDay!: string;

  @Column({
    name: 'last_day',
    type: 'char',
    length: 10,
    charset: 'ascii',
    collation: 'ascii_bin',
    nullable: true,
  })
  lastDay!: string | null;

  @Column({ name: 'said_by', type: 'varchar', length: 120 })
  saidBy!: string;

  @Column({ type: 'varchar', length: 120 })
  plots!: string;

  @Column({ name: 'typed_by', type: 'uuid' })
  typedBy!: string;

  @Column({ name: 'typed_at', ...instantColumn })
  typedAt!: Date;
}
