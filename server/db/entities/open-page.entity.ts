import type { PlaceShown } from '#shared/contracts/open-page.js';
import { Column, Entity, Index, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** A village's page for everybody; there is no row while it is off. */
@Entity({ name: 'open_page' })
export class OpenPageEntity {
  @PrimaryColumn({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @OneToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_open_page_community' })
  community!: Relation<CommunityEntity>;

  /** Kept as it is, because it hangs on walls: it opens what is for everybody. */
  @Index('open_page_key', { unique: true })
  @Column({ name: 'page_key', ...codeColumn(64) })
  pageKey!: string;

  @Column({ name: 'place_shown', ...codeColumn(16) })
  placeShown!: PlaceShown;

  @Column({ name: 'switched_by', type: 'uuid' })
  switchedBy!: string;

  @Column({ name: 'switched_on_at', ...instantColumn })
  switchedOnAt!: Date;
}
