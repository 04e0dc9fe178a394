// npm run audit:verify: walks the audit chain; exit 1 at the first broken entry.
import { makeDataSource } from '../database/data-source';
import { verifyChain } from '../database/audit/verify-chain';
import { ownerDatabaseUrl } from './owner-database';

const { url, release } = await ownerDatabaseUrl();
const owner = makeDataSource(url, 'owner');
try {
  await owner.initialize();
  const verdict = await verifyChain(owner);
  if (verdict.whole) {
    console.log(`The audit chain is whole: ${verdict.entries} entries, the last one ${verdict.lastHash}.`);
  } else {
    console.error(`The audit chain is broken at entry ${verdict.seq}: ${verdict.reason}.`);
    process.exitCode = 1;
  }
} finally {
  if (owner.isInitialized) await owner.destroy();
  await release();
}
