/** A sentence where a text is missing, else nothing. */
export const needed = (text: string, sentence: string): string | undefined =>
  text.trim() === '' ? sentence : undefined;

/** What is wanted of an address: it is the server that knows whether mail arrives there. */
export function addressWish(text: string): string | undefined {
  if (text.trim() === '') return 'An email address is needed.';
  return /^\S+@\S+$/.test(text.trim()) ? undefined : 'An email address has an @ between two parts.';
}

/** Shortest password that is taken. */
export const LEAST_PASSWORD = 12;

export function passwordWish(text: string): string | undefined {
  if (text.length >= LEAST_PASSWORD) return undefined;
  return `A password has at least ${LEAST_PASSWORD} characters; ${text.length} are there.`;
}
