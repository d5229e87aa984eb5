import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { CalendarVersionEntity } from './calendar-version.entity.js';
import { codeColumn, sha256Column } from './columns.js';

/** An entry as it was frozen. */
@Entity({ name: 'version_entry' })
@Unique('version_entry_position', ['versionId', 'position'])
export class VersionEntryEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'version_id', type: 'uuid' })
  versionId!: string;

  @ManyToOne(() => CalendarVersionEntity, (version) => version.entries, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'version_id', foreignKeyConstraintName: 'fk_version_entry_version' })
  calendarVersion!: Relation<CalendarVersionEntity>;

  @Column({ type: 'int' })
  position!: number;

  /** Place in the order as the hash covers it; null in versions of scheme 1. */
  @Column({ type: 'int', nullable: true })
  rank!: number | null;

  /** False where its own people had not agreed to a kept entry when the version was published. */
  @Column({ type: 'boolean', default: true })
  stands!: boolean;

  /** True where its giver's name was taken off: its own hash cannot be made again, the version's can. */
  @Column({ type: 'boolean', default: false })
  redacted!: boolean;

  @Index('version_entry_entry')
  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  /** Random, hex; unchanged content keeps its salt, and so its hash, in the next submission. */
  @Column(codeColumn(64))
  salt!: string;

  /** Canonical JSON, exactly as hashed behind the salt. */
  @Column({ name: 'body_text', type: 'longtext' })
  bodyText!: string;

  @Column({ ...sha256Column })
  hash!: string;

  /** The hash under which its answers are kept where it says the same in other words of the village; null for its own. */
  @Column({ name: 'answers_to', ...sha256Column, nullable: true })
  answersTo!: string | null;
}
