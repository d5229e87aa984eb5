import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

/** A notice of the weather service as somebody of the village wrote it down. */
@Entity({ name: 'weather_notice' })
export class WeatherNoticeEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('weather_notice_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_weather_notice_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'text' })
  text!: string;

  @Column({ type: 'varchar', length: 120 })
  issuer!: string;

  @Column({ name: 'issued_on', type: 'date' })
  issuedOn!: string;

  /** The last day on which it holds. */
  @Column({ name: 'expires_on', type: 'date' })
  expiresOn!: string;

  @Column({ name: 'written_by', type: 'uuid' })
  writtenBy!: string;

  @Column({ name: 'written_at', ...instantColumn })
  writtenAt!: Date;
}
