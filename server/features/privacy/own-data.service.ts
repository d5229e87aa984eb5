import type { OwnData, Privacy } from '#shared/contracts/privacy.js';
import { PURPOSES } from '#shared/contracts/privacy.js';
import type { DataSource } from 'typeorm';
import type { Person } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { HELD } from './held.data.js';

/** What is kept about people: why, for everybody; and what, for each person about themselves. */
export class OwnDataService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly operator: { hosting: string | null; sendsLetters: boolean },
  ) {}

  purposes(): Privacy {
    return {
      purposes: PURPOSES.map((purpose) => ({
        purpose,
        tables: Object.keys(HELD).filter((table) => HELD[table]?.purpose === purpose),
      })),
      ...this.operator,
    };
  }

  async exportOwn({ id }: Person): Promise<OwnData> {
    const tables: OwnData['tables'] = {};
    for (const [table, { people, own, secret = [] }] of Object.entries(HELD)) {
      if (people.length === 0) continue;
      const columns = own === 'all' ? '*' : own.map((column) => `\`${column}\``).join(', ');
      const where = people.map((column) => `\`${column}\` = ?`).join(' OR ');
      // Names come from the list above alone; only the id is a value.
      const rows: Record<string, unknown>[] = await this.dataSource.query(
        `SELECT ${columns} FROM \`${table}\` WHERE ${where}`,
        people.map(() => id),
      );
      tables[table] = rows.map((row) =>
        Object.fromEntries(Object.entries(row).filter(([column]) => !secret.includes(column))),
      );
    }
    return { exportedAt: this.clock.now().toISOString(), tables };
  }
}
