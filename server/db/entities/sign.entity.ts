import type { signWords } from '#shared/contracts/event-record.js';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import type { z } from 'zod';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';
import { WrittenEntity } from './written-entity.js';

export type SignWords = z.infer<typeof signWords>;

/** A sign of nature in a village's list, to which its entries refer. */
@Entity({ name: 'sign' })
export class SignEntity extends WrittenEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('sign_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_sign_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'json' })
  words!: SignWords;

  /** Set when it was taken out of the list; versions keep its words, and it can be put back. */
  @Column({ name: 'taken_out_at', ...instantColumn, nullable: true })
  takenOutAt!: Date | null;
}
