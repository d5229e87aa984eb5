import { Entity, PrimaryColumn } from 'typeorm';

/** That somebody read a kept thing on a day: the records say it once a day, however often they looked. */
@Entity({ name: 'kept_read' })
export class KeptReadEntity {
  @PrimaryColumn({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @PrimaryColumn({ name: 'item_id', type: 'uuid' })
  itemId!: string;

  /** Civil day in the village. */
  @PrimaryColumn({ type: 'date' })
  day!: string;
}
