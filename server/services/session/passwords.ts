import { hash, verify } from '@node-rs/argon2';
import { invalidContent, Problem } from '../../errors/problem';

// OWASP's recommendation for argon2id (19 MiB, two passes, one lane).
const ARGON2ID = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };
const AT_ONCE = 4;
const WAITING = 50;
const MIN_LENGTH = 12;
const MAX_LENGTH = 128;

let running = 0;
const waiting: (() => void)[] = [];

/** Hashing takes memory on purpose: a few at a time, a short queue, and then an honest "too many". */
async function oneOfFew<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= WAITING) throw new Problem('too-many-requests', { retryAfterSeconds: 5 });
    await new Promise<void>((turn) => waiting.push(turn));
  }
  running++;
  try {
    return await work();
  } finally {
    running--;
    waiting.shift()?.();
  }
}

export const hashPassword = (password: string): Promise<string> => oneOfFew(() => hash(password, ARGON2ID));

// Verified against when there is no such account, so that both cases take the same time.
let nobodysHash: Promise<string> | undefined;

/** Whether the password is the account's; without an account the answer is no, after the same work. */
export async function passwordMatches(passwordHash: string | null, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword('no account has this password');
  const reference = passwordHash ?? (await nobodysHash);
  const matches = await oneOfFew(() => verify(reference, password));
  return passwordHash !== null && matches;
}

// What everybody tries first, and what this product's people would think of first.
const COMMON = [
  'password',
  'passwort',
  'letmein',
  'welcome',
  'qwertyuiop',
  'qwerty',
  'iloveyou',
  'administrator',
  'changeme',
  'counterpoise',
  'transmission',
  'northmoor',
];

/** What is wrong with a new password, as a sentence; undefined when it will do. */
export function passwordFault(password: string, context: readonly string[]): string | undefined {
  if (password.length < MIN_LENGTH) return `Take ${MIN_LENGTH} characters or more; a few words will do.`;
  if (password.length > MAX_LENGTH) return `Take ${MAX_LENGTH} characters or fewer.`;
  const plain = password.toLowerCase();
  if (new Set(plain).size < 5) return 'It repeats too few characters.';
  if (/^(?:0?123456789\d*|abcdefgh\w*)$/.test(plain)) return 'It is a row of neighbours.';
  const words = context
    .flatMap((text) => text.toLowerCase().split(/[^\p{L}\p{N}]+/u))
    .filter((word) => word.length > 3);
  const found = [...COMMON, ...words].find(
    (word) => plain.includes(word) && plain.replaceAll(word, '').length < 6,
  );
  if (found) return `It is little more than "${found}", which is guessed first.`;
  return undefined;
}

/** Throws with the field's fault unless the password will do. */
export function requireGoodPassword(password: string, context: readonly string[]): void {
  const fault = passwordFault(password, context);
  if (!fault) return;
  throw invalidContent([
    { pointer: '/password', value: null, expected: 'a password that is not easily guessed', message: fault },
  ]);
}
