import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarVersionEntity } from './calendar-version.entity.js';
import { codeColumn, sha256Column } from './columns.js';

/** A variant as it was frozen: a leaf of its own, because it may be for other people than its entry. */
@Entity({ name: 'version_variant' })
export class VersionVariantEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('version_variant_version')
  @Column({ name: 'version_id', type: 'uuid' })
  versionId!: string;

  @ManyToOne(() => CalendarVersionEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'version_id', foreignKeyConstraintName: 'fk_version_variant_version' })
  calendarVersion!: Relation<CalendarVersionEntity>;

  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @Index('version_variant_variant')
  @Column({ name: 'variant_id', type: 'uuid' })
  variantId!: string;

  /** Among the variants of its entry. */
  @Column({ type: 'int' })
  position!: number;

  @Column(codeColumn(64))
  salt!: string;

  /** Canonical JSON, exactly as hashed behind the salt. */
  @Column({ name: 'body_text', type: 'longtext' })
  bodyText!: string;

  @Column({ ...sha256Column })
  hash!: string;

  @Column({ type: 'int' })
  rank!: number;

  @Column({ type: 'boolean', default: false })
  redacted!: boolean;
}
