import type { FigureInput, FigureName, FigureVariant } from '#shared/contracts/figures.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { WrittenEntity } from './written-entity.js';

/** A figure of a village: names, story, and what carries its dates. */
@Entity({ name: 'figure' })
export class FigureEntity extends WrittenEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('figure_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_figure_community' })
  community!: Relation<CommunityEntity>;

  /** The village's own word first. */
  @Column({ type: 'json' })
  names!: FigureName[];

  @Column({ type: 'text' })
  story!: string;

  @Column({ type: 'json' })
  variants!: FigureVariant[];

  @Column({ name: 'member_hrs', type: 'json' })
  memberHrs!: number[];

  @Column({ name: 'indicator_hr', type: 'int', nullable: true })
  indicatorHr!: number | null;

  @Column({ type: 'json', nullable: true })
  patch!: FigureInput['patch'];

  @Column({ name: 'own_depths', type: 'json', nullable: true })
  ownDepths!: FigureInput['ownDepths'];

  /** Set when an officer took it out; drafts that still go by it keep their dates, and it can be put back. */
  @Column({ name: 'taken_out_at', ...instantColumn, nullable: true })
  takenOutAt!: Date | null;
}
