import type { SignOffRule } from '#shared/contracts/people.js';
import type { VersionState } from '#shared/contracts/versions.js';
import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { codeColumn, instantColumn, sha256Column } from './columns.js';
import { VersionEntryEntity } from './version-entry.entity.js';

/** A frozen submission. Header and entries never change; label, state and note stand outside the hash. */
@Entity({ name: 'calendar_version' })
@Unique('calendar_version_number', ['calendarId', 'number'])
export class CalendarVersionEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_calendar_version_calendar' })
  calendar!: Relation<CalendarEntity>;

  @Column({ type: 'int' })
  number!: number;

  @Column({ type: 'varchar', length: 20, nullable: true })
  label!: string | null;

  @Column(codeColumn(16))
  state!: VersionState;

  /** Why changes were asked or the version was recalled. */
  @Column({ name: 'state_note', type: 'varchar', length: 300, default: '' })
  stateNote!: string;

  /** Canonical JSON, exactly as hashed. */
  @Column({ name: 'header_text', type: 'longtext' })
  headerText!: string;

  @Column({ name: 'header_hash', ...sha256Column })
  headerHash!: string;

  @Column({ ...sha256Column })
  hash!: string;

  /** How `hash` is made: 1 over entry hashes in order, 2 over sorted leaves. */
  @Column({ type: 'int', default: 1 })
  scheme!: number;

  /** What the hash goes over, kept when an entry is withdrawn; null in a version of scheme 1 that is still whole. */
  @Column({ type: 'json', nullable: true })
  leaves!: string[] | null;

  /** Entries that were withdrawn and whose givers let that be said. */
  @Column({ name: 'withdrawn_traces', type: 'int', default: 0 })
  withdrawnTraces!: number;

  /** True where a name was taken out of the header: its own hash cannot be made again, the version's can. */
  @Column({ name: 'header_redacted', type: 'boolean', default: false })
  headerRedacted!: boolean;

  /** As it stood when the draft was submitted: who has to sign does not change in the middle of a review. */
  @Column({ name: 'sign_off_rule', type: 'json' })
  signOffRule!: SignOffRule;

  /** Whoever had written to the draft since the last published version; they cannot sign this one. */
  @Column({ name: 'writer_ids', type: 'json' })
  writerIds!: string[];

  @Column({ name: 'submitted_by', type: 'uuid' })
  submittedBy!: string;

  @Column({ name: 'submitted_at', ...instantColumn })
  submittedAt!: Date;

  @Column({ name: 'published_at', ...instantColumn, nullable: true })
  publishedAt!: Date | null;

  @OneToMany(() => VersionEntryEntity, (entry) => entry.calendarVersion)
  entries!: Relation<VersionEntryEntity>[];
}
