import { readEnvironment } from '../config/environment';
import { addressOf, start, stop } from './postgres.mjs';

/** Where the database is, as its owner: DATABASE_URL, or the checkout's own cluster, started for the while if need be. */
export async function ownerDatabaseUrl(): Promise<{ url: string; release: () => Promise<void> }> {
  const { databaseUrl } = readEnvironment(['DATABASE_URL']);
  if (databaseUrl) return { url: databaseUrl, release: async () => undefined };
  const cluster = await start();
  return {
    url: addressOf(cluster, 'counterpoise'),
    release: async () => {
      if (!cluster.reused) await stop();
    },
  };
}
