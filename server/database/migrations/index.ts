import { First1764547200000 } from './0001-first';

/** In order; one that has been released is never edited. */
export const MIGRATIONS = [First1764547200000];
