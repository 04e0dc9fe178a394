import { useState } from 'react';
import { ConnectionLost } from './problem';

interface Intention {
  content: string;
  key: string;
}

/**
 * Gives each intention one idempotency key. Sent again after a lost connection with the same content it keeps
 * its key, so that the server acts once; other content, or an answer of whatever kind, ends the intention.
 */
export function createIntention(newKey: () => string = () => crypto.randomUUID()) {
  let current: Intention | null = null;
  return {
    keyFor(body: unknown): string {
      const content = JSON.stringify(body ?? null);
      if (current?.content !== content) current = { content, key: newKey() };
      return current.key;
    },
    ended(error: unknown): void {
      if (!(error instanceof ConnectionLost)) current = null;
    },
  };
}

/** An intention that lasts as long as the component. */
export function useIntention(): ReturnType<typeof createIntention> {
  const [intention] = useState(() => createIntention());
  return intention;
}
