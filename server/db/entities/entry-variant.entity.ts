import type { VariantInput } from '#shared/contracts/variants.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { EntryEntity } from './entry.entity.js';
import { WrittenEntity } from './written-entity.js';

/** Another keeper's timing of an entry of a draft. */
@Entity({ name: 'entry_variant' })
export class EntryVariantEntity extends WrittenEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('entry_variant_entry')
  @Column({ name: 'entry_id', type: 'uuid' })
  entryId!: string;

  @ManyToOne(() => EntryEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'fk_entry_variant_entry' })
  entry!: Relation<EntryEntity>;

  @Column({ type: 'json' })
  content!: VariantInput;

  @Column({ name: 'added_at', ...instantColumn })
  addedAt!: Date;
}
