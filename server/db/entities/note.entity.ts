import type { NotePin, NoteSubjectType } from '#shared/contracts/notes.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** A remark that somebody pinned to an entry, a figure or a marker. */
@Entity({ name: 'note' })
@Index('note_subject', ['communityId', 'subjectType', 'subjectId'])
export class NoteEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_note_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'subject_type', ...codeColumn(16) })
  subjectType!: NoteSubjectType;

  /** The id of an entry or a figure, or the key of a marker. */
  @Column({ name: 'subject_id', ...codeColumn(64) })
  subjectId!: string;

  @Column({ type: 'json' })
  pin!: NotePin;

  @Column({ type: 'text' })
  text!: string;

  @Column({ name: 'author_id', type: 'uuid' })
  authorId!: string;

  /** Whose hand wrote it down for its author; null where it was their own. */
  @Column({ name: 'typed_by', type: 'uuid', nullable: true })
  typedBy!: string | null;

  @Column({ name: 'written_at', ...instantColumn })
  writtenAt!: Date;

  @Column({ name: 'closed_at', ...instantColumn, nullable: true })
  closedAt!: Date | null;
}
