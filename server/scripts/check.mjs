/**
 * `npm run check -- FILE`: reads a filing and prints the check, offline, without a database or a build. Compiles the
 * schemas when they are stale, then runs check.ts.
 */
import { register } from 'tsx/esm/api';
import { buildValidators } from './build-validators.mjs';

await buildValidators({ only: 'filing' });
register();
const { main } = await import('./check.ts');
process.exitCode = await main(process.argv.slice(2));
