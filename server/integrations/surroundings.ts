import type { DataSource } from 'typeorm';
import type { Checker } from './checker';
import type { Clock } from './clock';
import type { JobQueue } from './job-queue';
import type { VirusScan } from './virus-scan';

/** What services reach beyond the database, each replaceable in tests. */
export interface Tools {
  clock: Clock;
  jobs: JobQueue;
  virusScan: VirusScan;
  checker: Checker;
  /** Links in mails begin with it; never with what a request claims to be its host. */
  publicUrl: URL;
  demo: boolean;
}

/** What a transaction is made from. */
export interface Surroundings {
  dataSource: DataSource;
  tools: Tools;
}
