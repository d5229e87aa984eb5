import type { ListedWord, WordListName } from '#shared/contracts/word-lists.js';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** What a village calls things, one row a list. There is none while everything has its usual name. */
@Entity({ name: 'word_list' })
export class WordListEntity {
  @PrimaryColumn({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_word_list_community' })
  community!: Relation<CommunityEntity>;

  @PrimaryColumn({ type: 'varchar', length: 20 })
  list!: WordListName;

  @Column({ type: 'json' })
  items!: ListedWord[];

  @Column({ type: 'int' })
  version!: number;

  @Column({ name: 'updated_by', type: 'uuid' })
  updatedBy!: string;

  @Column({ name: 'updated_at', ...instantColumn })
  updatedAt!: Date;
}
