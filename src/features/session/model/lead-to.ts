/** Where a sign-in leads: back to the page that asked for it when that is one of ours, else home. */
export function leadTo(next: string | null, home: string): string {
  if (!next || !next.startsWith('/') || next.startsWith('//') || next.startsWith('/sign-in')) return home;
  return next.includes('\\') ? home : next;
}
