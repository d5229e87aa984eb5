import type { DecisionKind } from '#shared/contracts/season-reviews.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { codeColumn, instantColumn } from './columns.js';

/**
 * What is to be done otherwise next year. It stays with the year that taught it, and is read as a task by the draft of the
 * year after: so it is there once, whether that draft is older or younger.
 */
@Entity({ name: 'season_decision' })
@Index('season_decision_calendar', ['calendarId'])
@Index('season_decision_entry', ['entryId'])
export class SeasonDecisionEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_season_decision_calendar' })
  calendar!: Relation<CalendarEntity>;

  /** Null where it is about the whole year. */
  @Column({ name: 'entry_id', type: 'uuid', nullable: true })
  entryId!: string | null;

  @Column({ ...codeColumn(16) })
  kind!: DecisionKind;

  @Column({ type: 'text' })
  text!: string;

  @Column({ name: 'author_id', type: 'uuid' })
  authorId!: string;

  @Column({ name: 'decided_at', ...instantColumn })
  decidedAt!: Date;

  /** Who ticked it off in next year's draft, and on which day; null while it waits. */
  @Column({ name: 'done_by', type: 'uuid', nullable: true })
  doneBy!: string | null;

  @Column({
    name: 'done_on',
    type: 'char',
    length: 10,
    charset: 'ascii',
    collation: 'ascii_bin',
    nullable: true,
  })
  doneOn!: string | null;
}
