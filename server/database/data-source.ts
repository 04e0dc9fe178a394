import { DataSource } from 'typeorm';
import { ENTITIES } from './entity-list';
import { MIGRATIONS } from './migration-list';
import { NamingStrategy } from './naming-strategy';

/** Who connects: the owner migrates, the web role serves requests, the worker role runs jobs. */
export type DatabaseRole = 'owner' | 'web' | 'worker';

// The role's share of PostgreSQL's connections, and how long one statement may take.
const LIMITS: Record<DatabaseRole, { connections: number; statementMs: number }> = {
  owner: { connections: 2, statementMs: 120_000 },
  web: { connections: 15, statementMs: 10_000 },
  worker: { connections: 5, statementMs: 60_000 },
};

/** A data source for one role; the caller initialises and destroys it. */
export function makeDataSource(url: string, role: DatabaseRole): DataSource {
  const { connections, statementMs } = LIMITS[role];
  return new DataSource({
    type: 'postgres',
    url,
    applicationName: `counterpoise ${role}`,
    entities: ENTITIES,
    migrations: MIGRATIONS,
    migrationsTableName: 'migrations',
    namingStrategy: new NamingStrategy(),
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    poolSize: connections,
    // Without a listener an idle connection that PostgreSQL ends would end the process.
    poolErrorHandler: () => undefined,
    extra: {
      // The wait for a free connection of the pool counts as well.
      connectionTimeoutMillis: 5000,
      statement_timeout: statementMs,
      query_timeout: statementMs + 2000,
      lock_timeout: 3000,
      idle_in_transaction_session_timeout: 15_000,
    },
  });
}
