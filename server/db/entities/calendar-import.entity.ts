import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { instantColumn } from './columns.js';

/** That something was brought into a draft, so that the same sent again is not brought in twice. No words of it. */
@Entity({ name: 'calendar_import' })
export class CalendarImportEntity {
  /** Made by whoever sent it. */
  @PrimaryColumn({ name: 'import_key', type: 'uuid' })
  importKey!: string;

  @Index('calendar_import_calendar')
  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_calendar_import_calendar' })
  calendar!: Relation<CalendarEntity>;

  @Column({ name: 'brought_by', type: 'uuid' })
  broughtBy!: string;

  @Column({ name: 'brought_at', ...instantColumn })
  broughtAt!: Date;

  @Column({ type: 'int' })
  added!: number;

  @Column({ type: 'int' })
  refused!: number;
}
