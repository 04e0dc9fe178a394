import type { Finding } from '#shared/contracts/api.generated';
import { CauseLine, LooseFinding } from '../../../components/charts/cause-line';
import { FindingSays } from '../../../components/charts/finding-says';
import { causeLines, dispositionWords } from '../model/finding-words';
import type { FindingActions } from './balance-section';

/** Findings that stand in no row: of the drawing, of a section, of the whole line. */
export function LooseFindings({
  findings,
  carriers,
  actions,
}: {
  findings: readonly Finding[];
  /** Those of them that carry their group's cause. */
  carriers: ReadonlySet<Finding>;
  actions?: FindingActions;
}) {
  return findings.map((finding) => {
    const done = dispositionWords(finding);
    const grade = finding.stands ? finding.grade : 'settled';
    return (
      <LooseFinding
        key={finding.fingerprint}
        grade={finding.grade}
        settled={!finding.stands}
        says={<FindingSays message={finding.message} />}
        acts={actions?.(finding)}
      >
        {[...causeLines(finding, carriers.has(finding)), ...(done ? [done] : [])].map((line) => (
          <CauseLine key={line} grade={grade}>
            {line}
          </CauseLine>
        ))}
      </LooseFinding>
    );
  });
}
