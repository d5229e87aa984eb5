import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { AttachmentEntity } from './attachment.entity.js';
import { codeColumn, sha256Column } from './columns.js';

/** One file of an attachment: the spoken consent (0), then the parts in their order; a picture has part 1 only. */
@Entity({ name: 'attachment_part' })
export class AttachmentPartEntity {
  @PrimaryColumn({ name: 'attachment_id', type: 'uuid' })
  attachmentId!: string;

  @PrimaryColumn({ type: 'int' })
  part!: number;

  @ManyToOne(() => AttachmentEntity, (attachment) => attachment.parts, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'attachment_id', foreignKeyConstraintName: 'fk_attachment_part_attachment' })
  attachment!: Relation<AttachmentEntity>;

  @Column({ name: 'storage_key', ...codeColumn(32) })
  storageKey!: string;

  /** Of a picture. */
  @Column({ name: 'thumbnail_key', ...codeColumn(32), nullable: true })
  thumbnailKey!: string | null;

  @Column({ name: 'content_type', ...codeColumn(32) })
  contentType!: string;

  @Column({ type: 'int' })
  bytes!: number;

  @Column({ type: 'double', nullable: true })
  seconds!: number | null;

  /** Of the file as it came, so that the same one sent twice is known. */
  @Column(sha256Column)
  sha256!: string;
}
