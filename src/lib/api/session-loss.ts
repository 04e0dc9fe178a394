/**
 * What happens when a session ends while somebody works: requests wait here, the sign-in overlay opens
 * above the page (whose state stays), and once the same person is in again every request goes on.
 */
type Listener = () => void;

interface Waiter {
  goOn: () => void;
  giveUp: (reason: unknown) => void;
}

let waiting: Waiter[] = [];
const listeners = new Set<Listener>();
const tell = () => listeners.forEach((listener) => listener());

export function isSessionLost(): boolean {
  return waiting.length > 0;
}

export function onSessionLossChange(listener: Listener): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Waits for the next sign-in; rejects with `reason` when the person leaves instead. */
export function waitForSignIn(reason: unknown): Promise<void> {
  const settled = new Promise<void>((resolve, reject) => {
    waiting = [...waiting, { goOn: resolve, giveUp: () => reject(reason) }];
  });
  tell();
  return settled;
}

function settle(how: keyof Waiter): void {
  const released = waiting;
  waiting = [];
  released.forEach((waiter) => waiter[how](undefined));
  tell();
}

export const signedInAgain = () => settle('goOn');
export const leftInstead = () => settle('giveUp');
