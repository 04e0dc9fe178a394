import type { AsTyped } from './form-types';

/** What stands in the browser of a line whose last changes have not reached the server. */
export interface KeptLine {
  line: Record<string, unknown>;
  asTyped: AsTyped;
  /** The version that the changes were made on. */
  version: number;
  /** When they were made, RFC 3339. */
  at: string;
}

/** Where the keep of one person's line lies; a shared computer shows it to nobody else. */
export const keepKey = (userId: string, number: string, lineKey: string): string =>
  `counterpoise-line:${userId}:${number}:${lineKey}`;

const isObject = (v: unknown): v is Record<string, unknown> => typeof v === 'object' && v !== null;

/** What was kept, or null where there is nothing that can be read. */
export function readKept(key: string, storage: Storage = localStorage): KeptLine | null {
  try {
    const kept: unknown = JSON.parse(storage.getItem(key) ?? 'null');
    if (!isObject(kept) || !isObject(kept['line']) || !isObject(kept['asTyped'])) return null;
    const { version, at } = kept;
    if (typeof version !== 'number' || typeof at !== 'string') return null;
    return { line: kept['line'], asTyped: kept['asTyped'] as AsTyped, version, at };
  } catch {
    return null;
  }
}

/** Keeps a line; says whether the browser had room for it. */
export function writeKept(key: string, kept: KeptLine, storage: Storage = localStorage): boolean {
  try {
    storage.setItem(key, JSON.stringify(kept));
    return true;
  } catch {
    return false;
  }
}

export function dropKept(key: string, storage: Storage = localStorage): void {
  try {
    storage.removeItem(key);
  } catch {
    // Without storage nothing was kept.
  }
}
