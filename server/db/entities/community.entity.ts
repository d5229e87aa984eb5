import type { LocalMonth } from '#shared/contracts/local-months.js';
import type { SignOffRule } from '#shared/contracts/people.js';
import { Column, Entity, PrimaryColumn, VersionColumn } from 'typeorm';
import { codeColumn, instantColumn } from './columns.js';

@Entity({ name: 'community' })
export class CommunityEntity {
  @PrimaryColumn({ type: 'uuid' })
  id!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  @Column({ name: 'village_language_tag', ...codeColumn(35) })
  villageLanguageTag!: string;

  @Column({ name: 'village_language_name', type: 'varchar', length: 60 })
  villageLanguageName!: string;

  @Column({ name: 'officer_language_tag', ...codeColumn(35) })
  officerLanguageTag!: string;

  @Column({ name: 'officer_language_name', type: 'varchar', length: 60 })
  officerLanguageName!: string;

  @Column({ name: 'year_start_month', type: 'tinyint', unsigned: true })
  yearStartMonth!: number;

  @Column({ name: 'year_start_day', type: 'tinyint', unsigned: true })
  yearStartDay!: number;

  @Column({ name: 'year_start_note', type: 'varchar', length: 200 })
  yearStartNote!: string;

  @Column({ name: 'local_months', type: 'json' })
  localMonths!: LocalMonth[];

  /** Of the first to the thirteenth Moon; empty where it goes by its number. */
  @Column({ name: 'moon_names', type: 'json' })
  moonNames!: string[];

  @Column({ name: 'weather_contact', type: 'varchar', length: 200 })
  weatherContact!: string;

  @Column({ name: 'agriculture_contact', type: 'varchar', length: 200 })
  agricultureContact!: string;

  @Column({ name: 'sign_off_rule', type: 'json' })
  signOffRule!: SignOffRule;

  @Column({ name: 'created_at', ...instantColumn })
  createdAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;
}
