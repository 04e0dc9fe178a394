import PgBoss from 'pg-boss';
import type { QueryRunner } from 'typeorm';
import { QUEUES } from '../integrations/queue-names';
import { WEB_ROLE, WORKER_ROLE } from './role-names';

/** The job queue's own tables, made by the owner; queues are tables too, so no other role can add one. */
export async function prepareJobQueue(ownerUrl: string, runner: QueryRunner): Promise<void> {
  const boss = new PgBoss({ connectionString: ownerUrl, max: 2, supervise: false, schedule: false });
  boss.on('error', () => undefined);
  await boss.start();
  for (const name of Object.values(QUEUES)) {
    await boss.createQueue(name, {
      name,
      retryLimit: 5,
      retryDelay: 2,
      retryBackoff: true,
      expireInSeconds: 600,
    });
  }
  await boss.stop({ graceful: false });
  const servers = `${WEB_ROLE}, ${WORKER_ROLE}`;
  await runner.query(`GRANT USAGE ON SCHEMA pgboss TO ${servers}`);
  await runner.query(`GRANT SELECT ON ALL TABLES IN SCHEMA pgboss TO ${servers}`);
  await runner.query(`GRANT INSERT ON pgboss.job TO ${servers}`);
  await runner.query(`GRANT INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA pgboss TO ${WORKER_ROLE}`);
}
