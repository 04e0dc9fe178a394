import type { Pool } from 'pg';
import type { Config } from '../config/config';
import type { Surroundings } from './surroundings';
import type { Logger } from '../logging/logger';

/** What the assembled server knows of the world it runs in. */
export interface Context {
  config: Config;
  surroundings: Surroundings;
  /** The web role's connections, for the session store and the sign-in limits. */
  pool: Pool;
  log: Logger;
  /** The checkout: where the built client and the schemas lie. */
  root: string;
  /** Held against the schemas before an answer leaves; on in tests, where a wrong answer is to fail. */
  checkAnswers: boolean;
  /** The word that opens the first-run set-up, printed at the start. */
  setUpToken: string | null;
}
