import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { codeColumn, instantColumn } from './columns.js';

/** A calendar whose draft began as that of the year before. */
@Entity({ name: 'rollover' })
export class RolloverEntity {
  @PrimaryColumn({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_rollover_calendar' })
  calendar!: Relation<CalendarEntity>;

  @Column({ name: 'from_calendar_id', type: 'uuid' })
  fromCalendarId!: string;

  @Column({ name: 'rolled_by', type: 'uuid' })
  rolledBy!: string;

  @Column({ name: 'rolled_at', ...instantColumn })
  rolledAt!: Date;

  /** As the place stood then, without the village's figures; null for what was rolled over before it was kept. */
  @Column({ type: 'json', nullable: true })
  place!: PlaceSnapshot | null;

  @Column({ name: 'engine_version', ...codeColumn(32), nullable: true })
  engineVersion!: string | null;
}
