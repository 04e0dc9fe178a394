/** "Did you mean": names that lie close to what was written. */

/**
 * Number of single-character changes between two texts (insert, drop, replace, swap of neighbours),
 * counted up to a limit.
 * @returns the distance, or limit + 1 when it is larger
 */
export function editDistance(a: string, b: string, limit: number): number {
  if (Math.abs(a.length - b.length) > limit) return limit + 1;
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let best = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        best = Math.min(best, (before[j - 2] ?? 0) + 1);
      row.push(best);
    }
    if (Math.min(...row) > limit) return limit + 1;
    before = last;
    last = row;
  }
  return last[b.length] ?? limit + 1;
}

/** Text as it is compared: case, accents, spaces and punctuation do not count. */
function folded(text: string): string {
  return text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '');
}

const words = (text: string) =>
  text
    .toLowerCase()
    .split(/[^\p{L}\p{N}/]+/u)
    .filter(Boolean);

/**
 * The names nearest to what was written, best first, at most `count`.
 * A name counts as near when a third of its letters or fewer differ, or when one holds the other,
 * or all words of the other.
 * @returns names out of `names`, possibly none
 */
export function nearestNames(written: string, names: readonly string[], count = 3): string[] {
  // A long text is no misspelt name, and comparing it would cost.
  if (written.length > 80) return [];
  const wanted = folded(written);
  if (wanted === '') return [];
  const wantedWords = words(written);
  const scored = names.map((name) => {
    const own = folded(name);
    const longer = Math.max(own.length, wanted.length);
    const limit = longer < 3 ? 0 : Math.max(1, Math.floor(longer / 3));
    const ownWords = words(name);
    const allWords = wantedWords.length > 1 && wantedWords.every((w) => ownWords.includes(w));
    const holds =
      allWords || (wanted.length >= 3 && (own.includes(wanted) || (own.length >= 3 && wanted.includes(own))));
    const distance = editDistance(wanted, own, limit);
    return { name, score: distance <= limit ? distance : holds ? limit : Infinity };
  });
  return scored
    .filter((s) => s.score < Infinity)
    .sort((a, b) => a.score - b.score)
    .slice(0, count)
    .map((s) => s.name);
}

/**
 * The names closest in spelling, however far: for a name that is near none.
 * @returns `count` names, best first; none for a text too long to be a name
 */
export function closestNames(written: string, names: readonly string[], count = 3): string[] {
  if (written.length > 80) return [];
  const wanted = folded(written);
  return names
    .map((name) => ({ name, distance: editDistance(wanted, folded(name), 160) }))
    .sort((a, b) => a.distance - b.distance)
    .slice(0, count)
    .map((s) => s.name);
}

/** "Did you mean A, B or C?" with a leading space, or nothing. */
export function didYouMean(written: string, names: readonly string[]): string {
  const near = nearestNames(written, names);
  if (near.length === 0) return '';
  const last = near.at(-1) ?? '';
  const list = near.length === 1 ? last : `${near.slice(0, -1).join(', ')} or ${last}`;
  return ` Did you mean ${list}?`;
}
