import { DataSource } from 'typeorm';
import { ENTITIES } from './entities/index.js';
import { MIGRATIONS } from './migrations/index.js';

export interface DatabaseOptions {
  readonly host: string;
  readonly port: number;
  /** Where the database is on the same machine: half the way of host and port, which count where this is missing. */
  readonly socketPath?: string | null;
  readonly name: string;
  readonly user: string;
  readonly password: string;
  /** How many connections to keep at most; ten serve a village office and a phone queue alike. */
  readonly poolSize?: number;
  /** Called with each statement that failed; without it nothing is logged, because rows hold people's words. */
  readonly onQueryError?: (message: string) => void;
}

/** The order of letters for every table: case does not matter, marks do (ọ is not o, ñ is not n). */
export const DATABASE_COLLATION = 'utf8mb4_uca1400_as_ci';

/** A data source that is not connected yet: call `initialize()`, then `migrate()`. */
export function createDataSource(options: DatabaseOptions): DataSource {
  const { onQueryError } = options;
  return new DataSource({
    type: 'mariadb',
    host: options.host,
    port: options.port,
    ...(options.socketPath ? { socketPath: options.socketPath } : {}),
    database: options.name,
    username: options.user,
    password: options.password,
    poolSize: options.poolSize ?? 10,
    entities: ENTITIES,
    migrations: MIGRATIONS,
    migrationsTableName: 'schema_migration',
    migrationsTransactionMode: 'each',
    // The schema changes through migrations only, in tests as well.
    synchronize: false,
    // Instants are UTC on both sides of the wire; a civil date stays the text it is (as a Date it would
    // come back one day early west of Greenwich).
    timezone: 'Z',
    dateStrings: ['DATE'],
    // The driver does not know the uca1400 names; this is only what the connection speaks, not what is stored.
    charset: 'utf8mb4_unicode_520_ci',
    // TypeORM parses JSON columns itself. Parsed twice, the text "123" would come back as the number 123.
    extra: { jsonStrings: true },
    ...(onQueryError
      ? {
          logger: {
            logQuery: () => undefined,
            logQueryError: (error: string | Error) => {
              onQueryError(error instanceof Error ? error.message : error);
            },
            logQuerySlow: () => undefined,
            logSchemaBuild: () => undefined,
            logMigration: () => undefined,
            log: () => undefined,
          },
          logging: ['error'] as const,
        }
      : { logging: false }),
  });
}
