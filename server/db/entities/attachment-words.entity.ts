import type { WordsInput } from '#shared/contracts/attachments.js';
import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  Unique,
  VersionColumn,
  type Relation,
} from 'typeorm';
import { AttachmentEntity } from './attachment.entity.js';
import { codeColumn, instantColumn } from './columns.js';
import { PersonEntity } from './person.entity.js';

/** What was said, written out in its language, or translated. */
@Entity({ name: 'attachment_words' })
@Unique('attachment_words_language', ['attachmentId', 'kind', 'language'])
export class AttachmentWordsEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'attachment_id', type: 'uuid' })
  attachmentId!: string;

  @ManyToOne(() => AttachmentEntity, (attachment) => attachment.words, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'attachment_id', foreignKeyConstraintName: 'fk_attachment_words_attachment' })
  attachment!: Relation<AttachmentEntity>;

  @Column(codeColumn(16))
  kind!: WordsInput['kind'];

  @Column(codeColumn(35))
  language!: string;

  @Column({ type: 'mediumtext' })
  text!: string;

  @Column({ name: 'author_id', type: 'uuid' })
  authorId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'author_id', foreignKeyConstraintName: 'fk_attachment_words_author' })
  author!: Relation<PersonEntity>;

  @Column({ name: 'checked_by_speaker', type: 'boolean', default: false })
  checkedBySpeaker!: boolean;

  @Column({ name: 'updated_at', ...instantColumn })
  updatedAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;
}
