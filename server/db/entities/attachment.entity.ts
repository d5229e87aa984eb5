import type { AttachmentKind, AttachmentSubjectType, ConsentWay } from '#shared/contracts/attachments.js';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { AttachmentPartEntity } from './attachment-part.entity.js';
import { AttachmentWordsEntity } from './attachment-words.entity.js';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** A recording or a picture that belongs to something. Its bytes are kept by the file store, part by part. */
@Entity({ name: 'attachment' })
@Unique('attachment_sent_once', ['communityId', 'addedBy', 'clientId'])
@Index('attachment_subject', ['communityId', 'subjectType', 'subjectId'])
export class AttachmentEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_attachment_community' })
  community!: Relation<CommunityEntity>;

  @Column({ name: 'client_id', type: 'uuid' })
  clientId!: string;

  @Column(codeColumn(16))
  kind!: AttachmentKind;

  @Column({ name: 'subject_type', ...codeColumn(16) })
  subjectType!: AttachmentSubjectType;

  @Column({ name: 'subject_id', ...codeColumn(64) })
  subjectId!: string;

  @Column({ type: 'varchar', length: 120 })
  title!: string;

  @Column({ type: 'varchar', length: 80 })
  speaker!: string;

  @Column({ ...codeColumn(35), nullable: true })
  language!: string | null;

  @Column(codeColumn(16))
  consent!: ConsentWay;

  @Column({ name: 'width_px', type: 'int', nullable: true })
  widthPx!: number | null;

  @Column({ name: 'height_px', type: 'int', nullable: true })
  heightPx!: number | null;

  @Column({ name: 'added_by', type: 'uuid' })
  addedBy!: string;

  /** Whose device it was, where somebody helped; null where it was their own. */
  @Column({ name: 'typed_by', type: 'uuid', nullable: true })
  typedBy!: string | null;

  @Column({ name: 'added_at', ...instantColumn })
  addedAt!: Date;

  @OneToMany(() => AttachmentPartEntity, (part) => part.attachment)
  parts!: Relation<AttachmentPartEntity>[];

  @OneToMany(() => AttachmentWordsEntity, (words) => words.attachment)
  words!: Relation<AttachmentWordsEntity>[];
}
