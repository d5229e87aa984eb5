import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { CalendarVersionEntity } from './calendar-version.entity.js';
import { codeColumn, instantColumn } from './columns.js';
import { PersonEntity } from './person.entity.js';

@Entity({ name: 'signature' })
@Unique('signature_version_person_role', ['versionId', 'personId', 'role'])
export class SignatureEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ name: 'version_id', type: 'uuid' })
  versionId!: string;

  @ManyToOne(() => CalendarVersionEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'version_id', foreignKeyConstraintName: 'fk_signature_version' })
  calendarVersion!: Relation<CalendarVersionEntity>;

  @Column({ name: 'person_id', type: 'uuid' })
  personId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'fk_signature_person' })
  person!: Relation<PersonEntity>;

  @Column(codeColumn(16))
  role!: 'elder' | 'steward';

  @Column({ name: 'signed_at', ...instantColumn })
  signedAt!: Date;
}
