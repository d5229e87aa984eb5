import type { EntryInput } from '#shared/contracts/calendars.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { instantColumn } from './columns.js';
import { WrittenEntity } from './written-entity.js';

/** One line of a draft. */
@Entity({ name: 'entry' })
@Index('entry_calendar_position', ['calendarId', 'position'])
export class EntryEntity extends WrittenEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_entry_calendar' })
  calendar!: Relation<CalendarEntity>;

  @Column({ type: 'int' })
  position!: number;

  @Column({ type: 'json' })
  content!: EntryInput;

  /** Set when an officer took the entry out; it can be put back. */
  @Column({ name: 'deleted_at', ...instantColumn, nullable: true })
  deletedAt!: Date | null;

  /** Of the time before there were records: none is asked for until something of it is said. */
  @Column({ name: 'is_older', type: 'boolean', default: false })
  isOlder!: boolean;

  /** Set back to an old version then: answers to what stood in versions before do not count for it. */
  @Column({ name: 'restored_at', ...instantColumn, nullable: true })
  restoredAt!: Date | null;
}
