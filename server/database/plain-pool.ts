import pg from 'pg';

/** A few connections of the web role beside the data source's own: a session must never wait for a transaction that waits for it. */
export function makePlainPool(url: string, max = 6): pg.Pool {
  const pool = new pg.Pool({
    connectionString: url,
    application_name: 'counterpoise sessions',
    max,
    connectionTimeoutMillis: 2000,
    statement_timeout: 5000,
    query_timeout: 7000,
    lock_timeout: 3000,
  });
  // Without a listener an idle connection that PostgreSQL ends would end the process.
  pool.on('error', () => undefined);
  return pool;
}
