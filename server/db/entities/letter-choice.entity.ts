import type { LetterChannel, LetterRhythm } from '#shared/contracts/letters.js';
import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, VersionColumn, type Relation } from 'typeorm';
import { codeColumn } from './columns.js';
import { PersonEntity } from './person.entity.js';

/** How a person wants to be asked. Without a row the usual choice counts. */
@Entity({ name: 'letter_choice' })
export class LetterChoiceEntity {
  @PrimaryColumn({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @OneToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_letter_choice_person' })
  person!: Relation<PersonEntity>;

  @Column(codeColumn(8))
  channel!: LetterChannel;

  @Column(codeColumn(8))
  rhythm!: LetterRhythm;

  @Column({ name: 'visit_me', type: 'boolean' })
  visitMe!: boolean;

  /** Hours of the village's clock, 0 to 23; both null where no hours are quiet. */
  @Column({ name: 'quiet_from_hour', type: 'tinyint', unsigned: true, nullable: true })
  quietFromHour!: number | null;

  @Column({ name: 'quiet_to_hour', type: 'tinyint', unsigned: true, nullable: true })
  quietToHour!: number | null;

  @VersionColumn({ type: 'int' })
  version!: number;
}
