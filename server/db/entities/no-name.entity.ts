import type { OpenWord } from '#shared/contracts/open-page.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { EntryEntity } from './entry.entity.js';

/** That somebody's name is not meant by certain words of an entry. It goes with its entry. */
@Entity({ name: 'no_name' })
@Index('no_name_once', ['entryId', 'word', 'foundKey'], { unique: true })
export class NoNameEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @ManyToOne(() => EntryEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'fk_no_name_entry' })
  entry!: Relation<EntryEntity>;

  /** Which of the entry's words. */
  @Column(codeColumn(16))
  word!: OpenWord;

  /** A hash of the words, of the name, and of who is called so: another of them, and it is asked anew. */
  @Column({ name: 'found_key', type: 'char', length: 64, charset: 'ascii', collation: 'ascii_bin' })
  foundKey!: string;

  @Column({ name: 'said_by', type: 'uuid' })
  saidBy!: string;

  @Column({ name: 'said_at', ...instantColumn })
  saidAt!: Date;
}
