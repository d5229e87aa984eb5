import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { NoteEntity } from './note.entity.js';

/** What somebody answered to a note. */
@Entity({ name: 'note_answer' })
export class NoteAnswerEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('note_answer_note')
  @Column({ name: 'note_id', type: 'uuid' })
  noteId!: string;

  @ManyToOne(() => NoteEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'note_id', foreignKeyConstraintName: 'fk_note_answer_note' })
  note!: Relation<NoteEntity>;

  @Column({ type: 'text' })
  text!: string;

  @Column({ name: 'author_id', type: 'uuid' })
  authorId!: string;

  /** Whose hand wrote it down for its author; null where it was their own. */
  @Column({ name: 'typed_by', type: 'uuid', nullable: true })
  typedBy!: string | null;

  @Column({ name: 'written_at', ...instantColumn })
  writtenAt!: Date;
}
