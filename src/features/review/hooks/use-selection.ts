import { useState } from 'react';
import type { Finding } from '#shared/contracts/api.generated';

export interface Selection {
  findings: readonly Finding[];
  has: (finding: Finding) => boolean;
  toggle: (finding: Finding) => void;
  clear: () => void;
}

const same = (a: Finding, b: Finding) => a.fingerprint === b.fingerprint && a.lineKey === b.lineKey;

/** Findings chosen for one discrepancy; they may lie on several lines, so the choice outlasts the sheet shown. */
export function useSelection(): Selection {
  const [findings, setFindings] = useState<readonly Finding[]>([]);
  const has = (finding: Finding) => findings.some((f) => same(f, finding));
  return {
    findings,
    has,
    toggle: (finding) =>
      setFindings((chosen) =>
        chosen.some((f) => same(f, finding)) ? chosen.filter((f) => !same(f, finding)) : [...chosen, finding],
      ),
    clear: () => setFindings([]),
  };
}
