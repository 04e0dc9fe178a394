import { First1764547200000 } from './migrations/0001-first';

/** In order; one that has been released is never edited. */
export const MIGRATIONS = [First1764547200000];

/** What the database must have seen before the server may work on it. */
export const NEWEST_MIGRATION = MIGRATIONS.map((migration) => migration.name).at(-1);
