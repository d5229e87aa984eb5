import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { instantColumn } from './columns.js';

/** What somebody says that a year taught, about an entry of its calendar or about the whole year. */
@Entity({ name: 'season_lesson' })
@Index('season_lesson_calendar', ['calendarId'])
@Index('season_lesson_entry', ['entryId'])
export class SeasonLessonEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_season_lesson_calendar' })
  calendar!: Relation<CalendarEntity>;

  /** Null where it is about the whole year. */
  @Column({ name: 'entry_id', type: 'uuid', nullable: true })
  entryId!: string | null;

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
