import { Column, Entity, PrimaryColumn } from 'typeorm';
import { instantColumn } from './columns.js';

/** Who wrote to a draft since the last published version: they compile, so they do not sign. */
@Entity({ name: 'draft_contribution' })
export class DraftContributionEntity {
  @PrimaryColumn({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @PrimaryColumn({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @Column({ name: 'last_at', ...instantColumn })
  lastAt!: Date;
}
