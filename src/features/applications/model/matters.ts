import type { Cause, Finding } from '#shared/contracts/api.generated';

/** Findings that one matter explains: the causes stand once, over all of them. */
export interface Matter {
  key: string;
  first: Finding;
  others: Finding[];
  causes: readonly Cause[];
}

/** The findings of a discrepancy by matter, those with a cause first; what only follows from another is left out. */
export function mattersOf(findings: readonly Finding[]): Matter[] {
  const groups = new Map<string, Finding[]>();
  for (const finding of findings) {
    if (finding.follows !== null) continue;
    const key = finding.group === null ? finding.fingerprint : `${finding.lineKey}/${finding.group}`;
    groups.set(key, [...(groups.get(key) ?? []), finding]);
  }
  const matters = [...groups].flatMap(([key, group]): Matter[] => {
    const first = group.find((f) => f.first && f.causes.length > 0) ?? group[0];
    if (!first) return [];
    return [{ key, first, others: group.filter((f) => f !== first), causes: first.causes }];
  });
  return matters.sort((a, b) => Number(b.causes.length > 0) - Number(a.causes.length > 0));
}
