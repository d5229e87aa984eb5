import type { AnswerProofKind, AnswerWord } from '#shared/contracts/reviews.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { CalendarEntity } from './calendar.entity.js';
import { codeColumn, instantColumn, sha256Column } from './columns.js';
import { PersonEntity } from './person.entity.js';

/** An elder's word on an entry with exactly this content, or the word of somebody else who keeps it. */
@Entity({ name: 'answer' })
@Unique('answer_entry_elder', ['entryId', 'entryHash', 'elderId'])
export class AnswerEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('answer_calendar')
  @Column({ name: 'calendar_id', type: 'uuid' })
  calendarId!: string;

  @ManyToOne(() => CalendarEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'calendar_id', foreignKeyConstraintName: 'fk_answer_calendar' })
  calendar!: Relation<CalendarEntity>;

  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @Column({ name: 'entry_hash', ...sha256Column })
  entryHash!: string;

  @Column({ name: 'elder_id', type: 'uuid' })
  elderId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'elder_id', foreignKeyConstraintName: 'fk_answer_elder' })
  elder!: Relation<PersonEntity>;

  @Column(codeColumn(24))
  answer!: AnswerWord;

  @Column({ type: 'varchar', length: 1000 })
  note!: string;

  @Column({ name: 'let_stand', type: 'boolean', default: false })
  letStand!: boolean;

  /** Given by somebody who is no elder: it counts while the entry is kept by its people, and never for the village. */
  @Column({ name: 'of_its_people', type: 'boolean', default: false })
  ofItsPeople!: boolean;

  @Column({ name: 'recorded_by', type: 'uuid', nullable: true })
  recordedBy!: string | null;

  @Column({ type: 'varchar', length: 120, nullable: true })
  witness!: string | null;

  /** What the elder said instead of, or besides, the note. It may be gone since. */
  @Column({ name: 'recording_id', type: 'uuid', nullable: true })
  recordingId!: string | null;

  /** Where somebody else's hand wrote it: why it counts as the elder's word. */
  @Column({ ...codeColumn(16), nullable: true })
  proof!: AnswerProofKind | null;

  /** The elder's voice, or the meeting whose paper shows it. */
  @Column({ name: 'proof_id', type: 'uuid', nullable: true })
  proofId!: string | null;

  @Column({ name: 'answered_at', ...instantColumn })
  answeredAt!: Date;
}
