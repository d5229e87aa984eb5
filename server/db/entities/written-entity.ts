import { Column, VersionColumn } from 'typeorm';
import { instantColumn } from './columns.js';

/** What people write on together: who did so last and when, and a version by which a stale save is known. */
export abstract class WrittenEntity {
  @Column({ name: 'updated_by', type: 'uuid' })
  updatedBy!: string;

  @Column({ name: 'updated_at', ...instantColumn })
  updatedAt!: Date;

  @VersionColumn({ type: 'int' })
  version!: number;
}
