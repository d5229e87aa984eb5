import type { DataSource } from 'typeorm';
import { AppError } from '../../http/app-error.js';

export class HealthService {
  constructor(private readonly dataSource: DataSource) {}

  /** Refuses with 503 where the database does not answer. */
  async expectDatabase(): Promise<void> {
    try {
      await this.dataSource.query('SELECT 1');
    } catch {
      throw new AppError('database-unreachable');
    }
  }
}
