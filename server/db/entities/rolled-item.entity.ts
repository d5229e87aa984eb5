import type { EntryTiming } from '#shared/calendar/entry-model.js';
import type { EntryDates } from '#shared/contracts/calendars.js';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { codeColumn } from './columns.js';

/**
 * The same thing in two drafts, of two years or brought in a second time. The row outlives both: what is taken back in one
 * goes from every other, also when older tables are put back.
 */
@Entity({ name: 'rolled_item' })
export class RolledItemEntity {
  @PrimaryColumn({ name: 'item_id', type: 'uuid' })
  itemId!: string;

  @Column({ name: 'item_type', ...codeColumn(16) })
  itemType!: 'entry' | 'variant' | 'attachment';

  @Index('rolled_item_from')
  @Column({ name: 'from_id', type: 'uuid' })
  fromId!: string;

  @Index('rolled_item_calendar')
  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  /** An entry's days in the year before; no words. Null for everything else, and once the thing was taken back. */
  @Column({ type: 'json', nullable: true })
  before!: EntryDates | null;

  /** On what those days rested, without words; null likewise, and for what was rolled over before it was kept. */
  @Column({ type: 'json', nullable: true })
  timing!: EntryTiming | null;
}
