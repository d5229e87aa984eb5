import type { SkylinePoint } from '#shared/contracts/places.js';
import type { Clarity, SkylineRule, ThresholdSetId } from '#shared/sky/vocabulary.js';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  VersionColumn,
  type Relation,
} from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';
import { CommunityEntity } from './community.entity.js';

@Entity({ name: 'place' })
export class PlaceEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Index('place_community')
  @Column({ name: 'community_id', type: 'uuid' })
  communityId!: string;

  @ManyToOne(() => CommunityEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'community_id', foreignKeyConstraintName: 'fk_place_community' })
  community!: Relation<CommunityEntity>;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  @Column({ name: 'latitude_deg', type: 'double' })
  latitudeDeg!: number;

  /** East positive. */
  @Column({ name: 'longitude_deg', type: 'double' })
  longitudeDeg!: number;

  @Column({ name: 'elevation_m', type: 'double' })
  elevationM!: number;

  @Column({ name: 'time_zone', ...codeColumn(64) })
  timeZone!: string;

  @Column({ type: 'json' })
  skyline!: SkylinePoint[];

  @Column({ name: 'clarity_by_month', type: 'json' })
  clarityByMonth!: Clarity[];

  @Column({ name: 'rain_months', type: 'json' })
  rainMonths!: boolean[];

  @Column({ name: 'threshold_set', ...codeColumn(32) })
  thresholdSet!: ThresholdSetId;

  @Column({ name: 'same_side_shift_deg', type: 'double' })
  sameSideShiftDeg!: number;

  @Column({ name: 'opposite_side_shift_deg', type: 'double' })
  oppositeSideShiftDeg!: number;

  @Column({ name: 'skyline_rule', ...codeColumn(32) })
  skylineRule!: SkylineRule;

  @Column({ name: 'created_at', ...instantColumn })
  createdAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;
}
